import type { ConfigurationWeight } from '../../dshell/types';

/** Electrons that change between the two sets of d orbitals, from the leading configurations. */
export const electronsMoved = (
  from: readonly ConfigurationWeight[],
  to: readonly ConfigurationWeight[],
): number => (from[0] === undefined || to[0] === undefined ? 0 : Math.abs(to[0].e - from[0].e));

/** How strongly light couples configurations that differ by none, one, two or more electrons between the sets. */
const coupling = (apart: number): number => (apart === 1 ? 1 : apart === 0 ? 0.1 : 0.02);

/**
 * Share (0 to 1) of a transition that moves one electron: light moves one at a time, so a jump of two appears only by
 * what configuration interaction mixes in. 1 where the configurations are not known.
 */
export function oneElectronShare(
  from: readonly ConfigurationWeight[],
  to: readonly ConfigurationWeight[],
): number {
  if (from.length === 0 || to.length === 0) return 1;
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
