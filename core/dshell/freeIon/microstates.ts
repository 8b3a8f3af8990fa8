/** Orbital quantum number of the shell, its orbitals and spin orbitals. */
export const shellL = 2;
export const orbitalCount = 5;
export const spinOrbitalCount = 10;

/** One determinant: bit p set where spin orbital p is occupied; electrons are created in ascending order of p. */
export type Microstate = number;

export function countBits(mask: number): number {
  let count = 0;
  for (let rest = mask; rest !== 0; rest &= rest - 1) count++;
  return count;
}

/** All C(10, N) determinants of N electrons, ascending. */
export function microstates(electrons: number): Microstate[] {
  const all: Microstate[] = [];
  for (let mask = 0; mask < 1 << spinOrbitalCount; mask++) if (countBits(mask) === electrons) all.push(mask);
  return all;
}

/** Spin orbitals 0…4 have spin up, 5…9 spin down; within a spin, bit i is orbital i. */
export const orbitalOf = (spinOrbital: number): number => spinOrbital % orbitalCount;
export const spinOf = (spinOrbital: number): 0.5 | -0.5 => (spinOrbital < orbitalCount ? 0.5 : -0.5);
/** In the basis of definite m_l, orbital i has m = 2 − i. */
export const magneticNumber = (spinOrbital: number): number => shellL - orbitalOf(spinOrbital);

export function totals(state: Microstate): { mL: number; mS: number } {
  let mL = 0;
  let mS = 0;
  for (let p = 0; p < spinOrbitalCount; p++) {
    if ((state & (1 << p)) === 0) continue;
    mL += magneticNumber(p);
    mS += spinOf(p);
  }
  return { mL, mS };
}

/** −1 where an odd number of electrons stands before spin orbital p, else 1. */
export const signBefore = (state: Microstate, p: number): 1 | -1 =>
  countBits(state & ((1 << p) - 1)) % 2 === 0 ? 1 : -1;
