import { formatFigures } from '../../parts';
import { shortShareText } from './figureText';
import { agreementOf, type BandPair } from './recordPairs';

interface GroupTableProps {
  readonly pairs: readonly BandPair[];
  readonly groupOf: (pair: BandPair) => string;
}

/** Errors and coverage group by group; a group of two says little, and its interval shows it. */
export function GroupTable({ pairs, groupOf }: GroupTableProps) {
  const groups = new Map<string, BandPair[]>();
  for (const pair of pairs) groups.set(groupOf(pair), [...(groups.get(groupOf(pair)) ?? []), pair]);
  const lines = [...groups]
    .map(([name, members]) => ({ name, agreement: agreementOf(members) }))
    .sort((one, other) => one.name.localeCompare(other.name));
  return (
    <table className="plain-table">
      <thead>
        <tr>
          <th scope="col">Group</th>
          <th scope="col">Pairs</th>
          <th scope="col">Bias / cm⁻¹</th>
          <th scope="col">Mean absolute error</th>
          <th scope="col">Root mean square</th>
          <th scope="col">Median</th>
          <th scope="col">Inside the 68 % range (95 % interval)</th>
          <th scope="col">Inside the 95 % range (95 % interval)</th>
        </tr>
      </thead>
      <tbody>
        {lines.map(({ name, agreement }) => (
          <tr key={name}>
            <th scope="row">{name}</th>
            <td className="figures">{agreement?.errors.n ?? 0}</td>
            <td className="figures">{agreement ? formatFigures(agreement.errors.bias, 3) : '–'}</td>
            <td className="figures">{agreement ? formatFigures(agreement.errors.meanAbsolute, 3) : '–'}</td>
            <td className="figures">{agreement ? formatFigures(agreement.errors.rootMeanSquare, 3) : '–'}</td>
            <td className="figures">{agreement ? formatFigures(agreement.errors.medianAbsolute, 3) : '–'}</td>
            <td>{agreement ? shortShareText(agreement.within68) : '–'}</td>
            <td>{agreement ? shortShareText(agreement.within95) : '–'}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
