import { useUnit } from '../../parts/number';
import { spectralColour, visibleFrom_nm, visibleTo_nm } from '../../parts/colour';
import { fromWavenumber, wavenumberFromWavelength_cm1, type EnergyUnit } from '../../../core/units';
import { type PlotView } from '../frame';

/** Height of the strip, px. */
const thickness = 7;

/** The visible spectrum as a strip under the axis line, whichever unit the axis has. */
export function VisibleBand({ view, unit }: { readonly view: PlotView; readonly unit?: EnergyUnit }) {
  const { unit: chosen } = useUnit();
  const { area, x, id } = view;
  const at = (nm: number): number => x(fromWavenumber(wavenumberFromWavelength_cm1(nm), unit ?? chosen));
  const [one, other] = [at(visibleFrom_nm), at(visibleTo_nm)];
  const [left, right] = [Math.min(one, other), Math.max(one, other)];
  const stops: { offset: number; nm: number }[] = [];
  for (let nm = visibleFrom_nm; nm <= visibleTo_nm; nm += 10) {
    stops.push({ offset: (at(nm) - left) / (right - left), nm });
  }
  stops.sort((first, second) => first.offset - second.offset);
  const [from, to] = [Math.max(left, area.left), Math.min(right, area.right)];
  if (from >= to) return null;
  return (
    <g className="visible-band">
      <linearGradient id={`${id}-visible`} gradientUnits="userSpaceOnUse" x1={left} x2={right}>
        {stops.map(({ offset, nm }) => (
          <stop key={nm} offset={offset} stopColor={spectralColour(nm)} />
        ))}
      </linearGradient>
      <rect x={from} y={area.bottom + 1} width={to - from} height={thickness} fill={`url(#${id}-visible)`} />
      {[left, right].map((edge) =>
        edge > area.left && edge < area.right ? (
          <line key={edge} className="visible-edge" x1={edge} x2={edge} y1={area.top} y2={area.bottom} />
        ) : null,
      )}
    </g>
  );
}
