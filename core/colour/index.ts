export { illuminantIds, illuminants, observerIds, observers } from '../library/colourTables';
export type { IlluminantId, ObserverId } from '../library/colourTables';
export type { ColourCloud, SeenColour } from './types';
export {
  defaultViewing,
  tristimulus,
  viewingWeights,
  chromaticity,
  type Triple,
  type Viewing,
} from './tristimulus';
export { chromaAndHue, hueDistance, labFromXYZ, lchFromLab } from './cieLab';
export { displayColour, type DisplayColour } from './displayColour';
export { linearToOklab, oklabToLinear } from './oklab';
export { colourDifference, colourDistance } from './colourDifference';
export { colourInWords, hueInWords, type Matter } from './words';
export { seenColour } from './seenColour';
export {
  colourAtThreeStrengths,
  colourOfSolution,
  strengthFactors,
  type SolutionConditions,
} from './solutionColour';
export { colourOfPowder, fullShadeScale, type PowderConditions } from './powderColour';
export { colourBulk, type BulkColours } from './colourBulk';
export { colourCloud, hueSpread, tripleAt, wordsOfCloud } from './colourCloud';
export { chanceOfBand, chanceOfColour, medianDifference, type BandTarget, type ColourTarget } from './target';
export {
  colourNumbers,
  colourUnderManyLamps,
  comparedIlluminants,
  comparedObservers,
  type ColourNumbers,
} from './manyViewings';
