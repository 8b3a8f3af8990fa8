import { hermitianEigensystem } from '../../numerics/eigen/hermitian';
import { quaternionEigensystem } from '../../numerics/eigen/quaternion';
import { symmetricEigensystem } from '../../numerics/eigen/symmetric';
import { identityRotation } from '../../symmetry';
import { type FieldGroup } from '../adaptation/species';
import { assemble } from '../blocks/assemble';
import { algebraWidth, symmetryBlocks, type SymmetryBlock } from '../blocks/symmetryBlocks';
import { fieldFrame, inFrameOf, type FieldFrame } from '../field/fieldFrame';
import { fieldTrace } from '../field/tensorComponents';
import { checkProblem, hamiltonianParameters, type LevelProblem } from '../problem';

/** Eigenvalues and eigenvectors of one block at one place of the diagram. */
export interface BlockSolution {
  readonly values: Float64Array;
  /** Row k of `size · width` numbers is the eigenvector of `values[k]`. */
  readonly vectors: Float64Array;
  readonly width: number;
}

/** A family of problems along one parameter, in rows that all of its members have. */
export interface Pencil {
  readonly group: FieldGroup;
  readonly blocks: readonly SymmetryBlock[];
  /** Absolute energies, A = 0 and the field as given, cm⁻¹. */
  solve(x: number, block: number): BlockSolution;
}

const solvers = {
  real: symmetricEigensystem,
  complex: hermitianEigensystem,
  quaternion: quaternionEigensystem,
} as const;

/** The frame of the most symmetric group that the fields at all `places` share, as far as it is found. */
function commonFrame(problemAt: (x: number) => LevelProblem, places: readonly number[]): FieldFrame {
  const fields = places.map((x) => checkProblem(problemAt(x)).V);
  const rank: readonly FieldGroup[] = ['SO3', 'O', 'Dinf', 'D4', 'D3', 'D2', 'C2', 'C1'];
  const contained: Readonly<Record<FieldGroup, readonly FieldGroup[]>> = {
    SO3: rank,
    O: ['O', 'D4', 'D2', 'C2', 'C1'],
    Dinf: ['Dinf', 'D4', 'D3', 'D2', 'C2', 'C1'],
    D4: ['D4', 'D2', 'C2', 'C1'],
    D3: ['D3', 'C1'],
    D2: ['D2', 'C2', 'C1'],
    C2: ['C2', 'C1'],
    C1: ['C1'],
  };
  // A place in general position shows the frame; the laboratory is the other candidate.
  const frames = [fieldFrame(fields[Math.floor(fields.length * 0.38)]!).rotation, identityRotation];
  const found = frames.map((rotation) => {
    const shared = fields
      .map((V) => contained[inFrameOf(V, rotation).group])
      .reduce((common, groups) => common.filter((group) => groups.includes(group)));
    return { rotation, group: shared[0]! };
  });
  const best = rank.indexOf(found[0]!.group) <= rank.indexOf(found[1]!.group) ? found[0]! : found[1]!;
  return { ...inFrameOf(fields[0]!, best.rotation), group: best.group };
}

/** Spin-orbit coupling is used everywhere if it is there anywhere. A magnetic field is left out. */
export function pencilAlong(problemAt: (x: number) => LevelProblem, places: readonly number[]): Pencil {
  const { group, rotation } = commonFrame(problemAt, places);
  const { dElectrons } = problemAt(places[0]!);
  const spinOrbit = places.some((x) => (problemAt(x).zeta ?? 0) !== 0);
  const blocks = symmetryBlocks(dElectrons, group, spinOrbit);
  return {
    group,
    blocks,
    solve(x, index) {
      const block = blocks[index]!;
      const checked = checkProblem(problemAt(x));
      const parameters = hamiltonianParameters(checked, inFrameOf(checked.V, rotation).tensors);
      const { values, vectors } = solvers[block.species.algebra](assemble(block, parameters), block.size);
      const centre = (fieldTrace(checked.V) * checked.electrons) / 5;
      return {
        values: values.map((value) => value + centre),
        vectors,
        width: algebraWidth[block.species.algebra],
      };
    },
  };
}
