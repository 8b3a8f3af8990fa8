import { molesPerLitre } from '../spectrum/beerLambert';
import { gaussianReach, tabulatedGaussian } from '../spectrum/gaussianTable';
import { visibleCount, visibleWavenumbers_cm1 } from '../spectrum/visibleTransmission';
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

const passed = new Float64Array(visibleCount);
/** Wavenumber falls along the grid; the first and the last bound every search in it. */
const [firstPlace, lastPlace] = [visibleWavenumbers_cm1[0]!, visibleWavenumbers_cm1[visibleCount - 1]!];
/** A band that adds less than this to the optical density (natural) anywhere cannot be seen. */
const invisible = 3e-4;
const [from_nm, step_nm] = [1e7 / firstPlace, (1e7 / lastPlace - 1e7 / firstPlace) / (visibleCount - 1)];

/** First point of the grid at or below a wavenumber. */
const firstBelow = (wavenumber: number): number =>
  wavenumber >= firstPlace ? 0 : Math.ceil((1e7 / wavenumber - from_nm) / step_nm);

/** Optical density of draw `draw` on the visible grid, into `passed`. */
function densityOfDraw(draws: BandDraws, draw: number, strength: number): void {
  passed.fill(0);
  for (let band = draw * draws.bandCount; band < (draw + 1) * draws.bandCount; band++) {
    const height = draws.molarAbsorptivity[band]! * strength;
    if (!(height > invisible)) continue;
    const centre = draws.energy[band]!;
    const width = draws.width[band]!;
    const reach = width * Math.min(gaussianReach, Math.sqrt(Math.log(height / invisible) / (4 * Math.LN2)));
    const lowest = centre - reach;
    const perWidth = 1 / width;
    for (let point = firstBelow(centre + reach); point < visibleCount; point++) {
      const place = visibleWavenumbers_cm1[point]!;
      if (place < lowest) break;
      passed[point] = passed[point]! + height * tabulatedGaussian(Math.abs(place - centre) * perWidth);
    }
  }
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
  for (let draw = 0; draw < draws.count; draw++) {
    densityOfDraw(draws, draw, strength);
    for (let point = 0; point < visibleCount; point++) passed[point] = Math.exp(-passed[point]!);
    const at = 3 * draw;
    tristimulusInto(passed, weights, XYZ, at);
    labInto(XYZ[at]!, XYZ[at + 1]!, XYZ[at + 2]!, weights.white, lab, at);
  }
  return { count: draws.count, weights, XYZ, lab };
}
