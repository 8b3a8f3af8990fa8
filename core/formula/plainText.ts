/** A text in plain letters, and for each of its characters the place in the text that was typed. */
export interface PlainText {
  readonly text: string;
  readonly places: readonly number[];
}

const subscripts = '₀₁₂₃₄₅₆₇₈₉';
const superscripts = '⁰¹²³⁴⁵⁶⁷⁸⁹';
const superSigns: Readonly<Record<string, string>> = { '⁺': '+', '⁻': '-' };
const signs: Readonly<Record<string, string>> = {
  '−': '-',
  '–': '-',
  '⁃': '-',
  '•': '·',
  '∙': '·',
  '*': '·',
};

/**
 * Subscript digits as digits; superscripts as `^` and what they say, so that a charge is never taken for a count; the
 * several minus signs and dots as one each.
 */
export function plainText(typed: string): PlainText {
  let text = '';
  const places: number[] = [];
  let raised = false;
  Array.from(typed).reduce((place, letter) => {
    const sub = subscripts.indexOf(letter);
    const sup = superscripts.indexOf(letter);
    const isRaised = sup >= 0 || superSigns[letter] !== undefined;
    const plain =
      sub >= 0 ? String(sub) : sup >= 0 ? String(sup) : (superSigns[letter] ?? signs[letter] ?? letter);
    const written = isRaised && !raised ? `^${plain}` : plain;
    for (const each of written) {
      text += each;
      places.push(place);
    }
    raised = isRaised;
    return place + letter.length;
  }, 0);
  return { text, places: [...places, typed.length] };
}
