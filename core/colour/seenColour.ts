import { labFromXYZ } from './cieLab';
import { displayHex } from './displayColour';
import type { Triple, ViewingWeights } from './tristimulus';
import type { SeenColour } from './types';
import { colourInWords, type Matter } from './words';

/** The colour of XYZ as everyone of this program states it: numbers, screen colour and words, with its viewing. */
export function seenColour(XYZ: Triple, weights: ViewingWeights, matter: Matter = 'solution'): SeenColour {
  const lab = labFromXYZ(XYZ, weights.white);
  const { hex, inGamut } = displayHex(XYZ, weights.white);
  return {
    srgb: hex,
    inGamut,
    lab: [lab[0], lab[1], lab[2]],
    XYZ: [XYZ[0], XYZ[1], XYZ[2]],
    words: colourInWords(lab, matter),
    illuminant: weights.illuminant,
    observer: weights.observer,
  };
}
