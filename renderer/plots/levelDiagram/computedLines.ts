import { cubicLevels, type CubicGeometry } from '../../../core/dshell';
import { type DiagramAxes } from './diagramUnits';
import { linesFromLevels, type LevelLine } from './levelLine';

export interface DiagramProblem {
  readonly dElectrons: number;
  readonly geometry: CubicGeometry;
  /** Racah parameters, cm⁻¹. */
  readonly B: number;
  readonly C: number;
  readonly axes: DiagramAxes;
  /** End of the field axis, in its own unit: cm⁻¹ for `absolute`, 10Dq/B otherwise. */
  readonly upTo: number;
  /** Points along each line. */
  readonly count?: number;
}

/** All lines of the level diagram of one ion, exact at every point. */
export function computedLines(problem: DiagramProblem): LevelLine[] {
  const { dElectrons, geometry, B, C, axes, upTo, count = 81 } = problem;
  const unit = axes === 'over-B' ? B : 1;
  return linesFromLevels(
    Array.from({ length: count }, (_, index) => {
      const x = (upTo * index) / (count - 1);
      return { x, levels: cubicLevels({ dElectrons, geometry, tenDq: x * unit, B, C }) };
    }),
    1 / unit,
  );
}
