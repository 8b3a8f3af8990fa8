import { determinantSpace } from '../freeIon/determinantSpace';
import { dOrbitalNames, realOrbitals } from '../field/orbitals';
import { remember } from '../remember';

/**
 * The basis in which states are handed out: determinants of real orbitals. Orbital a of [z2, x2-y2, xy, xz, yz] with spin up is
 * bit a, with spin down bit 5 + a; a determinant is the product of creation operators in ascending order of bits acting on
 * the empty shell. Determinants are listed in ascending order of their bit patterns. Orbitals are the real d functions
 * with the phases of |±2⟩ = (x2-y2 ± i xy)/√2, |±1⟩ = ∓(xz ± i yz)/√2, |0⟩ = z2; spin is quantised along z.
 */
export interface DeterminantBasis {
  readonly electrons: number;
  readonly orbitals: typeof dOrbitalNames;
  /** Bit patterns; C(10, N) of them. */
  readonly determinants: readonly number[];
}

/** The determinants of N electrons with their index, the same list for every orbital basis. */
export const sharedSpace = remember(determinantSpace);

export function determinantBasis(electrons: number): DeterminantBasis {
  return { electrons, orbitals: dOrbitalNames, determinants: sharedSpace(electrons).states };
}

/** Occupations of n electrons of one spin as bit patterns of five orbitals, ascending. */
export const strings: readonly (readonly number[])[] = [0, 1, 2, 3, 4, 5].map((n) => {
  const list: number[] = [];
  for (let mask = 0; mask < 32; mask++) {
    let count = 0;
    for (let bit = 0; bit < 5; bit++) count += (mask >> bit) & 1;
    if (count === n) list.push(mask);
  }
  return list;
});

/** A complex matrix over strings by its non-zero entries. */
export interface StringTransform {
  readonly rows: Int32Array;
  readonly columns: Int32Array;
  readonly re: Float64Array;
  readonly im: Float64Array;
}

/** ⟨real string|m string⟩ for n electrons of one spin: minors of ⟨real orbital|m⟩. */
export const stringTransforms: readonly StringTransform[] = strings.map((list) => {
  const entries = list.flatMap((realMask, row) =>
    list.map((mMask, column) => ({ row, column, value: minor(bitsOf(realMask), bitsOf(mMask)) })),
  );
  const kept = entries.filter(({ value }) => Math.hypot(...value) > 1e-15);
  return {
    rows: Int32Array.from(kept, ({ row }) => row),
    columns: Int32Array.from(kept, ({ column }) => column),
    re: Float64Array.from(kept, ({ value }) => value[0]),
    im: Float64Array.from(kept, ({ value }) => value[1]),
  };
});

function bitsOf(mask: number): number[] {
  return [0, 1, 2, 3, 4].filter((bit) => ((mask >> bit) & 1) === 1);
}

/** Determinant of ⟨real orbital|m⟩ over the given rows and columns, by expansion along the first row. */
function minor(rows: readonly number[], columns: readonly number[]): [number, number] {
  if (rows.length === 0) return [1, 0];
  const [first, ...rest] = rows;
  let re = 0;
  let im = 0;
  columns.forEach((column, j) => {
    const [xr, xi] = [realOrbitals.re[column]![first!]!, -realOrbitals.im[column]![first!]!];
    if (xr === 0 && xi === 0) return;
    const [yr, yi] = minor(
      rest,
      columns.filter((other) => other !== column),
    );
    const sign = j % 2 === 0 ? 1 : -1;
    re += sign * (xr * yr - xi * yi);
    im += sign * (xr * yi + xi * yr);
  });
  return [re, im];
}
