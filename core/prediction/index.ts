export type { Caution, Prediction, PredictionOutcome } from './types';
export { predict, predictMany, type PredictManyOptions, type PredictOptions } from './predict';
export { modelVersion } from './modelVersion';
