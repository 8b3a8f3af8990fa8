import type { BandFit } from '../../../../core/measured/bandFit/fitBands';
import type { BandFitRecord } from '../../../../core/record/analysis';
import { formatFigures } from '../../../parts';

interface FitResultProps {
  readonly kept: BandFitRecord;
  /** The fit as it just came out, with what is not kept; null for one of an earlier day. */
  readonly last: BandFit | null;
  /** Makes the kept fit once more, for what is not kept with it. */
  readonly onAgain: () => void;
  readonly running: boolean;
}

const withError = (value: number, se: number | null, figures: number): string =>
  `${formatFigures(value, figures)} ${se === null ? '(no error: held or on a bound)' : `± ${formatFigures(se, 2)}`}`;

/** Centres, widths and heights with their standard errors, and what the fit says against itself. */
export function FitResult({ kept, last, onAgain, running }: FitResultProps) {
  const correlation = last?.correlation ?? null;
  return (
    <div className="stack">
      <table className="plain-table">
        <caption>
          Fitted bands ± standard error; {kept.points} points, status {kept.status}
        </caption>
        <thead>
          <tr>
            <th scope="col">Band</th>
            <th scope="col">Centre / cm⁻¹</th>
            <th scope="col">nm</th>
            <th scope="col">Full width at half height / cm⁻¹</th>
            <th scope="col">Height</th>
          </tr>
        </thead>
        <tbody>
          {kept.bands.map(({ centre_cm1, fwhm_cm1, height, se }, index) => (
            <tr key={index}>
              <th scope="row">{index + 1}</th>
              <td className="figures">{withError(centre_cm1, se.centre_cm1, 5)}</td>
              <td className="figures">{formatFigures(1e7 / centre_cm1, 4)}</td>
              <td className="figures">{withError(fwhm_cm1, se.fwhm_cm1, 4)}</td>
              <td className="figures">{withError(height, se.height, 3)}</td>
            </tr>
          ))}
        </tbody>
      </table>
      <p className="soft small">
        The errors are those of the fit alone. The wavelength scale of the instrument and bands that are not
        Gaussian come on top: half a nanometre is 15 cm⁻¹ at 575 nm.
      </p>
      {last !== null && last.remarks.length > 0 && (
        <ul className="analysis-remarks">
          {last.remarks.map((remark) => (
            <li key={remark}>{remark}</li>
          ))}
        </ul>
      )}
      {last === null && (
        <div>
          <button type="button" disabled={running} onClick={onAgain}>
            Work out correlation and remarks
          </button>
        </div>
      )}
      {correlation !== null && (
        <details>
          <summary>Correlation of the parameters</summary>
          <div className="record-scroll">
            <table className="plain-table">
              <thead>
                <tr>
                  <td />
                  {correlation.parameters.map((name) => (
                    <th key={name} scope="col">
                      {name}
                    </th>
                  ))}
                </tr>
              </thead>
              <tbody>
                {correlation.matrix.map((row, index) => (
                  <tr key={index}>
                    <th scope="row">{correlation.parameters[index]}</th>
                    {row.map((value, column) => (
                      <td key={column} className="figures">
                        {value.toFixed(2)}
                      </td>
                    ))}
                  </tr>
                ))}
              </tbody>
            </table>
          </div>
        </details>
      )}
    </div>
  );
}
