import { labFromXYZ } from './cieLab';
import { displayHex } from './displayColour';
import type { Triple, ViewingWeights } from './tristimulus';
import type { SeenColour } from './types';
import { colourInWords, type Matter } from './words';

/** The colour of XYZ as everyone of this program states it: numbers, screen colour and words, with its viewing. */
export const seenColour = (XYZ: Triple, weights: ViewingWeights, matter: Matter = 'solution'): SeenColour =>
  seenColourOf(XYZ, labFromXYZ(XYZ, weights.white), weights, matter);

/** The same where L*a*b* is at hand already. */
export function seenColourOf(XYZ: Triple, lab: Triple, weights: ViewingWeights, matter: Matter): SeenColour {
  const { hex, inGamut } = displayHex(XYZ, weights.white);
  return {
    srgb: hex,
    inGamut,
    lab,
    XYZ,
    words: colourInWords(lab, matter),
    illuminant: weights.illuminant,
    observer: weights.observer,
  };
}
