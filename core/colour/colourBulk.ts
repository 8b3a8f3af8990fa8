import { molesPerLitre } from '../spectrum/beerLambert';
import { addVisibleBand, densityToTransmittance } from '../spectrum/visibleDensity';
import { visibleCount } from '../spectrum/visibleTransmission';
import type { BandDraws } from '../transitions/bandDraws';
import { labInto } from './cieLab';
import { checkNumber } from './checkConditions';
import type { SolutionConditions } from './solutionColour';
import { tristimulusInto, viewingWeights, type ViewingWeights } from './tristimulus';

/** Colours of many draws, three numbers each; words and screen colours are made when they are looked at. */
export interface BulkColours {
  readonly count: number;
  readonly weights: ViewingWeights;
  readonly XYZ: Float64Array;
  readonly lab: Float64Array;
}

/**
 * XYZ and L*a*b* of a solution for every draw. One pass over 81 wavelengths per band, no allocation per draw; made for
 * clouds that follow a slider and for search.
 */
export function colourBulk(draws: BandDraws, conditions: SolutionConditions): BulkColours {
  checkNumber('concentration_mM', conditions.concentration_mM, 0);
  checkNumber('path_cm', conditions.path_cm, 0, true);
  const weights = viewingWeights(conditions);
  const strength = molesPerLitre(conditions.concentration_mM) * conditions.path_cm * Math.LN10;
  const XYZ = new Float64Array(3 * draws.count);
  const lab = new Float64Array(3 * draws.count);
  const passed = new Float64Array(visibleCount);
  const { energy, width, molarAbsorptivity, bandCount } = draws;
  for (let draw = 0; draw < draws.count; draw++) {
    passed.fill(0);
    for (let band = draw * bandCount; band < (draw + 1) * bandCount; band++) {
      addVisibleBand(passed, energy[band]!, width[band]!, molarAbsorptivity[band]! * strength);
    }
    densityToTransmittance(passed);
    const at = 3 * draw;
    tristimulusInto(passed, weights, XYZ, at);
    labInto(XYZ[at]!, XYZ[at + 1]!, XYZ[at + 2]!, weights.white, lab, at);
  }
  return { count: draws.count, weights, XYZ, lab };
}
