/** A term label taken apart: `4T1g(P)` is multiplicity 4, letter T, subscript `1g`, parent P. */
export interface TermLabel {
  readonly multiplicity: number;
  readonly letter: string;
  readonly subscript: string;
  readonly primes: string;
  /** What stands in brackets after it, e.g. the free-ion parent. */
  readonly parent: string | null;
}

const pattern = /^(\d{1,2})([A-Z])(\d?[gu]?)([′″']{0,2})(?:\s*\(([^)]*)\))?$/;

/** Null for anything that is not a term label, such as the name of a charge transfer. */
export function parseTermLabel(label: string): TermLabel | null {
  const match = pattern.exec(label.trim());
  if (!match) return null;
  const [, multiplicity, letter, subscript, primes, parent] = match;
  return {
    multiplicity: Number(multiplicity),
    letter: letter!,
    subscript: subscript!,
    primes: primes!.replaceAll("'", '′'),
    parent: parent ?? null,
  };
}

const multiplicityNames = [
  'singlet',
  'doublet',
  'triplet',
  'quartet',
  'quintet',
  'sextet',
  'septet',
  'octet',
];

/** `quartet` for 4; `multiplicity 9` beyond the names in use. */
export const multiplicityName = (multiplicity: number): string =>
  multiplicityNames[multiplicity - 1] ?? `multiplicity ${multiplicity}`;

const numbers: Readonly<Record<string, string>> = { '1': 'one', '2': 'two', '3': 'three', '4': 'four' };

/** The label as one says it: `quartet T two g`. Other text comes back as it is. */
export function spokenTerm(label: string): string {
  const term = parseTermLabel(label);
  if (!term) return label;
  const sub = [...term.subscript].map((sign) => numbers[sign] ?? sign);
  const primes = term.primes === '' ? [] : [term.primes.length === 1 ? 'prime' : 'double prime'];
  const parent = term.parent === null ? [] : ['from', term.parent];
  return [multiplicityName(term.multiplicity), term.letter, ...sub, ...primes, ...parent].join(' ');
}
