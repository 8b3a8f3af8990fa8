import { parity } from '../angularMomentum/factorials';
import { threeJ } from '../angularMomentum/threeJ';
import { oneBody, twoBody, type DeterminantSpace } from './determinantSpace';
import { magneticNumber, shellL, spinOf } from './microstates';
import { type SparseOperator } from './sparseOperator';

/** Condon and Shortley's c^k(2m, 2m′): the angular part of ⟨2m|r^k_{m−m′}|2m′⟩. */
export function angularFactor(k: number, m: number, mPrime: number): number {
  return (
    parity(m) * 5 * threeJ(shellL, k, shellL, 0, 0, 0) * threeJ(shellL, k, shellL, -m, m - mPrime, mPrime)
  );
}

/** Slater integrals F⁰, F², F⁴ of one unit of Racah's B or C with A = F⁰ − F⁴/9 = 0. */
const slaterOf = { B: { f0: 0, f2: 49, f4: 0 }, C: { f0: 7 / 5, f2: 7, f4: 63 / 5 } } as const;

/**
 * Electron repulsion per unit of B or C on determinants of definite m_l and m_s (E. U. Condon and G. H. Shortley, The
 * Theory of Atomic Spectra, 1935; G. Racah, Phys. Rev. 62, 438, 1942). A is left out: it is the same for all states.
 */
export function repulsion(space: DeterminantSpace, parameter: 'B' | 'C'): SparseOperator {
  const { f0, f2, f4 } = slaterOf[parameter];
  return twoBody(space, (p, q, r, s) => {
    if (spinOf(p) !== spinOf(r) || spinOf(q) !== spinOf(s)) return 0;
    const [m1, m2, m3, m4] = [p, q, r, s].map(magneticNumber) as [number, number, number, number];
    if (m1 + m2 !== m3 + m4) return 0;
    const term = (k: number): number => angularFactor(k, m1, m3) * angularFactor(k, m4, m2);
    return f0 * term(0) + f2 * term(2) + f4 * term(4);
  });
}

/** L₊ = Σ l₊ and its adjoint. */
export function ladderL(space: DeterminantSpace, step: 1 | -1): SparseOperator {
  return oneBody(space, (p, q) => {
    const m = magneticNumber(q);
    if (spinOf(p) !== spinOf(q) || magneticNumber(p) !== m + step) return 0;
    return Math.sqrt(shellL * (shellL + 1) - m * (m + step));
  });
}

/** S₊ = Σ s₊ and its adjoint. */
export function ladderS(space: DeterminantSpace, step: 1 | -1): SparseOperator {
  return oneBody(space, (p, q) =>
    magneticNumber(p) === magneticNumber(q) && spinOf(p) === spinOf(q) + step ? 1 : 0,
  );
}
