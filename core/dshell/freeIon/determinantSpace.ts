import { microstates, signBefore, spinOrbitalCount, type Microstate } from './microstates';
import { type SparseOperator } from './sparseOperator';

/** The determinants of N electrons and the second-quantised operators on them (Slater 1929, Condon 1930). */
export interface DeterminantSpace {
  readonly electrons: number;
  readonly states: readonly Microstate[];
  /** Position of a determinant in `states`. */
  readonly indexOf: ReadonlyMap<Microstate, number>;
}

export function determinantSpace(electrons: number): DeterminantSpace {
  const states = microstates(electrons);
  return { electrons, states, indexOf: new Map(states.map((state, index) => [state, index])) };
}

const spinOrbitals = Array.from({ length: spinOrbitalCount }, (_, p) => p);

class ColumnBuilder {
  private readonly sums = new Map<number, number>();
  add(row: number, value: number): void {
    this.sums.set(row, (this.sums.get(row) ?? 0) + value);
  }
  column(): { rows: number[]; values: number[] } {
    const kept = [...this.sums].filter(([, value]) => Math.abs(value) > 1e-14);
    return { rows: kept.map(([row]) => row), values: kept.map(([, value]) => value) };
  }
}

/** Σ_pq t(p, q) a⁺_p a_q. */
export function oneBody(space: DeterminantSpace, t: (p: number, q: number) => number): SparseOperator {
  const elements = spinOrbitals.map((q) =>
    spinOrbitals.map((p) => ({ p, value: t(p, q) })).filter(({ value }) => value !== 0),
  );
  const columns = space.states.map((state) => {
    const builder = new ColumnBuilder();
    for (const q of spinOrbitals) {
      if ((state & (1 << q)) === 0) continue;
      const without = state & ~(1 << q);
      const sign = signBefore(state, q);
      for (const { p, value } of elements[q]!) {
        if ((without & (1 << p)) !== 0) continue;
        builder.add(space.indexOf.get(without | (1 << p))!, value * sign * signBefore(without, p));
      }
    }
    return builder.column();
  });
  return { size: space.states.length, columns };
}

/** ½ Σ_pqrs ⟨pq|g|rs⟩ a⁺_p a⁺_q a_s a_r, with `g(p, q, r, s)` = ⟨p(1) q(2)|g|r(1) s(2)⟩ over spin orbitals. */
export function twoBody(
  space: DeterminantSpace,
  g: (p: number, q: number, r: number, s: number) => number,
): SparseOperator {
  const elements = antisymmetrised(g);
  const columns = space.states.map((state) => {
    const builder = new ColumnBuilder();
    forPairs(state, (r, s, without, removed) => {
      for (const { p, q, value } of elements[r * spinOrbitalCount + s]!) {
        if ((without & ((1 << p) | (1 << q))) !== 0) continue;
        const added = signBefore(without, q) * signBefore(without | (1 << q), p);
        builder.add(space.indexOf.get(without | (1 << p) | (1 << q))!, value * removed * added);
      }
    });
    return builder.column();
  });
  return { size: space.states.length, columns };
}

/** For every pair r < s the pairs p < q with ⟨pq|g|rs⟩ − ⟨pq|g|sr⟩ ≠ 0. */
function antisymmetrised(
  g: (p: number, q: number, r: number, s: number) => number,
): { p: number; q: number; value: number }[][] {
  const table: { p: number; q: number; value: number }[][] = [];
  for (let r = 0; r < spinOrbitalCount; r++) {
    for (let s = r + 1; s < spinOrbitalCount; s++) {
      const list: { p: number; q: number; value: number }[] = [];
      for (let p = 0; p < spinOrbitalCount; p++) {
        for (let q = p + 1; q < spinOrbitalCount; q++) {
          const value = g(p, q, r, s) - g(p, q, s, r);
          if (value !== 0) list.push({ p, q, value });
        }
      }
      table[r * spinOrbitalCount + s] = list;
    }
  }
  return table;
}

/** Visits every occupied pair r < s; `sign` is the sign of a_s a_r acting on the determinant. */
function forPairs(
  state: Microstate,
  visit: (r: number, s: number, without: Microstate, sign: number) => void,
): void {
  for (let r = 0; r < spinOrbitalCount; r++) {
    if ((state & (1 << r)) === 0) continue;
    const afterR = state & ~(1 << r);
    for (let s = r + 1; s < spinOrbitalCount; s++) {
      if ((state & (1 << s)) === 0) continue;
      visit(r, s, afterR & ~(1 << s), signBefore(state, r) * signBefore(afterR, s));
    }
  }
}
