import { type ReactElement } from 'react';
import { type LegendEntry } from '../frame';
import { type ColourTarget } from './colourTarget';

/** Marks are black and white on the surround, so their samples need it too. */
const onSurround = (mark: ReactElement): ReactElement => (
  <g className="cloud-target">
    <rect className="cloud-surround" width={32} height={14} />
    {mark}
  </g>
);

/** What the marks of the colour plane mean; only what is drawn. */
export function cloudLegend(hasCentre: boolean, target: ColourTarget | null): LegendEntry[] {
  const draw: LegendEntry = {
    text: 'draw',
    sample: onSurround(<circle className="cloud-draw cloud-legend" cx={16} cy={7} r={4} />),
  };
  const met: LegendEntry = {
    text: 'draw that meets the target',
    sample: onSurround(<circle className="cloud-draw cloud-met cloud-legend" cx={16} cy={7} r={4.5} />),
  };
  const centre: LegendEntry = {
    text: 'central estimate',
    sample: onSurround(<rect className="cloud-centre cloud-legend" x={11} y={2} width={10} height={10} />),
  };
  return [
    draw,
    ...(target ? [met] : []),
    ...(hasCentre ? [centre] : []),
    ...(target
      ? [
          {
            text: target.name ?? 'target and tolerance',
            sample: onSurround(<path className="cloud-line" d="M10 7H22M16 1V13" />),
          },
        ]
      : []),
  ];
}
