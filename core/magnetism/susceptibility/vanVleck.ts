import { solveStates, type SolvedStates } from '../../dshell';
import { boltzmann_cm1_K } from '../../units';
import { vanVleckFactor } from '../magneticUnits';
import { checkTemperatures, momentFactors, type MagneticProblem } from '../magneticProblem';
import { momentMatrices, upTo, type MomentMatrix } from '../momentMatrices';
import { susceptibilityPoint, type SusceptibilityPoint } from './curve';

/** Populations below this are left out of the sums. */
const negligible = 1e-17;

/**
 * Zero-field susceptibility by the complete first- and second-order sum over all states (J. H. Van Vleck, The Theory of
 * Electric and Magnetic Susceptibilities, 1932): χ = N_A μ_B² Z⁻¹ Σ_nm |⟨n|μ|m⟩|² f_nm with f = e^(−E_n/kT)/kT for equal
 * energies and (e^(−E_n/kT) − e^(−E_m/kT))/(E_m − E_n) otherwise.
 */
export function vanVleckSusceptibility(
  problem: MagneticProblem,
  temperatures_K: readonly number[],
): SusceptibilityPoint[] {
  const factors = momentFactors(problem);
  checkTemperatures(temperatures_K);
  return vanVleckSum(solveStates(problem), factors, temperatures_K);
}

/** The same from states already solved. */
export function vanVleckSum(
  states: SolvedStates,
  factors: { readonly k: number; readonly ge: number },
  temperatures_K: readonly number[],
): SusceptibilityPoint[] {
  if (temperatures_K.length === 0) return [];
  const energies = states.energies.map((energy) => energy - states.energies[0]!);
  const hottest = boltzmann_cm1_K * Math.max(...temperatures_K);
  const populated = upTo(states.count).filter((n) => Math.exp(-energies[n]! / hottest) > negligible);
  const all = upTo(states.count);
  const moments = momentMatrices(states, factors, all, populated);
  return temperatures_K.map((T) => {
    const along = (axis: 0 | 1 | 2): number => sumAlong(moments[axis], energies, populated, T);
    return susceptibilityPoint(T, [along(0), along(1), along(2)]);
  });
}

function sumAlong(
  { re, im }: MomentMatrix,
  energies: Float64Array,
  populated: readonly number[],
  T: number,
): number {
  const kT = boltzmann_cm1_K * T;
  const width = populated.length;
  let sum = 0;
  let Z = 0;
  populated.forEach((n, column) => {
    const weight = Math.exp(-energies[n]! / kT);
    Z += weight;
    for (let m = 0; m < energies.length; m++) {
      const at = m * width + column;
      const strength = re[at]! * re[at]! + im[at]! * im[at]!;
      if (strength === 0) continue;
      // Pairs with a state that is not populated are met once and count twice.
      const twice = m < width ? 1 : 2;
      const gap = energies[m]! - energies[n]!;
      // The same for both orders of a pair; taken from the lower state nothing overflows.
      const lower = gap >= 0 ? weight : Math.exp(-energies[m]! / kT);
      sum += twice * strength * lower * response(Math.abs(gap) / kT);
    }
  });
  return (vanVleckFactor * sum) / (Z * kT);
}

/** (1 − e^(−x))/x, 1 at x = 0. */
const response = (x: number): number => (Math.abs(x) < 1e-12 ? 1 : -Math.expm1(-x) / x);
