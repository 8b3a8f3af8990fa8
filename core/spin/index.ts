export type { SpinLabel, SpinPrediction } from './types';
export { roomTemperature_K, spinState, type SpinAnswer } from './spinState';
export { crossoverRatio, verticalGap, type LevelGap } from './crossover';
export { hundUnpaired, spinPair, type SpinPair } from './multiplicities';
export { mixedMoment, momentRange, secondOrderMoment, spinOnlyMoment } from './moment';
export { entropyTerm_cm1, spinEntropy } from './entropy';
export { nearCrossoverBelow, spinWords } from './words';
export { normalCdf } from './normal';
