import type { ParameterChange } from '../../../../core/agreement/recalibration';
import type { ParameterLibrary } from '../../../../core/library/parameterLibrary';
import { Formula, formatFigures, formatShare, writeToStep } from '../../../parts';
import { ionFormula, shareInUse, spoken, subjectOf } from './proposalRows';

interface ChangeTableProps {
  readonly changes: readonly ParameterChange[];
  readonly library: ParameterLibrary;
  /** What the proposal starts from: `literature` or the name of a set. */
  readonly from: string;
  readonly without: ReadonlySet<string>;
  readonly onToggle: (key: string) => void;
}

const pair = ({ value, sigma }: { value: number; sigma: number }): string =>
  `${formatFigures(value, 4)} ± ${formatFigures(sigma, 2)}`;

/** The parameters before and after, one line each, to be taken or left. */
export function ChangeTable({ changes, library, from, without, onToggle }: ChangeTableProps) {
  return (
    <table className="plain-table">
      <caption>Parameters that estimates of other complexes rest on</caption>
      <thead>
        <tr>
          <th scope="col">Take</th>
          <th scope="col">Parameter</th>
          <th scope="col">{from === 'literature' ? 'Literature' : from} ± σ</th>
          <th scope="col">Proposed ± σ</th>
          <th scope="col">
            <abbr title="change in standard deviations of the value it starts from; beyond 2 that value and the record contradict each other">
              Shift/σ
            </abbr>
          </th>
          <th scope="col">
            <abbr title="how much of the proposed value still comes from the value it starts from; the rest comes from the record">
              Share of {from}
            </abbr>
          </th>
          <th scope="col">From</th>
        </tr>
      </thead>
      <tbody>
        {changes.map((change) => {
          const subject = subjectOf(change.key, library);
          const { length } = change.from;
          return (
            <tr key={change.key}>
              <td>
                <input
                  type="checkbox"
                  aria-label={`Take ${spoken(subject)}`}
                  checked={!without.has(change.key)}
                  onChange={() => onToggle(change.key)}
                />
              </td>
              <th scope="row">
                {subject.words} {subject.ion !== null && <Formula formula={ionFormula(subject.ion)} />}{' '}
                {subject.more}
                {subject.unit !== '' && ` / ${subject.unit}`}
              </th>
              <td className="figures">{pair(change.before)}</td>
              <td className="figures">{pair(change.after)}</td>
              <td className="figures">{writeToStep(change.shift, 0.1)}</td>
              <td className="figures">{formatShare(shareInUse(change))}</td>
              <td>
                {length} {length === 1 ? 'fit' : 'fits'}
              </td>
            </tr>
          );
        })}
      </tbody>
    </table>
  );
}
