import './PlotTable.css';

/** The numbers behind a plot. Every column head carries its unit. */
export interface PlotTableData {
  readonly columns: readonly string[];
  readonly rows: readonly (readonly (string | number | null)[])[];
}

/** More rows than this are left to the copied text. */
const shownAtMost = 200;

const cellText = (cell: string | number | null): string => (cell === null ? '' : String(cell));

/** Tab-separated text that a spreadsheet takes, full precision. */
export const tableText = ({ columns, rows }: PlotTableData): string =>
  [columns, ...rows.map((row) => row.map(cellText))].map((row) => row.join('\t')).join('\n');

interface PlotTableProps {
  readonly caption: string;
  readonly table: PlotTableData;
}

export function PlotTable({ caption, table }: PlotTableProps) {
  const { columns, rows } = table;
  return (
    // Scrolls on its own, so it must be reachable by keyboard.
    <div className="plot-table" tabIndex={0} role="group" aria-label={`${caption}: data`}>
      <button type="button" onClick={() => void navigator.clipboard?.writeText(tableText(table))}>
        Copy {rows.length} rows
      </button>
      <table>
        <caption>{caption}</caption>
        <thead>
          <tr>
            {columns.map((column) => (
              <th key={column} scope="col">
                {column}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.slice(0, shownAtMost).map((row, index) => (
            <tr key={index}>
              {row.map((cell, place) => (
                <td key={place} data-number={typeof cell === 'number' || undefined}>
                  {cell === null ? '–' : typeof cell === 'number' ? Number(cell.toPrecision(5)) : cell}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
      {rows.length > shownAtMost && (
        <p>
          {shownAtMost} of {rows.length} rows shown; copying takes all.
        </p>
      )}
    </div>
  );
}
