import { useState } from 'react';
import type { Band } from '../../../core/transitions/types';
import { fromWavenumber, widthFromWavenumber } from '../../../core/units';
import { formatFigures, NumberWithRange, TermSymbol, unitText, useUnit } from '../../parts';
import './BandTable.css';

const kindWords: Record<Band['kind'], string> = {
  'spin-allowed': 'spin-allowed d–d',
  'spin-forbidden': 'spin-forbidden d–d',
  LMCT: 'ligand to metal',
  MLCT: 'metal to ligand',
  intervalence: 'intervalence',
  ligand: 'within the ligand',
};

/** Spin-forbidden bands are many and weak: at first only those that one may meet. */
const worthShowing = ({ kind, energy_cm1 }: Band): boolean =>
  kind !== 'spin-forbidden' || energy_cm1 < 27_000;

export function BandTable({ bands }: { readonly bands: readonly Band[] }) {
  const [all, setAll] = useState(false);
  const shown = all ? bands : bands.filter(worthShowing);
  const hidden = bands.length - shown.length;
  return (
    <section className="panel sheet-wide" aria-labelledby="sheet-bands">
      <h2 id="sheet-bands">Bands</h2>
      {bands.length === 0 ? (
        <p className="soft">No band of this complex could be estimated.</p>
      ) : (
        <div className="band-table">
          <table className="plain-table">
            <thead>
              <tr>
                <th scope="col">To</th>
                <th scope="col">Kind</th>
                <th scope="col">Centre (68 % range)</th>
                <th scope="col">nm</th>
                <th scope="col">
                  <abbr title="full width at half height">Width</abbr>
                </th>
                <th scope="col">
                  <abbr title="molar absorptivity at the centre, L mol⁻¹ cm⁻¹">ε</abbr>
                </th>
                <th scope="col">From</th>
              </tr>
            </thead>
            <tbody>
              {shown.map((band, index) => (
                <BandRow key={`${band.label} ${index}`} band={band} />
              ))}
            </tbody>
          </table>
        </div>
      )}
      {(hidden > 0 || all) && (
        <button type="button" className="button-quiet band-more" onClick={() => setAll(!all)}>
          {all ? 'Show fewer' : `Show ${hidden} more, spin-forbidden and far up`}
        </button>
      )}
    </section>
  );
}

function BandRow({ band }: { readonly band: Band }) {
  const { unit } = useUnit();
  const { label, kind, energy_cm1, sigma_cm1, width_cm1, molarAbsorptivity, molarAbsorptivityRange } = band;
  const [low, high] = molarAbsorptivityRange;
  return (
    <tr>
      <th scope="row">
        <TermSymbol label={label} />
      </th>
      <td>{kindWords[kind]}</td>
      <td>
        <NumberWithRange value={energy_cm1} sigma={sigma_cm1} />
      </td>
      <td className="figures">{formatFigures(fromWavenumber(energy_cm1, 'nm'), 3)}</td>
      <td className="figures">
        {formatFigures(widthFromWavenumber(energy_cm1, width_cm1, unit), 2)} {unitText[unit]}
      </td>
      <td className="figures">
        {formatFigures(molarAbsorptivity, 1)}{' '}
        <span className="soft">
          ({formatFigures(low, 1)}–{formatFigures(high, 1)})
        </span>
      </td>
      <td className="soft">{band.configuration ?? ''}</td>
    </tr>
  );
}
