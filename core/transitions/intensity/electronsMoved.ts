import type { ConfigurationWeight } from '../../dshell/types';

/** Electrons that change between the two sets of d orbitals, from the leading configurations. */
export const electronsMoved = (
  from: readonly ConfigurationWeight[],
  to: readonly ConfigurationWeight[],
): number => (from[0] === undefined || to[0] === undefined ? 0 : Math.abs(to[0].e - from[0].e));

/** How strongly light couples configurations that differ by none, one, two or more electrons between the sets. */
const coupling = (apart: number): number => (apart === 1 ? 1 : apart === 0 ? 0.1 : 0.02);

/** Levels that run steeper than this against 10Dq have moved two electrons. */
const steepOfTwo = 1.4;
const shareOfTwo = 0.1;

/**
 * Share (0 to 1) of a transition that moves one electron: light moves one at a time, so a jump of two appears only by
 * what configuration interaction mixes in. Told by the slope against 10Dq where the configurations are not known.
 */
export function oneElectronShare(
  from: readonly ConfigurationWeight[],
  to: readonly ConfigurationWeight[],
  slopeTenDq = 1,
): number {
  if (from.length === 0 || to.length === 0) return Math.abs(slopeTenDq) > steepOfTwo ? shareOfTwo : 1;
  let sum = 0;
  for (const before of from) {
    for (const after of to) sum += before.weight * after.weight * coupling(Math.abs(after.e - before.e));
  }
  return sum;
}

/** `t2g5 eg1` */
export const configurationText = (
  weights: readonly ConfigurationWeight[],
  even: string,
): string | undefined =>
  weights[0] === undefined ? undefined : `t2${even}${weights[0].t2} e${even}${weights[0].e}`;
