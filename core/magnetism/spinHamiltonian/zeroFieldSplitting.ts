import { angularOperators, matrixBetween, solveStates, type SolvedStates } from '../../dshell';
import { type MagneticProblem } from '../magneticProblem';
import { upTo } from '../momentMatrices';
import { adjoint, hermitianPower, multiply, type ComplexMatrix } from './complexMatrix';
import { principal, symmetricTensor, type SymmetricTensor, type Vector } from './tensor';

/** H = S·D·S of the ground multiplet, D traceless; D and E as usually quoted. */
export interface ZeroFieldSplitting {
  /** 2S + 1 of the ground term. */
  readonly multiplicity: number;
  /** 3/2 D_zz, z being the axis of the largest |D_ii|, cm⁻¹. */
  readonly D: number;
  /** (D_xx − D_yy)/2 with E/D ≥ 0, cm⁻¹. */
  readonly E: number;
  readonly tensor: SymmetricTensor;
  /** Unit axes x, y, z of D and E in the laboratory. */
  readonly axes: readonly [Vector, Vector, Vector];
  /** The 2S + 1 lowest energies, exact, from the lowest, cm⁻¹. */
  readonly levels: readonly number[];
  /** Smallest share of the ground term in those states: near 1 where a spin Hamiltonian is a fair picture. */
  readonly purity: number;
}

/** Below this share of the ground term the lowest states are not its multiplet. */
const leastPurity = 0.5;

/**
 * D and E of an ion whose ground term without spin-orbit coupling is an orbital singlet of S ≥ 1: the lowest 2S + 1 states
 * are projected on that term, made orthonormal symmetrically (J. des Cloizeaux, Nucl. Phys. 20, 321, 1960), and the effective
 * Hamiltonian on the rank-2 spin operators. For S ≥ 2 rank 4 terms are left out of D and E. Null for orbitally degenerate
 * terms, for S < 1, without spin-orbit coupling, and where the lowest states do not belong to the ground term.
 */
export function zeroFieldSplitting(
  problem: MagneticProblem,
  states?: SolvedStates,
): ZeroFieldSplitting | null {
  if (!((problem.zeta ?? 0) > 0)) return null;
  const pure = solveStates({ ...problem, zeta: 0 });
  const size = groundTermSize(pure);
  if (size === null) return null;
  const coupled = states ?? solveStates(problem);
  const overlaps = overlapMatrix(coupled, pure, size);
  const gram = multiply(overlaps, adjoint(overlaps));
  const { matrix: root, smallest } = hermitianPower(gram, -0.5, leastPurity);
  if (root === null) return null;
  const orthonormal = multiply(root, overlaps);
  const levels = upTo(size).map((n) => coupled.energies[n]! - coupled.energies[0]!);
  const effective = multiply(adjoint(orthonormal), scaleRows(orthonormal, levels));
  const tensor = rankTwo(effective, spinMatrices(pure, size));
  return { multiplicity: size, ...conventional(tensor), tensor, levels, purity: smallest };
}

/** 2S + 1 where the ground level without spin-orbit coupling is an orbital singlet with S ≥ 1. */
function groundTermSize({ energies, twiceSpin, count }: SolvedStates): number | null {
  const size = twiceSpin![0]! + 1;
  const near = 1e-9 * (energies[count - 1]! - energies[0]!) + 1e-7;
  const degenerate = size < count && energies[size]! - energies[0]! <= near;
  return size < 3 || degenerate ? null : size;
}

/** ⟨coupled n|pure m⟩ for the lowest states of both. */
function overlapMatrix(coupled: SolvedStates, pure: SolvedStates, size: number): ComplexMatrix {
  const n = pure.count;
  const out: ComplexMatrix = { size, re: new Float64Array(size * size), im: new Float64Array(size * size) };
  for (let i = 0; i < size; i++) {
    for (let j = 0; j < size; j++) {
      let [x, y] = [0, 0];
      for (let d = 0; d < n; d++) {
        const [ar, ai] = [coupled.re[i * n + d]!, coupled.im[i * n + d]!];
        const [br, bi] = [pure.re[j * n + d]!, pure.im[j * n + d]!];
        x += ar * br + ai * bi;
        y += ar * bi - ai * br;
      }
      out.re[i * size + j] = x;
      out.im[i * size + j] = y;
    }
  }
  return out;
}

function scaleRows({ size, re, im }: ComplexMatrix, factors: readonly number[]): ComplexMatrix {
  const at = (values: Float64Array): Float64Array =>
    values.map((value, i) => value * factors[Math.floor(i / size)]!);
  return { size, re: at(re), im: at(im) };
}

function spinMatrices(pure: SolvedStates, size: number): readonly ComplexMatrix[] {
  const ground = upTo(size);
  return angularOperators(pure.basis.electrons).S.map((operator) => ({
    size,
    ...matrixBetween(pure, operator, ground, ground),
  }));
}

/** D_ab from Tr(H O_ab), O_ab = ½(S_a S_b + S_b S_a) − δ_ab S²/3, whose norms are all fixed by that of O_xy. */
function rankTwo(H: ComplexMatrix, spin: readonly ComplexMatrix[]): SymmetricTensor {
  const S = (H.size - 1) / 2;
  const third = (S * (S + 1)) / 3;
  const product = (a: number, b: number): ComplexMatrix => {
    const [p, q] = [multiply(spin[a]!, spin[b]!), multiply(spin[b]!, spin[a]!)];
    const half = (x: Float64Array, y: Float64Array): Float64Array =>
      x.map((value, i) => 0.5 * (value + y[i]!));
    return { size: H.size, re: half(p.re, q.re), im: half(p.im, q.im) };
  };
  const trace = (A: ComplexMatrix, B: ComplexMatrix): number => {
    let sum = 0;
    for (let i = 0; i < A.re.length; i++) sum += A.re[i]! * B.re[i]! + A.im[i]! * B.im[i]!;
    return sum;
  };
  const xy = product(0, 1);
  const norm = 2 * trace(xy, xy);
  const diagonal = upTo(H.size).reduce((sum, i) => sum + H.re[i * H.size + i]!, 0);
  return symmetricTensor((a, b) => (trace(H, product(a, b)) - (a === b ? third * diagonal : 0)) / norm);
}

function conventional(tensor: SymmetricTensor): Pick<ZeroFieldSplitting, 'D' | 'E' | 'axes'> {
  const values = [...principal(tensor)].sort((a, b) => Math.abs(a.value) - Math.abs(b.value));
  const z = values[2]!;
  const D = 1.5 * z.value;
  const [low, high] =
    values[0]!.value < values[1]!.value ? [values[0]!, values[1]!] : [values[1]!, values[0]!];
  // E has the sign of D: x is the larger of the two for positive D.
  const [x, y] = D >= 0 ? [high, low] : [low, high];
  return { D, E: (x.value - y.value) / 2, axes: [x.axis, y.axis, z.axis] };
}
