import { clebschGordan } from '../angularMomentum/threeJ';
import { freeIon } from '../freeIon/reducedElements';
import { ladderL, ladderS } from '../freeIon/slaterCondon';
import { apply } from '../freeIon/sparseOperator';
import { remember } from '../remember';

/** A real vector over determinants of definite m_l and m_s, by its non-zero entries. */
export interface SparseVector {
  readonly places: Int32Array;
  readonly values: Float64Array;
}

/** |term L M_L S M_S⟩ over determinants of definite m_l and m_s, real, with the phases of Condon and Shortley. */
export interface TermStates {
  state(term: number, mL: number, mS: number): SparseVector;
  /** |term (L S)J M⟩. */
  coupled(term: number, J: number, M: number): SparseVector;
}

/** The states of all terms of N electrons; worked out on first use and kept. */
export const termStates = remember(workOut);

/** One number for a term and two integer or half-integer quantum numbers of modulus below 16. */
const keyOf = (term: number, a: number, b: number): number => (term * 64 + 2 * a + 32) * 64 + 2 * b + 32;

function workOut(electrons: number): TermStates {
  const { space, terms } = freeIon(electrons);
  const lowerL = ladderL(space, -1);
  const lowerS = ladderS(space, -1);
  const size = space.states.length;
  const table = new Map<number, SparseVector>();
  terms.forEach(({ S, L, highest }, term) => {
    let top = highest;
    for (let mS = S; mS >= -S; mS--) {
      let vector = top;
      for (let mL = L; mL >= -L; mL--) {
        table.set(keyOf(term, mL, mS), sparse(vector));
        if (mL > -L) vector = scaled(apply(lowerL, vector), 1 / Math.sqrt(L * (L + 1) - mL * (mL - 1)));
      }
      if (mS > -S) top = scaled(apply(lowerS, top), 1 / Math.sqrt(S * (S + 1) - mS * (mS - 1)));
    }
  });
  const state = (term: number, mL: number, mS: number): SparseVector => table.get(keyOf(term, mL, mS))!;
  const coupledTable = new Map<number, SparseVector>();
  return {
    state,
    coupled(term, J, M) {
      const key = keyOf(term, J, M);
      let found = coupledTable.get(key);
      if (found === undefined) {
        const { S, L } = terms[term]!;
        const sum = new Float64Array(size);
        for (let mL = -L; mL <= L; mL++) {
          const mS = M - mL;
          if (Math.abs(mS) > S) continue;
          const weight = clebschGordan(L, mL, S, mS, J, M);
          const { places, values } = state(term, mL, mS);
          places.forEach((place, e) => (sum[place]! += weight * values[e]!));
        }
        found = sparse(sum);
        coupledTable.set(key, found);
      }
      return found;
    },
  };
}

function scaled(vector: Float64Array, factor: number): Float64Array {
  return vector.map((value) => value * factor);
}

function sparse(vector: Float64Array): SparseVector {
  const places: number[] = [];
  const values: number[] = [];
  vector.forEach((value, place) => {
    if (Math.abs(value) < 1e-14) return;
    places.push(place);
    values.push(value);
  });
  return { places: Int32Array.from(places), values: Float64Array.from(values) };
}
