import type { ReactNode } from 'react';
import { standardScore } from '../../../core/agreement';
import { formatFigures, NumberWithRange, writeToStep } from '../../parts';
import { fieldAgreement, type FieldPair } from './fieldPairs';
import { percent, shortShareText } from './figureText';
import './PairTable.css';

interface FieldSectionProps {
  readonly pairs: readonly FieldPair[];
  readonly complexOf: (candidateId: string) => ReactNode;
}

const remarkOf = ({ isInSample, frozenAfterwards }: FieldPair): string => {
  if (isInSample) return 'went into these parameters, not counted';
  return frozenAfterwards ? 'measured before freezing, not counted' : '';
};

/** Fitted field parameters beside those predicted, in percent, because their errors grow with the value. */
export function FieldSection({ pairs, complexOf }: FieldSectionProps) {
  const lines = (['10Dq', 'B'] as const).flatMap((quantity) => {
    const agreement = fieldAgreement(pairs, quantity);
    return agreement === null ? [] : [{ quantity, ...agreement }];
  });
  return (
    <section className="panel stack" aria-labelledby="agreement-field">
      <h2 id="agreement-field">Field parameters</h2>
      {lines.length > 0 && (
        <div className="pair-scroll">
          <table className="plain-table">
            <thead>
              <tr>
                <th scope="col">Quantity</th>
                <th scope="col">Fits</th>
                <th scope="col">Bias</th>
                <th scope="col">Mean absolute error</th>
                <th scope="col">Root mean square</th>
                <th scope="col">Median</th>
                <th scope="col">Inside the 68 % range (95 % interval)</th>
                <th scope="col">Inside the 95 % range (95 % interval)</th>
              </tr>
            </thead>
            <tbody>
              {lines.map(({ quantity, errors, within68, within95 }) => (
                <tr key={quantity}>
                  <th scope="row">{quantity}</th>
                  <td className="figures">{errors.n}</td>
                  <td className="figures">{percent(errors.bias)}</td>
                  <td className="figures">{percent(errors.meanAbsolute)}</td>
                  <td className="figures">{percent(errors.rootMeanSquare)}</td>
                  <td className="figures">{percent(errors.medianAbsolute)}</td>
                  <td>{shortShareText(within68)}</td>
                  <td>{shortShareText(within95)}</td>
                </tr>
              ))}
            </tbody>
          </table>
        </div>
      )}
      <div className="pair-scroll">
        <table className="plain-table">
          <thead>
            <tr>
              <th scope="col">Complex</th>
              <th scope="col">Quantity</th>
              <th scope="col">Frozen prediction (68 % range)</th>
              <th scope="col">Fitted ± standard error</th>
              <th scope="col">Error</th>
              <th scope="col">
                <abbr title="measured minus predicted over their joint standard deviation">Residual/σ</abbr>
              </th>
              <th scope="col">Remark</th>
            </tr>
          </thead>
          <tbody>
            {pairs.map((pair) => (
              <tr key={pair.id}>
                <th scope="row">{complexOf(pair.candidateId)}</th>
                <td>{pair.quantity}</td>
                <td>
                  <NumberWithRange kind="interval" value={pair.predicted} sigma={pair.sigma} />
                </td>
                <td className="figures">
                  {formatFigures(pair.measured, 4)} ± {formatFigures(pair.uncertainty, 2)} cm⁻¹
                </td>
                <td className="figures">{percent(pair.predicted / pair.measured - 1)}</td>
                <td className="figures">{writeToStep(standardScore(pair), 0.1)}</td>
                <td className="soft small">{remarkOf(pair)}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      <p className="soft small">Errors are predicted minus fitted, in percent of the fitted value.</p>
    </section>
  );
}
