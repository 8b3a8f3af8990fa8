import { cubicLevels } from '../../core/dshell';
import { linesFromLevels, type LevelLine } from '../plots/levelDiagram/levelLine';
import type { DiagramRequest } from './protocol';

const columns = 73;

/** Levels at equal steps of the field, joined into lines. */
export function diagramLines({ dElectrons, geometry, B, C, upTo, axes }: DiagramRequest): LevelLine[] {
  const scale = axes === 'over-B' && B > 0 ? 1 / B : 1;
  const computed = Array.from({ length: columns }, (_, step) => {
    const tenDq = (upTo * step) / (columns - 1);
    return { x: tenDq * scale, levels: cubicLevels({ dElectrons, geometry, tenDq, B, C }) };
  });
  return linesFromLevels(computed, scale);
}
