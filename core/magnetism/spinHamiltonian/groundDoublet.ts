import { type SolvedStates } from '../../dshell';
import { momentMatrices, type MomentMatrix } from '../momentMatrices';
import { principal, symmetricTensor, type SymmetricTensor, type Vector } from './tensor';

/** g of a Kramers doublet taken for an effective spin 1/2. The signs of the principal values are not determined. */
export interface DoubletG {
  /** Ascending, unsigned. */
  readonly principal: Vector;
  /** Unit axes of the principal values. */
  readonly axes: readonly [Vector, Vector, Vector];
  /** G = g gᵀ in the laboratory. */
  readonly G: SymmetricTensor;
}

/** States this close to the ground state belong to its level, relative to the span of energies. */
const sameLevel = 1e-12;

/**
 * g of the ground level where that is a Kramers doublet (odd N): G_ab = 2 Tr(μ_a μ_b) over the doublet (A. Abragam and
 * B. Bleaney, Electron Paramagnetic Resonance, 1970, chapter 15). Null for even N and for a larger ground level.
 */
export function groundDoubletG(
  states: SolvedStates,
  factors: { readonly k: number; readonly ge: number },
): DoubletG | null {
  const { energies, basis, count } = states;
  if (basis.electrons % 2 === 0) return null;
  const near = Math.max(1e-7, sameLevel * (energies[count - 1]! - energies[0]!));
  if (count > 2 && energies[2]! - energies[0]! <= near) return null;
  const moments = momentMatrices(states, factors, [0, 1], [0, 1]);
  const G = symmetricTensor((a, b) => 2 * traceOfProduct(moments[a], moments[b]));
  const values = principal(G);
  const g = values.map(({ value }) => Math.sqrt(Math.max(0, value)));
  return {
    principal: [g[0]!, g[1]!, g[2]!],
    axes: [values[0]!.axis, values[1]!.axis, values[2]!.axis],
    G,
  };
}

/** Re Tr(A B) of two Hermitian matrices of the same size: Σ A_ij B_ij*. */
function traceOfProduct(A: MomentMatrix, B: MomentMatrix): number {
  let sum = 0;
  for (let i = 0; i < A.re.length; i++) sum += A.re[i]! * B.re[i]! + A.im[i]! * B.im[i]!;
  return sum;
}
