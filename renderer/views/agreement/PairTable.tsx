import type { ReactNode } from 'react';
import { MeasuredNumber, NumberWithRange, TermSymbol, writeToStep } from '../../parts';
import type { BandPair } from './recordPairs';
import './PairTable.css';

interface PairTableProps {
  readonly pairs: readonly BandPair[];
  /** Names the complex of a pair; without it the table is about one complex. */
  readonly complexOf?: (pair: BandPair) => ReactNode;
}

const signed = (value: number, step: number): string => (value > 0 ? '+' : '') + writeToStep(value, step);

function remarkOf({ feature, predicted, frozenAfterwards, isInSample }: BandPair): string {
  if (predicted === null) return 'no predicted band near it';
  if (isInSample) return 'went into these parameters, not counted';
  if (frozenAfterwards) return 'measured before freezing, not counted';
  return feature === 'shoulder' ? 'a shoulder is no centre, not counted' : '';
}

/** Frozen prediction and measurement side by side. */
export function PairTable({ pairs, complexOf }: PairTableProps) {
  return (
    <div className="pair-scroll">
      <table className="plain-table pair-table">
        <thead>
          <tr>
            {complexOf && <th scope="col">Complex</th>}
            <th scope="col">Predicted band</th>
            <th scope="col">Frozen prediction (68 % range)</th>
            <th scope="col">Measured</th>
            <th scope="col">Read as</th>
            <th scope="col">
              <abbr title="measured minus predicted, cm⁻¹">Residual</abbr>
            </th>
            <th scope="col">
              <abbr title="residual over the joint standard deviation of prediction and measurement">
                Residual/σ
              </abbr>
            </th>
            <th scope="col">Remark</th>
          </tr>
        </thead>
        <tbody>
          {pairs.map((pair) => (
            <tr key={pair.id}>
              {complexOf && <th scope="row">{complexOf(pair)}</th>}
              <td>{pair.predicted === null ? '–' : <TermSymbol label={pair.predicted.label} />}</td>
              <td>
                {pair.predicted === null ? (
                  '–'
                ) : (
                  <NumberWithRange value={pair.predicted.energy_cm1} sigma={pair.predicted.sigma_cm1} />
                )}
              </td>
              <td>
                <MeasuredNumber value={pair.measured} u={pair.u} />
              </td>
              <td>{pair.feature}</td>
              <td className="figures">{pair.residual === null ? '–' : `${signed(pair.residual, 1)} cm⁻¹`}</td>
              <td className="figures">{pair.score === null ? '–' : signed(pair.score, 0.1)}</td>
              <td className="soft small">{remarkOf(pair)}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
