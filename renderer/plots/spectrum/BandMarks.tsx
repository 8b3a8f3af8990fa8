import { type Band } from '../../../core/transitions/types';
import { fromWavenumber, type EnergyUnit } from '../../../core/units';
import { TermText } from '../../parts/chemistry';
import { type PlotView } from '../frame';
import { labelPlaces } from '../levelDiagram/labelPlaces';
import { bandDash } from './lineDash';

/** Room above the plot for centres with their extents and labels, px. */
export const bandRail = 46;

interface BandMarksProps {
  readonly view: PlotView;
  readonly bands: readonly Band[];
  readonly unit: EnergyUnit;
}

/** Above the plot: the centre of each band, its 68 % extent and its label, moved apart where they crowd. */
export function BandMarks({ view, bands, unit }: BandMarksProps) {
  const { area, x } = view;
  const at = (wavenumber: number): number => x(fromWavenumber(Math.max(1, wavenumber), unit));
  const shown = bands
    .map((band) => ({ band, centre: at(band.energy_cm1) }))
    .filter(({ centre }) => centre >= area.left && centre <= area.right)
    .sort((one, other) => one.centre - other.centre);
  // Labels of spin-forbidden bands give way first where there is no room for all.
  const fits = Math.max(1, Math.floor((area.right - area.left) / 40));
  const named = new Set(
    [...shown]
      .sort((one, other) => other.band.molarAbsorptivity - one.band.molarAbsorptivity)
      .slice(0, fits)
      .map(({ band }) => band),
  );
  const labelled = shown.filter(({ band }) => named.has(band));
  const places = labelPlaces(
    labelled.map(({ centre }) => centre),
    38,
    [area.left + 10, area.right - 10],
  );
  const rail = area.top - 10;
  return (
    <g className="band-marks">
      {shown.map(({ band, centre }, index) => {
        const ends = [at(band.energy_cm1 - band.sigma_cm1), at(band.energy_cm1 + band.sigma_cm1)];
        const [from, to] = [Math.max(area.left, Math.min(...ends)), Math.min(area.right, Math.max(...ends))];
        return (
          <g key={index}>
            <line className="band-extent" x1={from} x2={to} y1={rail} y2={rail} />
            <path className="band-centre" d={`M${centre} ${rail - 5}V${rail + 5}`} />
            <line
              className="band-drop"
              x1={centre}
              x2={centre}
              y1={rail + 5}
              y2={area.bottom}
              strokeDasharray={bandDash(band.kind) ?? '1 0'}
            />
          </g>
        );
      })}
      {labelled.map(({ band, centre }, index) => {
        const place = places?.[index] ?? centre;
        return (
          <g key={index}>
            <path className="band-leader" d={`M${centre} ${rail - 6}L${place} ${rail - 13}`} fill="none" />
            <text x={place} y={rail - 17} textAnchor="middle">
              <TermText label={band.multiplicity === null ? band.kind : band.label} />
            </text>
          </g>
        );
      })}
    </g>
  );
}
