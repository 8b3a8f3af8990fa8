import { requireElectronCount, requireFinite, requireNotNegative } from '../checkProblem';
import { type ConfigurationWeight, type CubicLevel, type CubicProblem } from '../types';
import { blockStates } from './blockEnergies';
import { cubicBlocks, type CubicBlock } from './cubicBlocks';

/** A level before the ground level is known. */
interface RawLevel {
  readonly block: CubicBlock;
  readonly energy: number;
  readonly configurations: readonly ConfigurationWeight[];
  readonly slope: { readonly tenDq: number; readonly B: number; readonly C: number };
}

/**
 * Every level of d^N in an octahedral or tetrahedral field without spin-orbit coupling, ascending, exact: the complete
 * configuration space in blocks of one (S, irrep), none larger than 10 × 10. Slopes are expectation values
 * (Hellmann-Feynman). Throws `out-of-range` or `not-finite`.
 */
export function cubicLevels(problem: CubicProblem): CubicLevel[] {
  const { dElectrons, geometry, tenDq, B, C, alpha = 0 } = problem;
  requireElectronCount(dElectrons);
  requireNotNegative(tenDq, 'tenDq');
  requireNotNegative(B, 'B');
  requireNotNegative(C, 'C');
  requireFinite(alpha, 'alpha');
  const sign = geometry === 'tetrahedral' ? -1 : 1;
  const raw = cubicBlocks(dElectrons).flatMap((block) => rawLevels(block, problem, sign));
  raw.sort((a, b) => a.energy - b.energy || b.block.S - a.block.S);
  const ground = raw[0]!;
  const suffix = geometry === 'octahedral' ? 'g' : '';
  return raw.map(({ block, energy, configurations, slope }) => ({
    energy: energy - ground.energy,
    multiplicity: 2 * block.S + 1,
    irrep: block.irrep,
    label: `${2 * block.S + 1}${block.irrep}${suffix}`,
    degeneracy: block.degeneracy,
    configurations,
    slope: {
      tenDq: slope.tenDq - ground.slope.tenDq,
      B: slope.B - ground.slope.B,
      C: slope.C - ground.slope.C,
    },
  }));
}

function rawLevels(block: CubicBlock, problem: CubicProblem, sign: 1 | -1): RawLevel[] {
  const { dElectrons, tenDq, B, C, alpha } = problem;
  const { size } = block;
  const { values, vectors } = blockStates(block, dElectrons, sign * tenDq, B, C, alpha);
  const found: RawLevel[] = [];
  for (let k = 0; k < size; k++) {
    const weights = eWeights(block, vectors, k * size);
    let eMean = 0;
    for (let e = 1; e <= 4; e++) eMean += e * weights[e]!;
    found.push({
      block,
      energy: values[k]!,
      configurations: configurationsFrom(weights, block, dElectrons),
      slope: {
        tenDq: sign * (eMean - 0.4 * dElectrons),
        B: expectation(block.repulsionB, vectors, k * size, size),
        C: expectation(block.repulsionC, vectors, k * size, size),
      },
    });
  }
  return found;
}

/** Weight of e^0 … e^4 in the eigenvector that starts at `at`. */
function eWeights({ eCount, size }: CubicBlock, vectors: Float64Array, at: number): number[] {
  const weights = [0, 0, 0, 0, 0];
  for (let i = 0; i < size; i++) weights[eCount[i]!]! += vectors[at + i]! * vectors[at + i]!;
  return weights;
}

/** The configurations that occur in the block, largest weight first. */
function configurationsFrom(
  weights: readonly number[],
  { eCount }: CubicBlock,
  electrons: number,
): ConfigurationWeight[] {
  const list: ConfigurationWeight[] = [];
  for (let e = 0; e <= 4; e++) {
    if (!eCount.includes(e)) continue;
    const weight = weights[e]!;
    let place = list.length;
    while (place > 0 && list[place - 1]!.weight < weight) place--;
    list.splice(place, 0, { t2: electrons - e, e, weight });
  }
  return list;
}

function expectation(matrix: Float64Array, vectors: Float64Array, at: number, n: number): number {
  let sum = 0;
  for (let i = 0; i < n; i++) {
    const row = i * n;
    let inner = 0.5 * matrix[row + i]! * vectors[at + i]!;
    for (let j = 0; j < i; j++) inner += matrix[row + j]! * vectors[at + j]!;
    sum += 2 * vectors[at + i]! * inner;
  }
  return sum;
}
