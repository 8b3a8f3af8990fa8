import { estimateField } from '../../estimation';
import { findIon, type ParameterLibrary } from '../../library';
import { chanceWithin } from '../score/chance';
import type { SpaceCandidate } from '../space/candidates';
import { possibleUnpaired } from '../wish/contradictions';
import type { Wish } from '../wish/wish';

/** What the spin parts can be at most: 0 where no state of the ion has the wished number of unpaired electrons. */
function spinBound(dElectrons: number, { spin, unpaired }: Wish): number {
  const [most, ...fewer] = possibleUnpaired(dElectrons);
  const states = spin === 'high' ? [most!] : spin === 'low' ? fewer : [most!, ...fewer];
  if (unpaired === undefined) return states.length > 0 ? 1 : 0;
  return states.some((n) => n >= unpaired.min && n <= unpaired.max) ? 1 : 0;
}

/** The larger of the chances that 10Dq at either spin state's distance lies in the wished range. */
function tenDqBound(
  candidate: SpaceCandidate,
  { min, max }: { min: number; max: number },
  library: ParameterLibrary,
) {
  const field = estimateField(candidate, library);
  if (field === null) return 0;
  return Math.max(
    ...[field.fields.high, field.fields.low].map(({ value, sigma }) =>
      value === null || sigma === null ? 0 : chanceWithin(value, sigma, min, max),
    ),
  );
}

/**
 * A number that the score of a candidate cannot exceed, at a fraction of the price of the score: a whole wish is never
 * likelier than its parts. Parts that cost as much as the estimate itself are not looked at.
 */
export function upperBound(candidate: SpaceCandidate, wish: Wish, library: ParameterLibrary): number {
  const ion = findIon(library, candidate.metal, candidate.oxidationState);
  if (ion === undefined) return 0;
  const spin = spinBound(ion.dElectrons, wish);
  if (spin === 0) return 0;
  return wish.tenDq_cm1 === undefined ? spin : tenDqBound(candidate, wish.tenDq_cm1, library);
}
