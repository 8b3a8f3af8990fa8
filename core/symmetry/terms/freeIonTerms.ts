import { binomial } from './term';

/** A Russell-Saunders term of the free ion. */
export interface FreeIonTerm {
  /** `3F`; J is left out. */
  readonly label: string;
  readonly multiplicity: number;
  readonly L: number;
  /** How many terms of d^N have this S and L (two for the 3F of d4, told apart by seniority). */
  readonly times: number;
  readonly microstates: number;
}

/** Spectroscopic letters for L = 0, 1, 2, ... */
export const termLetters = 'SPDFGHIKLMNO';

/** How many determinants of `electrons` in l = 2 orbitals (one spin) have each M_L; the key is M_L. */
function orbitalCounts(electrons: number): Map<number, number> {
  const counts = new Map<number, number>();
  for (let mask = 0; mask < 32; mask++) {
    let occupied = 0;
    let ML = 0;
    for (let m = -2; m <= 2; m++) {
      if ((mask >> (m + 2)) & 1) {
        occupied++;
        ML += m;
      }
    }
    if (occupied === electrons) counts.set(ML, (counts.get(ML) ?? 0) + 1);
  }
  return counts;
}

/** Determinants of d^N with `up` and `down` electrons of each spin, by M_L. */
function determinants(up: number, down: number): (ML: number) => number {
  const ups = orbitalCounts(up);
  const downs = orbitalCounts(down);
  return (ML) => {
    let total = 0;
    for (const [m, count] of ups) total += count * (downs.get(ML - m) ?? 0);
    return total;
  };
}

/**
 * Terms of the free d^N ion by Slater's bookkeeping: a term (S, L) puts one determinant into every (M_S, M_L) up to
 * (S, L), so its number is the second difference of the counts (J. C. Slater, Phys. Rev. 34, 1293, 1929).
 * Hund's order: highest multiplicity first, then highest L.
 */
export function freeIonTerms(dElectrons: number): FreeIonTerm[] {
  if (!Number.isInteger(dElectrons) || dElectrons < 0 || dElectrons > 10)
    throw new RangeError(`d^${dElectrons}`);
  const terms: FreeIonTerm[] = [];
  for (let down = 0; 2 * down <= dElectrons; down++) {
    const up = dElectrons - down;
    if (up > 5) continue;
    const here = determinants(up, down);
    const above = down === 0 ? () => 0 : determinants(up + 1, down - 1);
    const multiplicity = up - down + 1;
    for (let L = termLetters.length - 1; L >= 0; L--) {
      const times = here(L) - here(L + 1) - above(L) + above(L + 1);
      if (times > 0) {
        const microstates = times * multiplicity * (2 * L + 1);
        terms.push({ label: `${multiplicity}${termLetters[L]!}`, multiplicity, L, times, microstates });
      }
    }
  }
  const total = terms.reduce((sum, { microstates }) => sum + microstates, 0);
  if (total !== binomial(10, dElectrons)) throw new Error('microstates do not add up');
  return terms.sort((a, b) => b.multiplicity - a.multiplicity || b.L - a.L);
}
