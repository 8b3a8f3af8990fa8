import { EigenvalueDecomposition, Matrix } from 'ml-matrix';
import { type LevelProblem } from '../../core/dshell';
import { determinantBasis } from '../../core/dshell';
import { plainHamiltonian } from '../../core/testing/levels/plainHamiltonian';

export interface SquareMatrix {
  readonly size: number;
  readonly entries: Float64Array;
}

const bits = (mask: number): number => mask.toString(2).replaceAll('0', '').length;

/** The Hamiltonian without spin-orbit coupling over determinants, blocked by M_S and nothing else; all M_S. */
export function spinComponentBlocks(problem: LevelProblem): SquareMatrix[] {
  const { size, matrix } = plainHamiltonian(problem);
  const { determinants } = determinantBasis(problem.dElectrons);
  const byComponent = new Map<number, number[]>();
  determinants.forEach((mask, index) => {
    const component = bits(mask & 31) - bits(mask >> 5);
    byComponent.set(component, [...(byComponent.get(component) ?? []), index]);
  });
  return [...byComponent.values()].map((members) => ({
    size: members.length,
    entries: Float64Array.from(members.flatMap((i) => members.map((j) => matrix[2 * (i * size + j)]!))),
  }));
}

/** The complete complex Hermitian matrix, and the same as a real symmetric one of twice the size. */
export function completeMatrices(problem: LevelProblem): { complex: SquareMatrix; real: SquareMatrix } {
  const { size, matrix } = plainHamiltonian(problem);
  const wide = 2 * size;
  const real = new Float64Array(wide * wide);
  for (let i = 0; i < size; i++) {
    for (let j = 0; j < size; j++) {
      const [re, im] = [matrix[2 * (i * size + j)]!, matrix[2 * (i * size + j) + 1]!];
      real[i * wide + j] = re;
      real[(i + size) * wide + j + size] = re;
      real[i * wide + j + size] = -im;
      real[(i + size) * wide + j] = im;
    }
  }
  return { complex: { size, entries: matrix }, real: { size: wide, entries: real } };
}

/** The matrices made ready for ml-matrix, so that only its eigenvalue routine is timed. */
export function mlMatrixRun(blocks: readonly SquareMatrix[]): () => void {
  const matrices = blocks.map(({ size, entries }) => Matrix.from1DArray(size, size, Array.from(entries)));
  return () => {
    for (const matrix of matrices) new EigenvalueDecomposition(matrix, { assumeSymmetric: true });
  };
}
