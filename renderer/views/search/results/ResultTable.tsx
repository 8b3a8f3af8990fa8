import type { ShownResult } from '../../../workers/search/protocol';
import { ResultRow } from './ResultRow';

interface ResultTableProps {
  readonly rows: readonly {
    readonly result: ShownResult;
    readonly place: number;
    readonly variants: number;
  }[];
  readonly chosen: ReadonlyMap<string, ShownResult>;
  /** Ids that the project already holds. */
  readonly held: ReadonlySet<string>;
  readonly onChoose: (result: ShownResult, chosen: boolean) => void;
  readonly onAdd: (result: ShownResult) => void;
}

/** Candidates by the chance that the whole wish is met, with the chance of each part. */
export function ResultTable({ rows, chosen, held, onChoose, onAdd }: ResultTableProps) {
  return (
    <table className="plain-table search-results">
      <thead>
        <tr>
          <th scope="col">Place</th>
          <th scope="col">Chance</th>
          <th scope="col">Complex</th>
          <th scope="col">Light that passes, first band, spin</th>
          <th scope="col">Part by part</th>
          <th scope="col">
            <span className="visually-hidden">Actions</span>
          </th>
        </tr>
      </thead>
      <tbody>
        {rows.map(({ result, place, variants }) => (
          <ResultRow
            key={result.id}
            result={result}
            place={place}
            variants={variants}
            chosen={chosen.has(result.id)}
            held={held.has(result.id)}
            onChoose={onChoose}
            onAdd={onAdd}
          />
        ))}
      </tbody>
    </table>
  );
}
