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
