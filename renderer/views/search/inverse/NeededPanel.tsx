import { useId } from 'react';
import type { NeededField, WishInput } from '../../../../core/search';
import { useProject } from '../../../app/session/ProjectSession';
import { useLibrary } from '../../../app/session/useLibrary';
import { formatFigures, formatGiven, Progress, TermSymbol } from '../../../parts';
import { useNeeded } from './useNeeded';

interface NeededPanelProps {
  readonly wish: WishInput;
  /** Ions that the wish admits. */
  readonly ions: readonly string[];
}

/** The other way round: the 10Dq that each metal would need to absorb in the window, and the ligands that lie there. */
export function NeededPanel({ wish, ions }: NeededPanelProps) {
  const title = useId();
  const { overlay } = useProject();
  const needed = useNeeded();
  const windows = wish.bands ?? [];
  return (
    <section className="panel stack" aria-labelledby={title}>
      <h2 id={title}>Which field would do it?</h2>
      {windows.length === 0 ? (
        <p className="soft">
          Give a window to absorb in: then each metal is asked for the 10Dq that puts a band there.
        </p>
      ) : (
        <div className="wish-buttons">
          {windows.map(({ from_nm, to_nm }, band) => (
            <button
              key={band}
              type="button"
              disabled={needed.running}
              onClick={() => needed.begin(wish, overlay, ions, band)}
            >
              Work it out for {formatGiven(Math.round(from_nm))} to {formatGiven(Math.round(to_nm))} nm
            </button>
          ))}
        </div>
      )}
      {needed.running && (
        <Progress label="Ions" done={needed.done} total={needed.total} onCancel={needed.stop} />
      )}
      {needed.error !== null && <p role="alert">{needed.error}</p>}
      {needed.total > 0 && !needed.running && needed.fields.length === 0 && (
        <p>No metal of the wish has a spin-allowed band there in any field up to 45 000 cm⁻¹.</p>
      )}
      {needed.fields.length > 0 && <NeededTable fields={needed.fields} />}
    </section>
  );
}

function NeededTable({ fields }: { readonly fields: readonly NeededField[] }) {
  const library = useLibrary();
  return (
    <>
      <div className="search-table">
        <table className="plain-table">
          <thead>
            <tr>
              <th scope="col">Metal</th>
              <th scope="col">Band</th>
              <th scope="col">10Dq needed / cm⁻¹</th>
              <th scope="col">±5 % of 10Dq moves it by</th>
              <th scope="col">Ligands that give it alone (10Dq)</th>
            </tr>
          </thead>
          <tbody>
            {fields.map(({ ion, geometry, band, tenDq, fivePercent_cm1, ligands }) => (
              <tr key={`${ion} ${geometry} ${band} ${tenDq[0]}`}>
                <th scope="row">
                  {ion}
                  {geometry !== 'octahedral' && <span className="search-detail">{geometry}</span>}
                </th>
                <td>
                  <TermSymbol label={band} />
                </td>
                <td className="figures">
                  {formatGiven(tenDq[0])}–{formatGiven(tenDq[1])}
                </td>
                <td className="figures">{formatFigures(fivePercent_cm1, 2)} cm⁻¹</td>
                <td>
                  {ligands.length === 0 ? (
                    <span className="soft">none of those allowed</span>
                  ) : (
                    ligands
                      .map(
                        ({ id, tenDq: own }) =>
                          `${library.ligands.get(id)?.abbreviation ?? id} ${formatFigures(own, 3)}`,
                      )
                      .join(', ')
                  )}
                </td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      <p className="soft small">
        Spin-allowed bands from the ground state of that field, with B and C held at the mean of the metal’s
        complexes: a guide to where to look. Charge transfer is left out.
      </p>
    </>
  );
}
