import type { IonRecord, ParameterLibrary } from '../library';
import { distanceFactor } from './distance';
import type { Factor } from './ligandStrength';
import { metalStrength } from './metalStrength';

/** Good to this for a donor that the plane's g was not taken from. */
const sigma = 0.08;

/**
 * Metal factor for x2-y2 above xy in a square plane, where four short bonds stand in for six longer ones: from a planar
 * complex of the ion where one is on file, else from the octahedral g and Shannon's two radii.
 */
export function planarStrength(ion: IonRecord, library: ParameterLibrary): Factor | null {
  const own = ion.gSquarePlanar;
  if (own.value !== null) {
    return {
      value: own.value,
      sigma: own.sigma === null ? sigma : own.sigma / own.value,
      route: 'published-factors',
      reasons: [{ kind: 'source', text: `planar g(${ion.ion}) = ${own.value}: ${own.source}` }],
    };
  }
  const base = metalStrength(ion, library);
  if (base === null) return null;
  const radii = ion.shannonRadius_pm.value;
  const from = radii?.oct ?? radii?.octHS;
  const to = radii?.squarePlanar;
  const factor = from !== undefined && to !== undefined ? distanceFactor(from + 140, to + 140) : 1.3;
  return {
    value: base.value * factor,
    sigma: Math.hypot(base.sigma, 0.15),
    route: 'donor-class',
    reasons: [
      ...base.reasons,
      {
        kind: 'assumption',
        text: `${factor.toFixed(2)} times the octahedral g for the shorter bonds of a square plane`,
      },
    ],
  };
}
