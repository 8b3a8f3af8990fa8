import { useId, useMemo, useState } from 'react';
import { chanceOfBand } from '../../../core/colour';
import { estimateDraws } from '../../../core/prediction';
import type { Prediction } from '../../../core/prediction/types';
import { findSolvent, hiddenBySolvent } from '../../../core/spectrum';
import type { Band } from '../../../core/transitions/types';
import { fromWavenumber, widthFromWavenumber } from '../../../core/units';
import { NumberField } from '../../app/form';
import {
  ConfigurationLabel,
  Explain,
  formatFigures,
  formatShare,
  NumberWithRange,
  TermSymbol,
  unitText,
  useUnit,
} from '../../parts';
import './BandTable.css';

const draws = 200;

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

interface BandTableProps {
  readonly prediction: Prediction;
  readonly solvent: string | null;
}

/** All bands with their ranges and reasons, and the chance that one lies where it is wanted. */
export function BandTable({ prediction, solvent }: BandTableProps) {
  const { bands } = prediction;
  const [all, setAll] = useState(false);
  const shown = all ? bands : bands.filter(worthShowing);
  const hidden = bands.length - shown.length;
  return (
    <section className="panel sheet-wide" aria-labelledby="sheet-bands">
      <div className="with-explain">
        <h2 id="sheet-bands">Bands</h2>
        <Explain quantity="band" />
        <Explain quantity="strength" />
      </div>
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
                <th scope="col">
                  <abbr title="leading strong-field configuration of the upper level">Configuration</abbr>
                </th>
              </tr>
            </thead>
            <tbody>
              {shown.map((band, index) => (
                <BandRow key={`${band.label} ${index}`} band={band} solvent={solvent} />
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
      {bands.length > 0 && <WindowChance prediction={prediction} />}
    </section>
  );
}

function BandRow({ band, solvent }: { readonly band: Band; readonly solvent: string | null }) {
  const { unit } = useUnit();
  const window = solvent === null ? undefined : findSolvent(solvent);
  const hidden = window && hiddenBySolvent(band.wavelength_nm, window);
  const { label, kind, energy_cm1, sigma_cm1, width_cm1, molarAbsorptivity, molarAbsorptivityRange } = band;
  const [low, high] = molarAbsorptivityRange;
  return (
    <tr>
      <th scope="row">
        <TermSymbol label={label} />
        {band.component !== undefined && <span className="small soft"> {band.component}</span>}
      </th>
      <td>
        {kindWords[kind]}
        {hidden && <span className="small soft">; hidden: {hidden}</span>}
        {band.reasons.length > 0 && (
          <details className="small">
            <summary>
              Why<span className="visually-hidden"> the band {label}</span>
            </summary>
            <ul className="band-reasons">
              {band.reasons.map((reason) => (
                <li key={reason}>{reason}</li>
              ))}
            </ul>
          </details>
        )}
      </td>
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
      <td className="soft">
        {band.configuration !== undefined && <ConfigurationLabel text={band.configuration} />}
      </td>
    </tr>
  );
}

/** The share of the draws with a band between two wavelengths. */
function WindowChance({ prediction }: { readonly prediction: Prediction }) {
  const [from_nm, setFrom] = useState<number | null>(null);
  const [to_nm, setTo] = useState<number | null>(null);
  const [atLeast, setAtLeast] = useState(1);
  const id = useId();
  const drawn = useMemo(() => estimateDraws(prediction, draws), [prediction]);
  const [least, most] = [Math.min(from_nm ?? 0, to_nm ?? 0), Math.max(from_nm ?? 0, to_nm ?? 0)];
  return (
    <fieldset className="band-window" aria-describedby={id}>
      <legend>Chance of a band between</legend>
      <NumberField
        label="From"
        unit="nm"
        value={from_nm}
        onChange={setFrom}
        empty="such as 540"
        most={10_000}
      />
      <NumberField label="to" unit="nm" value={to_nm} onChange={setTo} empty="such as 580" most={10_000} />
      <NumberField
        label="with at least"
        unit="L mol⁻¹ cm⁻¹"
        value={atLeast}
        onChange={(value) => value !== null && setAtLeast(value)}
      />
      <output id={id}>
        {from_nm === null || to_nm === null
          ? 'Give two wavelengths.'
          : `${formatShare(chanceOfBand(drawn, { from_nm: least, to_nm: most, minMolarAbsorptivity: atLeast }))} of ${draws} draws`}
      </output>
    </fieldset>
  );
}
