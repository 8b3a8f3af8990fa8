import type { BandFit } from '../../../../core/measured/bandFit/fitBands';
import type { CountComparison } from '../../../../core/measured/bandFit/compareCounts';
import { formatFigures } from '../../../parts';

interface CountTableProps {
  readonly counts: readonly CountComparison[];
  readonly onTake: (fit: BandFit) => void;
}

/** How fits with one to several bands compare. It helps to choose and decides nothing. */
export function CountTable({ counts, onTake }: CountTableProps) {
  return (
    <table className="plain-table">
      <caption>
        Number of bands. A fit alone cannot say how many there are: real bands are not exactly Gaussian, and a
        criterion of fit then asks for too many.
      </caption>
      <thead>
        <tr>
          <th scope="col">Bands</th>
          <th scope="col">
            <abbr title="Akaike's information criterion for small samples, above the lowest of the list">
              AICc above the lowest
            </abbr>
          </th>
          <th scope="col">Centres / cm⁻¹</th>
          <th scope="col">Against it</th>
          <th scope="col">
            <span className="visually-hidden">Take</span>
          </th>
        </tr>
      </thead>
      <tbody>
        {counts.map(({ count, fit, above, caution, suggested }) => (
          <tr key={count}>
            <th scope="row">
              {count}
              {suggested && ' (fewest that will do)'}
            </th>
            <td className="figures">{formatFigures(above, 3)}</td>
            <td className="figures">
              {fit.bands.map(({ centre_cm1 }) => formatFigures(centre_cm1, 4)).join(', ')}
            </td>
            <td className="soft">{caution ?? ''}</td>
            <td>
              <button type="button" onClick={() => onTake(fit)}>
                Start from these
              </button>
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
