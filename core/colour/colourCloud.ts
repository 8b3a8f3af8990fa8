import type { BulkColours } from './colourBulk';
import { seenColourOf } from './seenColour';
import { chromaAndHue, hueDistance } from './cieLab';
import { colourInWords, type Matter } from './words';
import type { ColourCloud, SeenColour } from './types';
import type { Triple } from './tristimulus';

export const tripleAt = (values: Float64Array, index: number): Triple => [
  values[3 * index]!,
  values[3 * index + 1]!,
  values[3 * index + 2]!,
];

/** Words with the share of the draws that bear them, most frequent first (alphabetical where equal). */
function countWords(
  words: Iterable<string>,
  of: number,
): { readonly words: string; readonly share: number }[] {
  const counts = new Map<string, number>();
  for (const each of words) counts.set(each, (counts.get(each) ?? 0) + 1);
  return [...counts]
    .map(([each, count]) => ({ words: each, share: count / of }))
    .sort((one, other) => other.share - one.share || (one.words < other.words ? -1 : 1));
}

/** Words that occur among the draws, without making their swatches. */
export const wordsOfCloud = (
  colours: BulkColours,
  matter: Matter = 'solution',
): { readonly words: string; readonly share: number }[] =>
  countWords(
    Array.from({ length: colours.count }, (_, index) => colourInWords(tripleAt(colours.lab, index), matter)),
    colours.count,
  );

/** Colours of all draws with their words: what one swatch cannot say. */
export function colourCloud(colours: BulkColours, matter: Matter = 'solution'): ColourCloud {
  const draws: SeenColour[] = [];
  for (let index = 0; index < colours.count; index++) {
    const [XYZ, lab] = [tripleAt(colours.XYZ, index), tripleAt(colours.lab, index)];
    draws.push(seenColourOf(XYZ, lab, colours.weights, matter));
  }
  return {
    draws,
    words: countWords(
      draws.map(({ words }) => words),
      colours.count,
    ),
  };
}

/**
 * Hue angles (degrees) between which the middle 95 % of the draws with any hue lie, going up from `from`; null where
 * hardly any draw has a hue. `from` may exceed `to` where the arc crosses 0.
 */
export function hueSpread(colours: BulkColours, leastChroma = 3): { from: number; to: number } | null {
  const hues: number[] = [];
  let [cosine, sine] = [0, 0];
  for (let index = 0; index < colours.count; index++) {
    const { chroma, hue } = chromaAndHue(tripleAt(colours.lab, index));
    if (chroma < leastChroma) continue;
    hues.push(hue);
    cosine += Math.cos((hue * Math.PI) / 180);
    sine += Math.sin((hue * Math.PI) / 180);
  }
  if (hues.length < colours.count / 10) return null;
  const middle = chromaAndHue([0, cosine, sine]).hue;
  const signed = hues
    .map((hue) => hueDistance(hue, middle) * ((hue - middle + 540) % 360 >= 180 ? 1 : -1))
    .sort((one, other) => one - other);
  const at = (share: number): number => signed[Math.round(share * (signed.length - 1))]!;
  const whole = (angle: number): number => (middle + angle + 360) % 360;
  return { from: whole(at(0.025)), to: whole(at(0.975)) };
}
