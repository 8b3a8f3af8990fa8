import { chromaAndHue } from './cieLab';
import type { Triple } from './tristimulus';

/** What is looked at decides the words for no colour: a solution is colourless, a powder white. */
export type Matter = 'solution' | 'powder';

/**
 * Hue terms by CIE 1976 hue angle, each from its angle up to the next. Our own division, laid so that the angles of
 * pure screen and Munsell hues fall under their usual names.
 */
const hueTerms: readonly (readonly [number, string])[] = [
  [0, 'crimson'],
  [25, 'red'],
  [50, 'orange'],
  [78, 'yellow'],
  [110, 'greenish yellow'],
  [122, 'yellow-green'],
  [135, 'green'],
  [165, 'blue-green'],
  [190, 'greenish blue'],
  [225, 'blue'],
  [298, 'violet'],
  [322, 'purple'],
  [347, 'crimson'],
];

function hueTerm(hue: number, lightness: number, chroma: number): string {
  if ((hue >= 340 || hue < 40) && lightness >= 65) return 'pink';
  if (hue >= 40 && hue < 78 && lightness < 50) return 'brown';
  if (hue >= 78 && hue < 122 && lightness < 50 && chroma < 60) return 'olive';
  let term = hueTerms[0]![1];
  for (const [from, name] of hueTerms) if (hue >= from) term = name;
  return term;
}

/** Steps of lightness; within each, steps of chroma up to which a modifier holds. */
const modifiers: readonly { from: number; steps: readonly (readonly [number, string])[] }[] = [
  {
    from: 80,
    steps: [
      [10, 'very pale'],
      [30, 'pale'],
      [60, 'light'],
      [Infinity, 'bright'],
    ],
  },
  {
    from: 50,
    steps: [
      [25, 'greyish'],
      [60, ''],
      [Infinity, 'vivid'],
    ],
  },
  {
    from: 25,
    steps: [
      [25, 'dark greyish'],
      [Infinity, 'deep'],
    ],
  },
  { from: 8, steps: [[Infinity, 'very dark']] },
];

function withoutHue(lightness: number, matter: Matter): string {
  if (lightness >= 93) return matter === 'solution' ? 'colourless' : 'white';
  if (lightness >= 75) return 'light grey';
  if (lightness >= 45) return 'grey';
  return 'dark grey';
}

/** Below this chroma no hue is told: 3 where it is light, more where it is dark and chroma is hard to see. */
const leastChroma = (lightness: number): number => (lightness >= 80 ? 3 : lightness >= 25 ? 6 : 8);

/**
 * Colour in words, `pale violet`, `deep blue`, `colourless`. Lightness names the first step, chroma the second, hue
 * the term; pink, brown and olive are the light reds and the dark oranges and yellows. Words are coarse by design:
 * the numbers stand beside them.
 *
 * @param lab - CIE 1976 L*, a*, b* of the white the eye is adapted to
 */
export function colourInWords(lab: Triple, matter: Matter = 'solution'): string {
  const lightness = lab[0];
  const { chroma, hue } = chromaAndHue(lab);
  if (lightness < 8) return 'black';
  if (chroma < leastChroma(lightness)) return withoutHue(lightness, matter);
  const step = modifiers.find(({ from }) => lightness >= from)!;
  const modifier = step.steps.find(([below]) => chroma < below)![1];
  const term = hueTerm(hue, lightness, chroma);
  return modifier === '' ? term : `${modifier} ${term}`;
}

/** The hue term alone, `violet`; null where no hue can be told. */
export function hueInWords(lab: Triple): string | null {
  const { chroma, hue } = chromaAndHue(lab);
  if (lab[0] < 8 || chroma < leastChroma(lab[0])) return null;
  return hueTerm(hue, lab[0], chroma);
}
