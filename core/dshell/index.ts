export type { ConfigurationWeight, CubicGeometry, CubicIrrep, CubicLevel, CubicProblem } from './types';
export { cubicLevels } from './cubic/cubicLevels';
export { groundCrossovers, type GroundCrossover, type GroundLevelName } from './cubic/groundCrossovers';
