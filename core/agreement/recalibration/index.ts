export { basisFor } from './basis';
export { observationOf, type Observation } from './observations';
export {
  recalibrate,
  type ErrorPair,
  type PartResult,
  type Recalibration,
  type RecalibrateOptions,
} from './recalibrate';
export { type ParameterChange } from './proposal';
export { parameterSetFrom, type Adoption } from './parameterSet';
export { bundleObservations, observationsOf, type PlainObservation } from './recordObservations';
