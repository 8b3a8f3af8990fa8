import { properRotation } from '../groups/operation';
import { pointGroup } from '../pointGroup';
import { reduce } from '../representations/character';
import { type StrongFieldConfiguration } from './configurationTerms';
import { term, type Term } from './term';

/**
 * The cyclic subgroups of O in which every t2 and e orbital stands alone, as the exponents m of its phase
 * exp(−2πi m/n): one turn from each class of O.
 */
const descents = [
  { turn: properRotation(1), n: 1, t2: [0, 0, 0], e: [0, 0] },
  { turn: properRotation(3, [1, 1, 1]), n: 3, t2: [0, 1, -1], e: [1, -1] },
  { turn: properRotation(2), n: 2, t2: [0, 1, 1], e: [0, 0] },
  { turn: properRotation(4), n: 4, t2: [2, 1, -1], e: [0, 2] },
  { turn: properRotation(2, [1, 1, 0]), n: 2, t2: [0, 0, 1], e: [0, 1] },
] as const;

/**
 * Terms of t2g^m eg^n by descent in symmetry (F. A. Cotton, Chemical Applications of Group Theory, 3rd ed. 1990,
 * sect. 9.6): in a subgroup low enough that no orbital is degenerate the determinants can simply be listed; the terms
 * of O are those that give the same lists in every such subgroup. Slower than direct products and independent of them.
 */
export function termsByDescent({ t2g, eg }: StrongFieldConfiguration): Term[] {
  const group = pointGroup('O');
  const electrons = t2g + eg;
  const terms: Term[] = [];
  for (let down = 0; 2 * down <= electrons; down++) {
    const up = electrons - down;
    const character = group.classes.map(() => 0);
    for (const descent of descents) {
      const { index } = group.classOf[group.place(descent.turn)!]!;
      const here = countByPhase(descent, t2g, eg, up - down);
      const above = countByPhase(descent, t2g, eg, up - down + 2);
      character[index] = here.reduce(
        (sum, count, m) => sum + (count - above[m]!) * Math.cos((2 * Math.PI * m) / descent.n),
        0,
      );
    }
    for (const { irrep, times } of reduce(group, character)) {
      terms.push(term(up - down + 1, `${irrep.mulliken}g`, irrep.dimension, times));
    }
  }
  return terms;
}

/** Lists every determinant of the configuration with 2M_S = `twiceMs` and counts them by total phase exponent. */
function countByPhase(
  { n, t2, e }: (typeof descents)[number],
  t2g: number,
  eg: number,
  twiceMs: number,
): number[] {
  const counts = Array.from({ length: n }, () => 0);
  const orbitals = [...t2, ...e];
  for (let mask = 0; mask < 1024; mask++) {
    let [inT2, inE, spin, phase] = [0, 0, 0, 0];
    for (let bit = 0; bit < 10; bit++) {
      if (((mask >> bit) & 1) === 0) continue;
      const orbital = bit >> 1;
      if (orbital < 3) inT2++;
      else inE++;
      spin += bit % 2 === 0 ? 1 : -1;
      phase += orbitals[orbital]!;
    }
    if (inT2 === t2g && inE === eg && spin === twiceMs) counts[((phase % n) + n) % n]!++;
  }
  return counts;
}
