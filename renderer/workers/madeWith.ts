import { defaultLibrary } from '../../core/library/parameterLibrary';
import { modelVersion } from '../../core/prediction/modelVersion';
import { parameterHash } from '../../core/record/hash';
import type { Overlay } from './protocol';

/** Names the model and the parameters of an answer: one made with others is never shown in its place. */
export const madeWithName = (overlay: Overlay): string =>
  `${modelVersion}/${parameterHash(overlay?.values ?? {}, defaultLibrary.version).slice(0, 16)}`;
