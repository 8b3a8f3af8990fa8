import { type CubicGeometry } from '../../../core/dshell/types';
import { type DiagramAxes } from '../../plots';

/** Everything that the diagram shows follows from these. */
export interface DiagramSettings {
  /** 1 to 9. */
  readonly dElectrons: number;
  readonly geometry: CubicGeometry;
  /** cm⁻¹. */
  readonly tenDq: number;
  readonly B: number;
  readonly cOverB: number;
  readonly axes: DiagramAxes;
}

/** Ends of the sliders; typed numbers may go further where the last entry allows it. */
export const limits = {
  tenDq: { from: 0, to: 40_000, step: 100, most: 200_000 },
  B: { from: 100, to: 1_400, step: 5, most: 5_000 },
  cOverB: { from: 2, to: 8, step: 0.05, most: 20 },
} as const;

/** About those of hexaaquachromium(III), where most textbooks begin: 10Dq 17 400, B 725, C 2 900 cm⁻¹. */
export const firstSettings: DiagramSettings = {
  dElectrons: 3,
  geometry: 'octahedral',
  tenDq: 17_400,
  B: 725,
  cOverB: 4,
  axes: 'over-B',
};

/** Part of an address that opens the diagram with these settings. */
export const diagramItem = ({ dElectrons, geometry, tenDq, B, cOverB, axes }: DiagramSettings): string =>
  [`d${dElectrons}`, geometry, Math.round(tenDq), Math.round(B), Number(cOverB.toFixed(3)), axes].join('_');

const within = (text: string | undefined, least: number, most: number): number | null => {
  const value = Number(text);
  return text !== undefined && text !== '' && value >= least && value <= most ? value : null;
};

/** Settings from an address; what cannot be read keeps its first value. */
export function readDiagramItem(item: string | null): DiagramSettings {
  const [count, geometry, tenDq, B, cOverB, axes] = item?.split('_') ?? [];
  const dElectrons = within(/^d([1-9])$/.exec(count ?? '')?.[1], 1, 9);
  return {
    dElectrons: dElectrons ?? firstSettings.dElectrons,
    geometry: geometry === 'tetrahedral' ? 'tetrahedral' : 'octahedral',
    tenDq: within(tenDq, 0, limits.tenDq.most) ?? firstSettings.tenDq,
    B: within(B, 1, limits.B.most) ?? firstSettings.B,
    cOverB: within(cOverB, 0, limits.cOverB.most) ?? firstSettings.cOverB,
    axes: axes === 'absolute' ? 'absolute' : 'over-B',
  };
}

/** End of the field axis: round, with the chosen field well inside. */
export function fieldAxisEnd({ tenDq, B, axes }: DiagramSettings): number {
  const [at, usual, step] = axes === 'over-B' ? [tenDq / B, 40, 10] : [tenDq, 30_000, 10_000];
  return Math.max(usual, Math.ceil((at * 1.15) / step) * step);
}
