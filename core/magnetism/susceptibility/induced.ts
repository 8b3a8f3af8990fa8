import { SpinhueError } from '../../errors';
import { solveStates } from '../../dshell';
import { boltzmann_cm1_K } from '../../units';
import { avogadroMagneton_emu } from '../magneticUnits';
import { checkTemperatures, momentFactors, type MagneticProblem } from '../magneticProblem';
import { momentExpectations, upTo } from '../momentMatrices';
import { susceptibilityPoint, type SusceptibilityPoint } from './curve';

type Direction = readonly [number, number, number];

/** Molar magnetisation along a field, emu mol⁻¹ (erg G⁻¹ mol⁻¹), at each temperature. */
export interface Magnetisation {
  readonly temperature_K: number;
  readonly moment_emu: number;
  /** The same in N_A μ_B. */
  readonly moment_NAmuB: number;
}

/**
 * Exact thermal average of the moment along the field: the Hamiltonian is diagonalised with the Zeeman term in it and
 * M = −N_A Σ ⟨n|∂H/∂B|n⟩ e^(−E_n/kT)/Z. `direction` need not be a unit vector; `field_T` > 0.
 */
export function magnetisation(
  problem: MagneticProblem,
  field_T: number,
  direction: Direction,
  temperatures_K: readonly number[],
): Magnetisation[] {
  const { k, ge } = momentFactors(problem);
  checkTemperatures(temperatures_K);
  checkField(field_T);
  const length = Math.hypot(...direction);
  const unit: Direction = [direction[0] / length, direction[1] / length, direction[2] / length];
  const B_T: Direction = [field_T * unit[0], field_T * unit[1], field_T * unit[2]];
  const states = solveStates({ ...problem, zeeman: { B_T, k, ge } });
  const hottest = boltzmann_cm1_K * Math.max(0, ...temperatures_K);
  const populated = upTo(states.count).filter(
    (n) => states.energies[n]! - states.energies[0]! < 40 * hottest,
  );
  const own = momentExpectations(states, { k, ge }, unit, populated);
  return temperatures_K.map((temperature_K) => {
    const kT = boltzmann_cm1_K * temperature_K;
    let [Z, sum] = [0, 0];
    populated.forEach((n, i) => {
      const weight = Math.exp(-(states.energies[n]! - states.energies[0]!) / kT);
      Z += weight;
      // ∂H/∂B is +μ_B μ; the moment of the ion points against it.
      sum -= weight * own[i]!;
    });
    const moment_NAmuB = sum / Z;
    return { temperature_K, moment_NAmuB, moment_emu: avogadroMagneton_emu * moment_NAmuB };
  });
}

/** χ = M/B along x, y and z with the field in place, as a magnetometer has it. One tesla is taken for 10 000 oersted. */
export function inducedSusceptibility(
  problem: MagneticProblem,
  field_T: number,
  temperatures_K: readonly number[],
): SusceptibilityPoint[] {
  const along = (
    [
      [1, 0, 0],
      [0, 1, 0],
      [0, 0, 1],
    ] as const
  ).map((direction) => magnetisation(problem, field_T, direction, temperatures_K));
  return temperatures_K.map((T, i) => {
    const chi = (axis: 0 | 1 | 2): number => along[axis]![i]!.moment_emu / (field_T * 1e4);
    return susceptibilityPoint(T, [chi(0), chi(1), chi(2)]);
  });
}

function checkField(field_T: number): void {
  if (Number.isFinite(field_T) && field_T > 0 && field_T <= 100) return;
  throw new SpinhueError({
    code: Number.isFinite(field_T) ? 'out-of-range' : 'not-finite',
    message: `field_T is ${field_T}; it is above 0 and at most 100 T`,
    field: 'field_T',
    remedy: 'give the field in tesla, or leave it out for the limit of no field',
  });
}
