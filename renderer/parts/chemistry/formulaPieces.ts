/** A stretch of a formula that is set on one line. */
export interface FormulaPiece {
  readonly kind: 'text' | 'subscript' | 'superscript';
  readonly text: string;
}

/** A charge marked with `^`, or right behind the last bracket, or a lone sign at the very end. */
function chargeAhead(rest: string, before: string): RegExpExecArray | null {
  const marked = /^\^(\d*[+\-−]|[+\-−]\d*)/.exec(rest);
  if (marked) return marked;
  if (before === ']') return /^(\d*[+\-−])(?![A-Za-z(])/.exec(rest);
  return /[)A-Za-z\d]/.test(before) ? /^([+\-−])$/.exec(rest) : null;
}

/**
 * Sets a bracket formula written on one line: figures after an element, a ligand or a bracket are subscripts, the
 * charge behind the last bracket (`]2+`, or `^2+` anywhere) is a superscript, a figure after a full stop or a centred
 * dot counts molecules of solvate.
 */
export function formulaPieces(formula: string): FormulaPiece[] {
  const whole = formula.trim();
  const pieces: FormulaPiece[] = [];
  let at = 0;
  const take = (kind: FormulaPiece['kind'], text: string, length: number): void => {
    const last = pieces.at(-1);
    if (last?.kind === kind) pieces[pieces.length - 1] = { kind, text: last.text + text };
    else pieces.push({ kind, text });
    at += length;
  };
  while (at < whole.length) {
    const rest = whole.slice(at);
    const before = at === 0 ? '' : whole[at - 1]!;
    const charge = chargeAhead(rest, before);
    const count = /[A-Za-z)\]}]/.test(before) ? /^\d+/.exec(rest) : null;
    const dot = /^[.·•*]\s*(\d*)/.exec(rest);
    if (charge) take('superscript', charge[1]!.replaceAll('-', '−'), charge[0].length);
    else if (count) take('subscript', count[0], count[0].length);
    else if (dot) take('text', `·${dot[1]!}`, dot[0].length);
    else take('text', rest[0]!, 1);
  }
  return pieces;
}

/** The formula spelled so that a screen reader says it in order: `Cr (NH3)5 Cl, charge 2 plus`. */
export function spokenFormula(formula: string): string {
  return formulaPieces(formula)
    .map(({ kind, text }) => {
      if (kind === 'superscript') {
        const size = text.replace(/[+−]/, '');
        return ` charge ${size === '' ? '' : `${size} `}${text.includes('+') ? 'plus' : 'minus'} `;
      }
      return kind === 'subscript'
        ? ` ${text} `
        : text
            .replaceAll('·', ' with ')
            .replace(/[[\](){}]/g, ' ')
            .replace(/([a-z])([A-Z])/g, '$1 $2');
    })
    .join('')
    .replace(/\s+/g, ' ')
    .trim();
}
