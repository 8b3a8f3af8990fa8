import type { SpectralBand } from '../spectrum/spectralBand';
import { visibleTransmission } from '../spectrum/visibleTransmission';
import { checkBands, checkNumber } from './checkConditions';
import { seenColour } from './seenColour';
import { tristimulus, viewingWeights, type Viewing } from './tristimulus';
import type { SeenColour } from './types';

/** A cell in front of a lamp. A colour is never stated without these. */
export interface SolutionConditions extends Viewing {
  readonly concentration_mM: number;
  readonly path_cm: number;
}

/**
 * Seen colour of a solution: what passes, weighed by lamp and eye. Never the complement of one absorbed wavelength.
 * Throws `SpinhueError` (`out-of-range`, `not-finite`) with the name of the field; a concentration of 0 is the
 * solvent.
 */
export function colourOfSolution(bands: readonly SpectralBand[], conditions: SolutionConditions): SeenColour {
  checkNumber('concentration_mM', conditions.concentration_mM, 0);
  checkNumber('path_cm', conditions.path_cm, 0, true);
  checkBands(bands);
  const weights = viewingWeights(conditions);
  const passed = visibleTransmission(bands, conditions.concentration_mM, conditions.path_cm);
  return seenColour(tristimulus(passed, weights), weights);
}

/** A third, once and three times the stated strength: hue moves with concentration times path. */
export const strengthFactors = [1 / 3, 1, 3] as const;

export const colourAtThreeStrengths = (
  bands: readonly SpectralBand[],
  conditions: SolutionConditions,
): { readonly factor: number; readonly colour: SeenColour }[] =>
  strengthFactors.map((factor) => ({
    factor,
    colour: colourOfSolution(bands, {
      ...conditions,
      concentration_mM: conditions.concentration_mM * factor,
    }),
  }));
