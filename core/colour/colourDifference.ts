import { differenceCiede2000 } from 'culori/fn';
import type { Triple } from './tristimulus';

/** `lab65` and not `lab`: the latter is read as D50 and gives other numbers without a word. */
const ciede2000 = differenceCiede2000();

/**
 * CIEDE2000 colour difference with kL = kC = kH = 1 of two L*, a*, b* that belong to the same white. G. Sharma, W. Wu
 * and E. N. Dalal, Color Res. Appl. 30, 21 (2005); ISO/CIE 11664-6.
 */
export const colourDifference = (one: Triple, other: Triple): number =>
  ciede2000(
    { mode: 'lab65', l: one[0], a: one[1], b: one[2] },
    { mode: 'lab65', l: other[0], a: other[1], b: other[2] },
  );

/** CIE 1976 colour difference: the distance in L*, a*, b*. */
export const colourDistance = (one: Triple, other: Triple): number =>
  Math.hypot(one[0] - other[0], one[1] - other[1], one[2] - other[2]);
