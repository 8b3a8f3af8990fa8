import { type SeenColour } from '../../../core/colour/types';
import { linearScale, type PlotView } from '../frame';
import { type ColourTarget } from './colourTarget';

interface LightnessColumnProps {
  readonly view: PlotView;
  readonly draws: readonly SeenColour[];
  readonly centre: SeenColour | null;
  readonly target: ColourTarget | null;
}

/** The third coordinate beside the plane: every draw as a tick at its L*, the tolerance as an extent. */
export function LightnessColumn({ view, draws, centre, target }: LightnessColumnProps) {
  const { area } = view;
  const left = area.right + 26;
  const width = 26;
  const at = linearScale([0, 100], [area.bottom, area.top]);
  const clamped = (value: number): number => at(Math.max(0, Math.min(100, value)));
  return (
    <g className="lightness-column">
      <rect className="cloud-surround" x={left} y={area.top} width={width} height={area.bottom - area.top} />
      {draws.map(({ lab: [L], srgb }, index) => (
        <line
          key={index}
          x1={left + 3}
          x2={left + width - 3}
          y1={at(L)}
          y2={at(L)}
          stroke={srgb}
          strokeWidth={2}
        />
      ))}
      {centre && (
        <rect
          className="cloud-centre"
          x={left - 2}
          y={at(centre.lab[0]) - 3}
          width={width + 4}
          height={6}
          fill={centre.srgb}
        />
      )}
      {target && (
        <g className="cloud-target">
          <path
            className="cloud-line"
            d={`M${left - 4} ${clamped(target.lab[0] + target.tolerance)}H${left + width + 4}M${left - 4} ${clamped(target.lab[0] - target.tolerance)}H${left + width + 4}`}
          />
        </g>
      )}
      {[0, 25, 50, 75, 100].map((value) => (
        <g key={value}>
          <line className="plot-tick" x1={left + width} x2={left + width + 4} y1={at(value)} y2={at(value)} />
          <text x={left + width + 8} y={at(value) + 4}>
            {value}
          </text>
        </g>
      ))}
      <text x={left + width / 2} y={area.top - 8} textAnchor="middle">
        L*
      </text>
    </g>
  );
}
