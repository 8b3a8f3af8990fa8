import { requireElectronCount, requireFinite, requireNotNegative } from './checkProblem';
import { fieldMatrix } from './field/fieldMatrix';
import { type FieldSpec } from './field/fieldSpec';
import { type FieldMatrix, type FieldTensors } from './field/tensorComponents';
import { fieldComponents } from './adaptation/species';
import { operatorName, type OperatorName } from './blocks/symmetryBlocks';

/** A magnetic field: H = μ_B B·(k L + g_e S). */
export interface ZeemanTerm {
  /** Tesla, along x, y, z. */
  readonly B_T: readonly [number, number, number];
  /** Stevens orbital reduction in the Zeeman term; 1 where left out. */
  readonly k?: number;
  /** Electron g value; 2.0023 where left out. */
  readonly ge?: number;
}

/** One d^N ion in a field of any symmetry. Energies in cm⁻¹. */
export interface LevelProblem {
  /** 1 to 9. */
  readonly dElectrons: number;
  /** Racah parameters; A is a common shift and left out. */
  readonly B: number;
  readonly C: number;
  /** Trees parameter α of αL(L + 1); 0 where left out. */
  readonly alpha?: number;
  /** Spin-orbit coupling constant of one electron, ≥ 0 for every N; none where 0 or left out. */
  readonly zeta?: number;
  /** Multiplies ζ where the orbital reduction of spin-orbit coupling is asked for; 1 where left out. */
  readonly spinOrbitReduction?: number;
  readonly field: FieldSpec;
  readonly zeeman?: ZeemanTerm;
}

/** A problem that was found to be in order. */
export interface CheckedProblem {
  readonly electrons: number;
  readonly V: FieldMatrix;
  /** ζ with its reduction. */
  readonly zeta: number;
  readonly B: number;
  readonly C: number;
  readonly alpha: number;
  readonly zeeman: Required<ZeemanTerm> | null;
}

/** Throws `out-of-range`, `not-finite`, `not-symmetric`, `missing-field`, `ligands-too-close`, `unknown-field-value`. */
export function checkProblem(problem: LevelProblem): CheckedProblem {
  const { dElectrons, B, C, alpha = 0, zeta = 0, spinOrbitReduction = 1, field, zeeman } = problem;
  requireElectronCount(dElectrons);
  requireNotNegative(B, 'B');
  requireNotNegative(C, 'C');
  requireFinite(alpha, 'alpha');
  requireNotNegative(zeta, 'zeta');
  requireNotNegative(spinOrbitReduction, 'spinOrbitReduction');
  return {
    electrons: dElectrons,
    V: fieldMatrix(field),
    zeta: zeta * spinOrbitReduction,
    B,
    C,
    alpha,
    zeeman: zeeman === undefined ? null : checkZeeman(zeeman),
  };
}

function checkZeeman({ B_T, k = 1, ge = 2.0023 }: ZeemanTerm): Required<ZeemanTerm> | null {
  [0, 1, 2].forEach((i) => requireFinite(B_T[i]!, `zeeman.B_T[${i}]`));
  requireFinite(k, 'zeeman.k');
  requireFinite(ge, 'zeeman.ge');
  return B_T.every((component) => component === 0) ? null : { B_T, k, ge };
}

/** The parameters that multiply the operators of a block. */
export function hamiltonianParameters(
  { B, C, alpha, zeta }: Pick<CheckedProblem, 'B' | 'C' | 'alpha' | 'zeta'>,
  tensors: FieldTensors,
): Map<OperatorName, number> {
  const parameters = new Map<OperatorName, number>([
    ['B', B],
    ['C', C],
    ['alpha', alpha],
    ['zeta', zeta],
  ]);
  for (const [name, k, q, part] of componentNames) parameters.set(name, tensors[part][k][q]!);
  return parameters;
}

const componentNames = fieldComponents.C1.map(
  ({ k, q, part }) => [operatorName({ k, q, part }), k, q, part] as const,
);
