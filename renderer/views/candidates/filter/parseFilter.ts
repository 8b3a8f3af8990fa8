import { geometries } from '../../../../core/library/geometries';
import { transitionMetals } from '../../../../core/library/elements';
import type { LigandRecord } from '../../../../core/library/ligands';
import type { Condition, FilterTerm, QuantityName } from './condition';

const roman: Readonly<Record<string, number>> = {
  I: 1,
  II: 2,
  III: 3,
  IV: 4,
  V: 5,
  VI: 6,
  VII: 7,
  VIII: 8,
  IX: 9,
};

const bySymbol = new Map(transitionMetals.map((metal) => [metal.symbol.toLowerCase(), metal.symbol]));
const byName = new Map(transitionMetals.map((metal) => [metal.name, metal.symbol]));

/** `Cr`, `Cr(III)`, `Cr3+`, `Cr III`, `chromium` */
function readIon(text: string): Condition | null {
  const match = /^([A-Za-z]+)\s*(?:\(?\s*(I{1,3}|IV|VI{0,3}|IX)\s*\)?|\(?(\d)\s*\+?\)?)?$/.exec(text);
  if (!match) return null;
  const [, name, numeral, figure] = match;
  const symbol = byName.get(name!.toLowerCase()) ?? bySymbol.get(name!.toLowerCase());
  if (symbol === undefined) return null;
  const state = numeral !== undefined ? roman[numeral]! : figure !== undefined ? Number(figure) : null;
  return { kind: 'ion', metal: symbol, oxidationState: state };
}

const number = String.raw`(\d[\d\s]*(?:[.,]\d+)?)`;
const span = String.raw`(?:${number}\s*(?:-|–|\bto\b|\.\.)\s*${number}|(<=?|>=?|≤|≥|above|below|over|under)\s*${number})`;
const value = (text: string): number => Number(text.replace(/\s/g, '').replace(',', '.'));

function readSpan(match: RegExpExecArray, at: number): readonly [from: number, to: number] {
  const [low, high, sign, limit] = match.slice(at, at + 4);
  if (low !== undefined && high !== undefined) {
    const ends = [value(low), value(high)].sort((one, other) => one - other);
    return [ends[0]!, ends[1]!];
  }
  const end = value(limit!);
  return /^(<|≤|below|under)/.test(sign!) ? [-Infinity, end] : [end, Infinity];
}

const bandPattern = new RegExp(
  String.raw`^(?:band\s*(?:at|in|between)?\s*)?${span}\s*(nm|cm-1|cm⁻¹|eV)$`,
  'i',
);

/** `450-520 nm`, `above 20 000 cm-1`, `band 2.1 to 2.4 eV` */
function readBand(text: string): Condition | null {
  const match = bandPattern.exec(text);
  if (!match) return null;
  const [from, to] = readSpan(match, 1);
  const unit = match[5]!.toLowerCase();
  if (unit === 'nm') {
    return { kind: 'band', from: to === Infinity ? 0 : 1e7 / to, to: from <= 0 ? Infinity : 1e7 / from };
  }
  const factor = unit === 'ev' ? 8065.54 : 1;
  return { kind: 'band', from: Math.max(0, from * factor), to: to * factor };
}

const quantityPattern = new RegExp(
  String.raw`^(10\s?dq|Δ|delta|B|distance|ΔE|unpaired(?: electrons)?)\s*(?:=\s*)?(?:${span}|(\d+))\s*(?:cm-1|cm⁻¹)?$`,
  'i',
);

/** `10Dq > 20000`, `B 600-700`, `distance < 10`, `unpaired 3` */
function readQuantity(text: string): Condition | null {
  const match = quantityPattern.exec(text);
  if (!match) return null;
  const word = match[1]!.toLowerCase();
  const name: QuantityName = word.startsWith('unpaired')
    ? 'unpaired'
    : word === 'b'
      ? 'B'
      : word === 'distance' || word === 'δe'
        ? 'distance'
        : '10Dq';
  const exact = match[6];
  const [from, to] = exact === undefined ? readSpan(match, 2) : [Number(exact), Number(exact)];
  return { kind: 'quantity', name, from, to };
}

const fixedWords: Readonly<Record<string, Condition>> = {
  'high spin': { kind: 'spin', state: 'high' },
  'high-spin': { kind: 'spin', state: 'high' },
  hs: { kind: 'spin', state: 'high' },
  'low spin': { kind: 'spin', state: 'low' },
  'low-spin': { kind: 'spin', state: 'low' },
  ls: { kind: 'spin', state: 'low' },
  crossover: { kind: 'spin', state: 'near' },
  'near crossover': { kind: 'spin', state: 'near' },
  'near spin crossover': { kind: 'spin', state: 'near' },
  starred: { kind: 'mark', mark: 'starred' },
  archived: { kind: 'mark', mark: 'archived' },
  flagged: { kind: 'mark', mark: 'flagged' },
  refused: { kind: 'mark', mark: 'refused' },
};

function readWord(text: string, ligands: readonly LigandRecord[]): Condition | null {
  const lower = text.toLowerCase();
  const fixed = fixedWords[lower];
  if (fixed) return fixed;
  if (text.startsWith('#') && text.length > 1) return { kind: 'tag', tag: text.slice(1).trim() };
  const electrons = /^d(\d|10)$/.exec(lower);
  if (electrons) return { kind: 'electrons', count: Number(electrons[1]) };
  const geometry = geometries.find(
    ({ id, name, aliases }) =>
      id === lower || name === lower || (lower.length > 2 && aliases.includes(lower)),
  );
  if (geometry) return { kind: 'geometry', id: geometry.id };
  // `CO` is carbonyl and `Co` is cobalt: the exact spelling of a ligand wins over a metal in other letters.
  const exact = ligands.find(({ abbreviation }) => abbreviation === text);
  const ion = readIon(text);
  if (exact && !(ion && bySymbol.get(lower) === text)) return asLigand(exact);
  if (ion) return ion;
  const named = ligands.find(({ id, abbreviation, commonName, iupacName }) =>
    [id, abbreviation, commonName, iupacName].some((name) => name.toLowerCase() === lower),
  );
  return named ? asLigand(named) : null;
}

const asLigand = ({ id, abbreviation }: LigandRecord): Condition => ({
  kind: 'ligand',
  id,
  name: abbreviation,
});

function readCondition(text: string, ligands: readonly LigandRecord[]): Condition {
  return (
    readBand(text) ??
    readQuantity(text) ??
    readWord(text, ligands) ?? { kind: 'words', words: text.toLowerCase() }
  );
}

/**
 * What was typed into the filter: terms apart by commas must all hold, `or` joins alternatives, `not` (or `no`, `-`, or
 * `excluded` behind) turns a term round. What is no known word is looked for as text.
 */
export function parseFilter(text: string, ligands: readonly LigandRecord[]): FilterTerm[] {
  return text
    .split(/[,;](?!\d)/)
    .map((part) => part.trim())
    .filter(Boolean)
    .map((part) => {
      const turned =
        /^(?:not\s+|no\s+|without\s+|-(?=[A-Za-z#]))(.+)$/i.exec(part) ?? /^(.+?)\s+excluded$/i.exec(part);
      const plain = turned ? turned[1]!.trim() : part.replace(/^with\s+/i, '');
      const alternatives = plain.split(/\s+or\s+/i).filter(Boolean);
      return {
        negated: turned !== null,
        anyOf: alternatives.map((each) => readCondition(each.trim(), ligands)),
      };
    });
}
