import type { IlluminantId, ObserverId } from '../library/colourTables';
import { chromaAndHue, labFromXYZ } from './cieLab';
import { displayColour } from './displayColour';
import { chromaticity, tristimulus, viewingWeights, type Triple } from './tristimulus';
import { colourInWords, type Matter } from './words';

/** One colour in every notation. */
export interface ColourNumbers {
  readonly XYZ: Triple;
  readonly xy: readonly [number, number];
  readonly Lab: Triple;
  readonly C: number;
  readonly h: number;
  readonly OKLab: Triple;
  readonly srgbLinear: Triple;
  /** Channels clipped one by one. */
  readonly hex: string;
  /** Chroma reduced instead, as the app shows it. */
  readonly hexShown: string;
  readonly inGamut: boolean;
  readonly words: string;
}

/** Lamps and eyes under which a colour is compared: two lamps can disagree on a match (metamerism). */
export const comparedIlluminants: readonly IlluminantId[] = ['D65', 'A', 'D50', 'F11', 'LED-B3'];
export const comparedObservers: readonly ObserverId[] = ['2deg', '10deg'];

/** Numbers of one sample under one lamp and eye. */
export function colourNumbers(
  passed: ArrayLike<number>,
  illuminant: IlluminantId,
  observer: ObserverId,
  matter: Matter,
): ColourNumbers {
  const weights = viewingWeights({ illuminant, observer });
  const XYZ = tristimulus(passed, weights);
  const Lab = labFromXYZ(XYZ, weights.white);
  const { chroma, hue } = chromaAndHue(Lab);
  const shown = displayColour(XYZ, weights.white);
  return {
    XYZ,
    xy: chromaticity(XYZ, weights.white),
    Lab,
    C: chroma,
    h: hue,
    OKLab: shown.oklab,
    srgbLinear: shown.linear,
    hex: shown.hexClipped,
    hexShown: shown.hex,
    inGamut: shown.inGamut,
    words: colourInWords(Lab, matter),
  };
}

/** The same sample under five lamps and both observers, keyed `D65_2deg`. */
export const colourUnderManyLamps = (
  passed: ArrayLike<number>,
  matter: Matter,
): Record<string, ColourNumbers> =>
  Object.fromEntries(
    comparedIlluminants.flatMap((illuminant) =>
      comparedObservers.map((observer) => [
        `${illuminant}_${observer}`,
        colourNumbers(passed, illuminant, observer, matter),
      ]),
    ),
  );
