import { useDeferredValue, useMemo } from 'react';
import { cubicLevels, groundCrossovers, type CubicLevel, type GroundLevelName } from '../../../core/dshell';
import { computedLines, type Crossover, type LevelLine } from '../../plots';
import { fieldAxisEnd, type DiagramSettings } from './diagramSettings';

export interface Diagram {
  /** What the lines belong to: a moment behind the sliders while they move. */
  readonly settings: DiagramSettings;
  readonly lines: readonly LevelLine[];
  readonly levels: readonly CubicLevel[];
  /** In 10Dq/B. */
  readonly crossovers: readonly Crossover[];
}

/** Lines, levels and crossovers for the settings; computing never holds up the sliders. */
export function useDiagram(now: DiagramSettings): Diagram {
  const settings = useDeferredValue(now);
  const { dElectrons, geometry, tenDq, B, cOverB, axes } = settings;
  const upTo = fieldAxisEnd(settings);
  // E/B against 10Dq/B does not depend on B, so the lines stay while B or 10Dq move.
  const scaleB = axes === 'over-B' ? 1_000 : B;
  const lines = useMemo(
    () => computedLines({ dElectrons, geometry, B: scaleB, C: scaleB * cOverB, axes, upTo, count: 101 }),
    [dElectrons, geometry, scaleB, cOverB, axes, upTo],
  );
  const levels = useMemo(
    () => cubicLevels({ dElectrons, geometry, tenDq, B, C: B * cOverB }),
    [dElectrons, geometry, tenDq, B, cOverB],
  );
  const crossovers = useMemo(() => {
    const g = geometry === 'octahedral' ? 'g' : '';
    const label = ({ multiplicity, irrep }: GroundLevelName): string => `${multiplicity}${irrep}${g}`;
    return groundCrossovers(dElectrons, cOverB, geometry).map(({ tenDqOverB, weak, strong }) => ({
      ...{ x: tenDqOverB, from: label(weak), to: label(strong) },
    }));
  }, [dElectrons, geometry, cOverB]);
  return { settings, lines, levels, crossovers };
}
