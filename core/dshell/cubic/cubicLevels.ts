import { requireElectronCount, requireNotNegative } from '../checkProblem';
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
  const { dElectrons, geometry, tenDq, B, C } = problem;
  requireElectronCount(dElectrons);
  requireNotNegative(tenDq, 'tenDq');
  requireNotNegative(B, 'B');
  requireNotNegative(C, 'C');
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
  const { dElectrons, tenDq, B, C } = problem;
  const { values, vectors } = blockStates(block, dElectrons, sign * tenDq, B, C);
  return Array.from(values, (energy, k) => {
    const vector = vectors.subarray(k * block.size, (k + 1) * block.size);
    const eMean = vector.reduce((sum, c, i) => sum + c * c * block.eCount[i]!, 0);
    return {
      block,
      energy,
      configurations: configurationWeights(block, dElectrons, vector),
      slope: {
        tenDq: sign * (eMean - 0.4 * dElectrons),
        B: expectation(block.repulsionB, vector),
        C: expectation(block.repulsionC, vector),
      },
    };
  });
}

function configurationWeights(
  block: CubicBlock,
  electrons: number,
  vector: Float64Array,
): ConfigurationWeight[] {
  const weights = new Map<number, number>();
  vector.forEach((c, i) => weights.set(block.eCount[i]!, (weights.get(block.eCount[i]!) ?? 0) + c * c));
  return [...weights]
    .map(([e, weight]) => ({ t2: electrons - e, e, weight }))
    .sort((a, b) => b.weight - a.weight);
}

function expectation(matrix: Float64Array, vector: Float64Array): number {
  const n = vector.length;
  let sum = 0;
  for (let i = 0; i < n; i++) for (let j = 0; j < n; j++) sum += vector[i]! * matrix[i * n + j]! * vector[j]!;
  return sum;
}
