export type { Caution, Prediction, PredictionOutcome } from './types';
export { predict, predictMany, type PredictManyOptions, type PredictOptions } from './predict';
export { modelVersion } from './modelVersion';
export { drawBands, estimateDraws, type ParameterEstimates } from './drawBands';
export { sharedNormals } from './sharedNormals';
export { spectrumRange } from './spectrumRange';
export type { Band, BandKind } from '../transitions/types';
