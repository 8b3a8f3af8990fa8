import type { BundleContent, MergeConflict, Side } from '../../../core/record/bundle';
import { conflictKey, conflictPlace, valueText } from './conflictText';

interface ConflictTableProps {
  readonly conflicts: readonly MergeConflict[];
  readonly mine: BundleContent;
  readonly onChoose: (key: string, side: Side) => void;
}

/** Fields that both copies changed, side by side. */
export function ConflictTable({ conflicts, mine, onChoose }: ConflictTableProps) {
  return (
    <section className="panel" aria-labelledby="merge-conflicts">
      <h2 id="merge-conflicts">Which one holds?</h2>
      <table className="plain-table">
        <thead>
          <tr>
            <th scope="col">Record and field</th>
            <th scope="col">Yours</th>
            <th scope="col">Theirs</th>
          </tr>
        </thead>
        <tbody>
          {conflicts.map((conflict) => {
            const key = conflictKey(conflict);
            return (
              <tr key={key}>
                <th scope="row">{conflictPlace(conflict, mine)}</th>
                {(['mine', 'theirs'] as const).map((side) => (
                  <td key={side}>
                    <label className="check">
                      <input
                        type="radio"
                        name={key}
                        checked={conflict.kept === side}
                        onChange={() => onChoose(key, side)}
                      />
                      <span>{valueText(conflict[side])}</span>
                    </label>
                  </td>
                ))}
              </tr>
            );
          })}
        </tbody>
      </table>
    </section>
  );
}
