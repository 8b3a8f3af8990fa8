import { Axes, linearScale, linePath, PlotClip, type PlotView } from '../frame';
import { linearTicks } from '../frame/ticks';

interface ResidualPanelProps {
  /** View of the spectrum above; the panel shares its x axis. */
  readonly view: PlotView;
  readonly xs: ArrayLike<number>;
  readonly residual: Float64Array;
  readonly noise: number | null;
  /** From the foot of the spectrum to the foot of the drawing, px. */
  readonly room: number;
}

/** What the fit leaves over, with the 68 and 95 % extents of the noise behind it. A pattern here is a missing band. */
export function ResidualPanel({ view, xs, residual, noise, room }: ResidualPanelProps) {
  const top = view.area.bottom + 22;
  const bottom = view.area.bottom + room - 46;
  const reach = residual.reduce((most, value) => Math.max(most, Math.abs(value)), (noise ?? 0) * 2.5) || 1;
  const domain = [-reach * 1.1, reach * 1.1] as const;
  const panel: PlotView = {
    ...view,
    id: `${view.id}-residual`,
    area: { ...view.area, top, bottom },
    y: linearScale(domain, [bottom, top]),
    yTicks: linearTicks(domain, bottom - top, 'y'),
    yLabel: 'Residual',
  };
  const band = (share: number) => ({
    x: view.area.left,
    width: view.area.right - view.area.left,
    y: panel.y(share * noise!),
    height: panel.y(-share * noise!) - panel.y(share * noise!),
  });
  return (
    <g>
      {noise !== null && noise > 0 && (
        <PlotClip view={panel}>
          <rect className="residual-95" {...band(1.96)} />
          <rect className="residual-68" {...band(1)} />
        </PlotClip>
      )}
      <Axes view={panel} />
      <line className="plot-tick" x1={view.area.left} x2={view.area.right} y1={panel.y(0)} y2={panel.y(0)} />
      <PlotClip view={panel}>
        <path className="fit-residual" fill="none" d={linePath(xs, residual, view.x, panel.y)} />
      </PlotClip>
    </g>
  );
}
