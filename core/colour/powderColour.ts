import { kubelkaMunk } from '../spectrum/kubelkaMunk';
import type { SpectralBand } from '../spectrum/spectralBand';
import { visibleMolarAbsorptivity, visibleCount, visibleReflectance } from '../spectrum/visibleTransmission';
import { checkBands, checkNumber } from './checkConditions';
import { seenColour } from './seenColour';
import { tristimulus, viewingWeights, type Viewing } from './tristimulus';
import type { SeenColour } from './types';

/** A thick layer of powder under a lamp. */
export interface PowderConditions extends Viewing {
  /** K/S per unit of molar absorptivity. */
  readonly scale: number;
  /** K/S of the powder without the bands; 0 for a perfect white. */
  readonly background?: number;
}

/**
 * Seen colour of a powder by Kubelka and Munk: an estimate of a second class beside that of a solution, since grain
 * size, scattering and gloss are not known before the powder is made. Throws as `colourOfSolution`.
 */
export function colourOfPowder(bands: readonly SpectralBand[], conditions: PowderConditions): SeenColour {
  const { scale, background = 0 } = conditions;
  checkNumber('scale', scale, 0);
  checkNumber('background', background, 0);
  checkBands(bands);
  const weights = viewingWeights(conditions);
  return seenColour(tristimulus(visibleReflectance(bands, scale, background), weights), weights, 'powder');
}

/**
 * The scale at which the darkest visible wavelength reflects `reflectance` (0.15 unless said): a full shade, for
 * showing a powder whose grain size nobody knows yet. 0 where nothing absorbs in the visible.
 */
export function fullShadeScale(bands: readonly SpectralBand[], reflectance = 0.15): number {
  const highest = Math.max(...visibleMolarAbsorptivity(bands, new Float64Array(visibleCount)));
  return highest > 0 ? kubelkaMunk(reflectance) / highest : 0;
}
