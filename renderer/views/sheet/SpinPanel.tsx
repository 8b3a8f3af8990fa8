import type { Prediction } from '../../../core/prediction/types';
import { NumberWithRange, SpinBar, TermSymbol, Why } from '../../parts';

/** Spin state in words and probability, ground term, moment. */
export function SpinPanel({ prediction }: { readonly prediction: Prediction }) {
  const { spin, groundTerm, dElectrons } = prediction;
  const { gap, crossoverTenDqOverB, momentSpinOnly_BM, momentRange_BM } = spin;
  return (
    <section className="panel" aria-labelledby="sheet-spin">
      <h2 id="sheet-spin">Spin state</h2>
      <div className="stack">
        <SpinBar spin={spin} />
        <dl className="quantities">
          <div>
            <div className="quantity-line">
              <dt>
                Ground term of d<sup>{dElectrons}</sup>
              </dt>
              <dd>
                <TermSymbol label={groundTerm} />
              </dd>
            </div>
          </div>
          {gap && (
            <div>
              <div className="quantity-line">
                <dt>Low above high spin by</dt>
                <dd>
                  <NumberWithRange kind="interval" value={gap.value} sigma={gap.sigma} />
                </dd>
              </div>
              <Why reasons={gap.reasons} of="the gap" />
            </div>
          )}
          {crossoverTenDqOverB !== null && (
            <div>
              <div className="quantity-line">
                <dt>Ground state changes at 10Dq/B</dt>
                <dd className="figures">{crossoverTenDqOverB.toFixed(1)}</dd>
              </div>
            </div>
          )}
          <div>
            <div className="quantity-line">
              <dt>Magnetic moment</dt>
              <dd>
                <NumberWithRange
                  kind="plain"
                  unit="μB"
                  value={momentSpinOnly_BM}
                  range={momentRange_BM}
                  figures={3}
                />
              </dd>
            </div>
            <p className="soft small">
              Spin-only value;{' '}
              {momentRange_BM ? 'in brackets what such ions show at room temperature.' : 'no range on file.'}
            </p>
          </div>
        </dl>
      </div>
    </section>
  );
}
