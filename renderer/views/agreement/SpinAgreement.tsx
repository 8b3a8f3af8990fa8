import { brierScore, confusionTable } from '../../../core/agreement';
import { Formula, formatShare } from '../../parts';
import type { SpinPairing } from './spinPairs';

interface SpinAgreementProps {
  readonly spins: readonly SpinPairing[];
  readonly nameOf: (candidateId: string) => string;
}

/** Predicted against found spin state, by the measured moments. */
export function SpinAgreement({ spins, nameOf }: SpinAgreementProps) {
  const decided = spins.flatMap(({ foundHigh, probabilityHigh }) =>
    foundHigh === null ? [] : [{ foundHigh, probabilityHigh, predictedHigh: probabilityHigh > 0.5 }],
  );
  const table = confusionTable(decided);
  return (
    <section className="panel stack" aria-labelledby="agreement-spin">
      <h2 id="agreement-spin">Spin states</h2>
      {spins.length === 0 ? (
        <p className="soft">No moment yet of a complex that has a choice of spin state.</p>
      ) : (
        <>
          <table className="plain-table agreement-confusion">
            <caption>
              Found by the moment, predicted by the larger probability
              {decided.length > 0 &&
                `; Brier score ${brierScore(
                  decided.map(({ probabilityHigh, foundHigh }) => ({
                    probability: probabilityHigh,
                    happened: foundHigh,
                  })),
                ).toFixed(3)} (0 is perfect, 0.25 a coin)`}
            </caption>
            <thead>
              <tr>
                <td />
                <th scope="col">predicted high</th>
                <th scope="col">predicted low</th>
              </tr>
            </thead>
            <tbody>
              <tr>
                <th scope="row">found high</th>
                <td className="figures">{table.highAsHigh}</td>
                <td className="figures">{table.highAsLow}</td>
              </tr>
              <tr>
                <th scope="row">found low</th>
                <td className="figures">{table.lowAsHigh}</td>
                <td className="figures">{table.lowAsLow}</td>
              </tr>
            </tbody>
          </table>
          <ul className="agreement-list">
            {spins.map(({ id, candidateId, moment_BM, probabilityHigh, foundHigh }) => (
              <li key={id}>
                <Formula formula={nameOf(candidateId)} />: {moment_BM} μB, predicted high spin with{' '}
                {formatShare(probabilityHigh)}
                {foundHigh === null && '; the moment lies between the two states and is not counted'}
              </li>
            ))}
          </ul>
          <p className="soft small">
            A moment counts where it lies nearer to one spin-only value than to the other by more than a third
            of their distance. A moment at one temperature is no proof of a pure spin state.
          </p>
        </>
      )}
    </section>
  );
}
