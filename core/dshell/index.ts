/*
 * The d shell: energies and states of d^N in any ligand field. From the ion outwards:
 *
 *   angularMomentum  3j and 6j symbols, rotation matrices
 *   freeIon          microstates, repulsion (Slater-Condon), terms, reduced matrix elements: nothing about the surroundings
 *   field            ligand fields as 5×5 matrices, their tensor components, their symmetry and the frame it shows in
 *   adaptation       states of one J that belong to one row of a symmetry group
 *   blocks           the Hamiltonian of one row: sums of parameter · operator
 *   levels, states   eigenvalues of all blocks; eigenvectors over determinants, angular momenta between them
 *   labels           irreducible representations, parents and configurations of every level
 *   cubic            octahedron and tetrahedron in the strong-field basis, where ground levels change
 *   surfaces         cubic levels of one ion as tables along 10Dq/B with a rigorous error bound: bulk work
 *   diagrams         levels followed along any one parameter
 *
 * A problem is checked (`problem.ts`), its field turned into a frame (`field/fieldFrame.ts`), the blocks of that symmetry are
 * taken from memory or worked out once (`blocks/symmetryBlocks.ts`), summed with the parameters and diagonalised.
 */
export type { ConfigurationWeight, CubicGeometry, CubicIrrep, CubicLevel, CubicProblem } from './types';
export { cubicLevels } from './cubic/cubicLevels';
export { groundCrossovers, type GroundCrossover, type GroundLevelName } from './cubic/groundCrossovers';
export { type AngularOverlapLigand, type FieldSpec } from './field/fieldSpec';
export { type FieldMatrix } from './field/tensorComponents';
export { fieldMatrix } from './field/fieldMatrix';
export { fieldFrame, type FieldFrame } from './field/fieldFrame';
export { turnedField } from './field/symmetryAxes';
export { type LevelProblem, type ZeemanTerm } from './problem';
export { levels, type Level, type LevelList, type LevelOptions } from './levels/levels';
export { labelGroups, type LabelGroup } from './levels/labelGroup';
export { determinantBasis, type DeterminantBasis } from './states/determinantBasis';
export { solveStates, type SolvedStates } from './states/solveStates';
export {
  angularOperators,
  matrixBetween,
  oneElectron,
  type AngularOperators,
  type DeterminantOperator,
} from './states/operators';
export {
  levelDiagram,
  type DiagramCurve,
  type DiagramParameter,
  type DiagramRange,
  type GroundChange,
  type LevelDiagram,
} from './diagrams';
