import { minuteOf, useAction, useStore } from '../../app/services';
import { Formula } from '../../parts';
import type { BinEntry } from './binEntries';

/** What lies in the bin, latest first, each with its way back. */
export function BinTable({ entries }: { readonly entries: readonly BinEntry[] }) {
  const store = useStore();
  const act = useAction();
  return (
    <table className="plain-table">
      <thead>
        <tr>
          <th scope="col">Deleted</th>
          <th scope="col">What</th>
          <th scope="col">From</th>
          <th scope="col">
            <span className="visually-hidden">Bring back</span>
          </th>
        </tr>
      </thead>
      <tbody>
        {entries.map(({ id, deletedAt, what, formula, from, restore }) => (
          <tr key={id}>
            <td>{minuteOf(deletedAt)}</td>
            <td>
              {formula !== null && <Formula formula={formula} />} {what}
            </td>
            <td>{from ?? '–'}</td>
            <td>
              <button
                type="button"
                onClick={() => void act(() => restore(store))}
                aria-label={`Bring back ${[formula, what].filter(Boolean).join(' ')}`}
              >
                Bring back
              </button>
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
