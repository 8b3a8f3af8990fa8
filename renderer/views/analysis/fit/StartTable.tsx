export interface StartDraft {
  readonly centre: string;
  readonly width: string;
  readonly height: string;
}

interface Range {
  readonly low: string;
  readonly high: string;
}

interface StartTableProps {
  readonly start: readonly StartDraft[];
  readonly range: Range;
  readonly onStart: (start: readonly StartDraft[]) => void;
  readonly onRange: (range: Range) => void;
}

const columns = [
  ['centre', 'Centre / cm⁻¹'],
  ['width', 'Full width at half height / cm⁻¹'],
  ['height', 'Height'],
] as const;

/** Where the fit starts, one line a band, and between which wavenumbers it looks. */
export function StartTable({ start, range, onStart, onRange }: StartTableProps) {
  const set = (index: number, change: Partial<StartDraft>): void =>
    onStart(start.map((each, place) => (place === index ? { ...each, ...change } : each)));
  return (
    <div className="stack">
      <p className="analysis-range">
        <label>
          Fit from{' '}
          <input
            inputMode="decimal"
            placeholder="lowest"
            value={range.low}
            onChange={(event) => onRange({ ...range, low: event.currentTarget.value })}
          />
        </label>{' '}
        <label>
          to{' '}
          <input
            inputMode="decimal"
            placeholder="highest"
            value={range.high}
            onChange={(event) => onRange({ ...range, high: event.currentTarget.value })}
          />
        </label>{' '}
        cm⁻¹
      </p>
      {start.length > 0 && (
        <table className="plain-table analysis-start">
          <caption>Start values</caption>
          <thead>
            <tr>
              <th scope="col">Band</th>
              {columns.map(([key, words]) => (
                <th key={key} scope="col">
                  {words}
                </th>
              ))}
              <th scope="col">
                <span className="visually-hidden">Remove</span>
              </th>
            </tr>
          </thead>
          <tbody>
            {start.map((band, index) => (
              <tr key={index}>
                <th scope="row">{index + 1}</th>
                {columns.map(([key, words]) => (
                  <td key={key}>
                    <input
                      aria-label={`${words}, band ${index + 1}`}
                      inputMode="decimal"
                      value={band[key]}
                      onChange={(event) => set(index, { [key]: event.currentTarget.value })}
                    />
                  </td>
                ))}
                <td>
                  <button
                    type="button"
                    className="button-quiet"
                    aria-label={`Remove band ${index + 1}`}
                    onClick={() => onStart(start.filter((_, place) => place !== index))}
                  >
                    ✕
                  </button>
                </td>
              </tr>
            ))}
          </tbody>
        </table>
      )}
    </div>
  );
}
