import { SpinhueError } from '../errors';
import { type LevelProblem } from '../dshell';

/** A d^N ion whose magnetism is asked for. */
export interface MagneticProblem extends Omit<LevelProblem, 'zeeman'> {
  /** Stevens orbital reduction k of μ = kL + g_e S; 1 where left out. It does not touch ζ. */
  readonly orbitalReduction?: number;
  /** g of the electron spin; 2.0023 where left out. */
  readonly ge?: number;
}

export const electronG = 2.0023;

/** k and g_e with their defaults. Throws `not-finite`, and `out-of-range` for a negative k. */
export function momentFactors({ orbitalReduction: k = 1, ge = electronG }: MagneticProblem): {
  k: number;
  ge: number;
} {
  for (const [field, value] of [
    ['orbitalReduction', k],
    ['ge', ge],
  ] as const) {
    if (!Number.isFinite(value)) {
      throw new SpinhueError({
        code: 'not-finite',
        message: `${field} is ${value}`,
        field,
        remedy: 'give a finite number',
      });
    }
  }
  if (k < 0) {
    throw new SpinhueError({
      code: 'out-of-range',
      message: `orbitalReduction is ${k}; it cannot be negative`,
      field: 'orbitalReduction',
      remedy: 'give 1, or the reduction, usually 0.6 to 1',
    });
  }
  return { k, ge };
}

/** Throws `out-of-range` or `not-finite` unless every temperature is above 0 K. */
export function checkTemperatures(temperatures_K: readonly number[]): void {
  temperatures_K.forEach((T, i) => {
    if (Number.isFinite(T) && T > 0) return;
    throw new SpinhueError({
      code: Number.isFinite(T) ? 'out-of-range' : 'not-finite',
      message: `temperatures_K[${i}] is ${T}; temperatures are above 0 K`,
      field: `temperatures_K[${i}]`,
      remedy: 'give temperatures in kelvin',
    });
  });
}
