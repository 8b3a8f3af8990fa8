import type { ShownResult } from '../../workers/search/protocol';
import { Formula, Swatch, TransmissionStrip } from '../../parts';

interface ResultTableProps {
  readonly results: readonly ShownResult[];
  /** Ids that the project already holds. */
  readonly held: ReadonlySet<string>;
  readonly onAdd: (result: ShownResult) => void;
}

const percent = (share: number): string =>
  share >= 0.995 ? '> 99 %' : share < 0.005 ? '< 1 %' : `${Math.round(100 * share)} %`;

/** `bands[0]` as the form calls it. */
const partNames: Readonly<Record<string, string>> = {
  'bands[0]': 'absorbs',
  'clear[0]': 'lets through',
  spin: 'spin',
  unpaired: 'unpaired electrons',
  tenDq_cm1: '10Dq',
  colour: 'colour',
};

/** Candidates by the chance that the whole wish is met, with the chance of each part. */
export function ResultTable({ results, held, onAdd }: ResultTableProps) {
  return (
    <table className="plain-table search-results">
      <thead>
        <tr>
          <th scope="col">Chance</th>
          <th scope="col">Complex</th>
          <th scope="col">Light that passes</th>
          <th scope="col">Why</th>
          <th scope="col">
            <span className="visually-hidden">Actions</span>
          </th>
        </tr>
      </thead>
      <tbody>
        {results.map((result) => (
          <tr key={result.id}>
            <td className="search-chance">
              <span className="figures">{percent(result.probability)}</span>
              <span className="search-chance-bar" aria-hidden="true">
                <span style={{ inlineSize: `${100 * result.probability}%` }} />
              </span>
            </td>
            <th scope="row">
              <Formula formula={result.formula} />
              <span className="search-detail">
                {[result.geometry === 'octahedral' ? null : result.geometry, result.isomer]
                  .filter((part) => part != null)
                  .join(', ')}
              </span>
            </th>
            <td>
              <div className="search-light">
                <TransmissionStrip transmittance={result.summary.ok ? result.summary.transmittance : null} />
                <Swatch colour={result.summary.ok ? result.summary.colour : null} size="row" text="words" />
              </div>
            </td>
            <td>
              <ul className="search-parts">
                {result.parts.map(({ part, probability, because }) => (
                  <li key={part}>
                    {partNames[part] ?? part} {percent(probability)} <span className="soft">{because}</span>
                  </li>
                ))}
              </ul>
            </td>
            <td>
              {held.has(result.id) ? (
                <span className="soft small">in the project</span>
              ) : (
                <button type="button" onClick={() => onAdd(result)}>
                  Add<span className="visually-hidden"> {result.formula} to the project</span>
                </button>
              )}
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
