import type { Prediction } from '../../../core/prediction/types';
import { Explain, NumberWithRange, SpinBar, TermSymbol, Why } from '../../parts';
import { QuantityLine } from './QuantityLine';

/** Spin state in words and probability, ground term, moment. */
export function SpinPanel({ prediction }: { readonly prediction: Prediction }) {
  const { spin, groundTerm, dElectrons } = prediction;
  const { gap, crossoverTenDqOverB, momentSpinOnly_BM, momentRange_BM } = spin;
  return (
    <section className="panel" aria-labelledby="sheet-spin">
      <div className="with-explain">
        <h2 id="sheet-spin">Spin state</h2>
        <Explain quantity="spin" />
      </div>
      <div className="stack">
        <SpinBar spin={spin} />
        <dl className="quantities">
          <QuantityLine
            name={
              <>
                Ground term of d<sup>{dElectrons}</sup>
              </>
            }
            value={<TermSymbol label={groundTerm} />}
          />
          {gap && (
            <QuantityLine
              name="Low above high spin by"
              value={<NumberWithRange kind="interval" value={gap.value} sigma={gap.sigma} />}
              account={<Why reasons={gap.reasons} of="the gap" />}
            />
          )}
          {crossoverTenDqOverB !== null && (
            <QuantityLine
              name="Ground state changes at 10Dq/B"
              value={<span className="figures">{crossoverTenDqOverB.toFixed(1)}</span>}
            />
          )}
          <QuantityLine
            name={
              <>
                Magnetic moment <Explain quantity="moment" />
              </>
            }
            value={
              <NumberWithRange
                kind="plain"
                unit="μB"
                value={momentSpinOnly_BM}
                range={momentRange_BM}
                figures={3}
              />
            }
            account={
              <span className="soft small">
                Spin-only value;{' '}
                {momentRange_BM
                  ? 'in brackets what such ions show at room temperature.'
                  : 'no range on file.'}
              </span>
            }
          />
        </dl>
      </div>
    </section>
  );
}
