import { computedLines } from '../plots/levelDiagram/computedLines';
import { type LevelLine } from '../plots/levelDiagram/levelLine';
import type { DiagramRequest } from './protocol';

const columns = 73;

/** Levels along the field, joined into lines. */
export function diagramLines({ dElectrons, geometry, B, C, upTo, axes }: DiagramRequest): LevelLine[] {
  const overB = axes === 'over-B' && B > 0;
  return computedLines({
    ...{ dElectrons, geometry, B, C, count: columns },
    axes: overB ? 'over-B' : 'absolute',
    upTo: overB ? upTo / B : upTo,
  });
}
