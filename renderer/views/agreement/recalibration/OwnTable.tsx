import { Formula, formatFigures } from '../../../parts';
import type { OwnRow } from './proposalRows';

interface OwnTableProps {
  readonly rows: readonly OwnRow[];
  readonly without: ReadonlySet<string>;
  readonly onToggle: (key: string) => void;
}

const pair = (value: number, sigma: number | null): string =>
  `${formatFigures(value, 4)}${sigma === null ? '' : ` ± ${formatFigures(sigma, 2)}`}`;

/** What was measured on complexes themselves, beside the estimate that it replaces; to be taken or left. */
export function OwnTable({ rows, without, onToggle }: OwnTableProps) {
  return (
    <table className="plain-table">
      <caption>Values of the measured complexes themselves, in place of their estimates</caption>
      <thead>
        <tr>
          <th scope="col">Take</th>
          <th scope="col">Complex</th>
          <th scope="col">Quantity / cm⁻¹</th>
          <th scope="col">Estimated ± σ</th>
          <th scope="col">Measured ± u</th>
        </tr>
      </thead>
      <tbody>
        {rows.map(({ key, formula, quantity, estimated, measured }) => (
          <tr key={key}>
            <td>
              <input
                type="checkbox"
                aria-label={`Take ${quantity} of ${formula}`}
                checked={!without.has(key)}
                onChange={() => onToggle(key)}
              />
            </td>
            <th scope="row">
              <Formula formula={formula} />
            </th>
            <td>{quantity}</td>
            <td className="figures">
              {estimated === null ? 'not estimated' : pair(estimated.value, estimated.sigma)}
            </td>
            <td className="figures">{pair(measured.value, measured.sigma)}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
