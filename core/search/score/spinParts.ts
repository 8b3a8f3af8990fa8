import type { Prediction } from '../../prediction';
import { hundUnpaired } from '../../spin';
import type { Wish } from '../wish/wish';

/** One spin state that a complex may turn out to have. */
interface SpinCase {
  readonly chance: number;
  readonly unpaired: number;
  /** All electrons as unpaired as Hund's rule allows. */
  readonly high: boolean;
  /** The state that the bands were predicted for. */
  readonly predicted: boolean;
}

function casesOf({ spin, dElectrons }: Prediction): SpinCase[] {
  const most = hundUnpaired(dElectrons);
  const predictedHigh = spin.unpairedElectrons === most;
  if (spin.probabilityHigh === null) {
    return [{ chance: 1, unpaired: spin.unpairedElectrons, high: predictedHigh, predicted: true }];
  }
  // The other state pairs as far as the d count lets it: low spin of an even shell has none left, of an odd one one.
  const low = predictedHigh ? (dElectrons === 4 ? 2 : most % 2) : spin.unpairedElectrons;
  return [
    { chance: spin.probabilityHigh, unpaired: most, high: true, predicted: predictedHigh },
    { chance: 1 - spin.probabilityHigh, unpaired: low, high: false, predicted: !predictedHigh },
  ];
}

const meets = (each: SpinCase, { spin, unpaired }: Wish): boolean =>
  (spin === undefined || (spin === 'high') === each.high) &&
  (unpaired === undefined || (each.unpaired >= unpaired.min && each.unpaired <= unpaired.max));

/** Chance that the complex has a spin state that the wish asks for. */
export const chanceOfSpin = (prediction: Prediction, wish: Wish): number =>
  casesOf(prediction).reduce((sum, each) => sum + (meets(each, wish) ? each.chance : 0), 0);

/**
 * Chance that the complex has the spin state its bands were predicted for and that state is a wished one. The spectrum
 * of the other state is not predicted, so a wish for bands or colour cannot count on it.
 */
export const chanceOfPredictedSpin = (prediction: Prediction, wish: Wish): number =>
  casesOf(prediction).reduce((sum, each) => sum + (each.predicted && meets(each, wish) ? each.chance : 0), 0);
