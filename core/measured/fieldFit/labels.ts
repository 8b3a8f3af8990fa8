/** A level as people name it: multiplicity and irrep, and which of several of one name. */
export interface NamedLevel {
  readonly multiplicity: number;
  /** Without g or u: `T1`; null where only the multiplicity is said. */
  readonly irrep: string | null;
  /** Free-ion parent where one was written, `F` or `P`. */
  readonly parent: string | null;
}

const term = /(\d+)\s*([ABET])\s*([12]?)\s*[gu]?(?:\s*\(\s*([A-Z])\s*\))?/;

const multiplets = ['singlet', 'doublet', 'triplet', 'quartet', 'quintet', 'sextet'];

/**
 * The upper level of an assignment as written: `4T2g`, `4A2g -> 4T1g(P)`, `3T1(F) → 3A2`, `singlet`. Of `4A1g,4Eg` the
 * first is taken; of `1E(1T1g)` the cubic level. Null where nothing is recognised.
 */
export function parseLevel(label: string): NamedLevel | null {
  const whole = label
    .split(/->|→|⟶|—>/)
    .at(-1)!
    .replace(/[_^{}$\s]/g, '');
  // Of a component of low symmetry, `1E(1T1g)`, the cubic level stands in the brackets.
  const upper = /\((\d[AET][12]?[gu]?)\b.*\)/.exec(whole)?.[1] ?? whole;
  const match = term.exec(upper);
  if (match === null) {
    const word = multiplets.findIndex((name) => upper.toLowerCase().includes(name));
    return word < 0 ? null : { multiplicity: word + 1, irrep: null, parent: null };
  }
  const [, multiplicity, letter, index, parent] = match;
  if (letter === 'B') return null;
  return { multiplicity: Number(multiplicity), irrep: `${letter}${index}`, parent: parent ?? null };
}

/** Multiplicity of the ground level of an assignment with an arrow, 4 of `4A2g -> 4T2g`; null without one. */
export function groundMultiplicityOf(label: string): number | null {
  const parts = label.split(/->|→|⟶|—>/);
  const match = parts.length > 1 ? /^[\s^{]*(\d+)/.exec(parts[0]!) : null;
  return match === null ? null : Number(match[1]);
}
