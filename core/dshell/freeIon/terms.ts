import { symmetricEigensystem } from '../../numerics/eigen/symmetric';
import { parity } from '../angularMomentum/factorials';
import { determinantSpace, twoBody, type DeterminantSpace } from './determinantSpace';
import { magneticNumber, spinOf, totals } from './microstates';
import { ladderL, ladderS } from './slaterCondon';
import { apply, dot, type SparseOperator } from './sparseOperator';

/** One Russell-Saunders term of d^N: (2S+1)L with Racah's seniority v, which tells repeated terms apart in the d shell. */
export interface Term {
  readonly S: number;
  readonly L: number;
  readonly seniority: number;
  /** The state M_L = L, M_S = S over the determinants of definite m_l, m_s. */
  readonly highest: Float64Array;
}

/**
 * Twice the pairing operator, Q₊Q₋ with Q₊ = Σ_m ½(−1)^m a⁺_{m↑} a⁺_{−m↓}, scaled so that its eigenvalue is
 * (N − v)(12 − N − v)/4 (G. Racah, Phys. Rev. 63, 367, 1943).
 */
function pairing(space: DeterminantSpace): SparseOperator {
  const pair = (p: number, q: number): number => {
    if (spinOf(p) === spinOf(q) || magneticNumber(p) !== -magneticNumber(q)) return 0;
    return parity(magneticNumber(p)) * (spinOf(p) > 0 ? 1 : -1);
  };
  return twoBody(space, (p, q, r, s) => pair(p, q) * pair(r, s) * 0.5);
}

/** Above every eigenvalue of the pairing operator, so that raised states are pushed out of the way. */
const raisedPenalty = 100;

/**
 * All terms of d^N, found as the states that L₊ and S₊ annihilate: highest spin first, then highest L, then lowest
 * seniority. Nothing is looked up; the counts come out of the determinants.
 */
export function termsOf(electrons: number): { space: DeterminantSpace; terms: readonly Term[] } {
  const space = determinantSpace(electrons);
  const raise = [ladderL(space, 1), ladderS(space, 1)];
  const pairs = pairing(space);
  const places = space.states.map(totals);
  const largestS = Math.min(electrons, 10 - electrons) / 2;
  const terms: Term[] = [];
  for (let S = largestS; S >= 0; S--) {
    for (let L = 10; L >= 0; L--) {
      const sector = places.flatMap(({ mL, mS }, index) => (mL === L && mS === S ? [index] : []));
      terms.push(...highestStates(space, sector, raise, pairs).map((found) => ({ S, L, ...found })));
    }
  }
  return { space, terms };
}

function highestStates(
  space: DeterminantSpace,
  sector: readonly number[],
  raise: readonly SparseOperator[],
  pairs: SparseOperator,
): { seniority: number; highest: Float64Array }[] {
  const n = sector.length;
  const size = space.states.length;
  const unit = (index: number): Float64Array => new Float64Array(size).fill(1, index, index + 1);
  const raised = sector.map((index) => raise.map((operator) => apply(operator, unit(index))));
  const paired = sector.map((index) => apply(pairs, unit(index)));
  const matrix = new Float64Array(n * n);
  for (let i = 0; i < n; i++) {
    for (let j = 0; j < n; j++) {
      const lifted = raised[i]!.reduce((sum, vector, which) => sum + dot(vector, raised[j]![which]!), 0);
      matrix[i * n + j] = raisedPenalty * lifted + paired[j]![sector[i]!]!;
    }
  }
  const { values, vectors } = symmetricEigensystem(matrix, n);
  const found: { seniority: number; highest: Float64Array }[] = [];
  for (let k = 0; k < n && values[k]! < raisedPenalty / 2; k++) {
    const highest = new Float64Array(size);
    sector.forEach((index, i) => (highest[index] = vectors[k * n + i]!));
    found.push({ seniority: seniorityFrom(values[k]!, space.electrons), highest });
  }
  return found.sort((a, b) => a.seniority - b.seniority);
}

/** Solves (N − v)(12 − N − v)/4 = value for v ≤ min(N, 10 − N). */
function seniorityFrom(value: number, electrons: number): number {
  return Math.round(6 - Math.sqrt((electrons - 6) ** 2 + 4 * value));
}
