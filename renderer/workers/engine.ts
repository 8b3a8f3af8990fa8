import { predictMany } from '../../core/prediction';
import type { Predictor } from './serve';
import type { Overlay } from './protocol';

/** The engine as the worker calls it, with the parameters of a project laid over the library. */
export const predictorFor =
  (overlay: Overlay): Predictor =>
  (inputs, options = {}) =>
    predictMany(inputs, { ...options, parameterSet: overlay, placeOf: () => '' });
