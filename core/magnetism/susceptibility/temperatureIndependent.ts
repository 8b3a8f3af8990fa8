import { solveStates } from '../../dshell';
import { vanVleckFactor } from '../magneticUnits';
import { momentFactors, type MagneticProblem } from '../magneticProblem';
import { momentMatrices, upTo } from '../momentMatrices';

/** Paramagnetism that does not depend on temperature, cgs. */
export interface TemperatureIndependent {
  /** Along x, y and z, cm³ mol⁻¹. */
  readonly chi_xyz: readonly [number, number, number];
  readonly chi: number;
  /** Number of lowest states taken for the ground manifold. */
  readonly manifold: number;
}

/**
 * Second-order susceptibility of the ground manifold, the states that grow out of the ground term, towards all others:
 * N_A μ_B² (2/g) Σ |⟨n|μ|m⟩|²/(E_m − E_n), n in the manifold of g states, m outside. 16 N_A μ_B²/E(1T1g) for low-spin d6,
 * 8 N_A μ_B²/10Dq for octahedral d3 and d8 (B. N. Figgis and J. Lewis, Prog. Inorg. Chem. 6, 37, 1964). Meaningful where
 * nothing else is populated.
 */
export function temperatureIndependent(problem: MagneticProblem): TemperatureIndependent {
  const factors = momentFactors(problem);
  const manifold = groundTermStates(problem);
  const states = solveStates(problem);
  const inside = upTo(manifold);
  const outside = upTo(states.count).slice(manifold);
  const moments = momentMatrices(states, factors, outside, inside);
  const along = (axis: 0 | 1 | 2): number => {
    const { re, im } = moments[axis];
    let sum = 0;
    outside.forEach((m, i) =>
      inside.forEach((n, j) => {
        const at = i * manifold + j;
        sum += (re[at]! ** 2 + im[at]! ** 2) / (states.energies[m]! - states.energies[n]!);
      }),
    );
    return (2 * vanVleckFactor * sum) / manifold;
  };
  const chi_xyz = [along(0), along(1), along(2)] as const;
  return { chi_xyz, chi: (chi_xyz[0] + chi_xyz[1] + chi_xyz[2]) / 3, manifold };
}

/** Spin times orbital degeneracy of the ground level without spin-orbit coupling. */
function groundTermStates(problem: MagneticProblem): number {
  const { energies, count } = solveStates({ ...problem, zeta: 0 });
  const near = 1e-9 * (energies[count - 1]! - energies[0]!) + 1e-6;
  return energies.filter((energy) => energy - energies[0]! <= near).length;
}
