import type { BandDraws } from '../transitions/bandDraws';
import type { BulkColours } from './colourBulk';
import { tripleAt } from './colourCloud';
import { colourDifference } from './colourDifference';
import type { Triple } from './tristimulus';

/** Absorb here: a band centre between two wavelengths, at least so strong. */
export interface BandTarget {
  readonly from_nm: number;
  readonly to_nm: number;
  /** L mol⁻¹ cm⁻¹ */
  readonly minMolarAbsorptivity?: number;
}

/** Share of the draws that have a band centre in the window: the probability that the target is met. */
export function chanceOfBand(draws: BandDraws, target: BandTarget): number {
  const [lowest, highest] = [1e7 / target.to_nm, 1e7 / target.from_nm];
  const least = target.minMolarAbsorptivity ?? 0;
  let met = 0;
  for (let draw = 0; draw < draws.count; draw++) {
    for (let band = draw * draws.bandCount; band < (draw + 1) * draws.bandCount; band++) {
      const energy = draws.energy[band]!;
      if (energy >= lowest && energy <= highest && draws.molarAbsorptivity[band]! >= least) {
        met++;
        break;
      }
    }
  }
  return draws.count === 0 ? 0 : met / draws.count;
}

/** Look like this: L*a*b* and the largest CIEDE2000 difference that will do. */
export interface ColourTarget {
  readonly lab: Triple;
  readonly tolerance: number;
}

/** Share of the draws within the tolerance: never the colour of the mean, which no draw need have. */
export function chanceOfColour(colours: BulkColours, target: ColourTarget): number {
  let met = 0;
  for (let draw = 0; draw < colours.count; draw++) {
    if (colourDifference(tripleAt(colours.lab, draw), target.lab) <= target.tolerance) met++;
  }
  return colours.count === 0 ? 0 : met / colours.count;
}

/** Median CIEDE2000 difference of the draws from a target, for ranking where hardly any draw meets it. */
export function medianDifference(colours: BulkColours, lab: Triple): number {
  const differences = Float64Array.from({ length: colours.count }, (_, draw) =>
    colourDifference(tripleAt(colours.lab, draw), lab),
  ).sort();
  const middle = colours.count >> 1;
  return colours.count % 2 === 1
    ? differences[middle]!
    : (differences[middle - 1]! + differences[middle]!) / 2;
}
