import type { ParameterLibrary } from '../library';
import { transitionMetals } from '../library/elements';
import { didYouMean } from '../record/didYouMean';
import { readRoman } from './charge';
import type { Entity } from './coordinationEntity';
import { Unreadable } from './types';

/** Numerical prefixes of additive names (IUPAC Red Book 2005, table IV). */
const simple = ['', 'mono', 'di', 'tri', 'tetra', 'penta', 'hexa', 'hepta', 'octa'];
const composed = ['', '', 'bis', 'tris', 'tetrakis', 'pentakis', 'hexakis'];

/** Ligand names of the Red Book, and those of 1970 that are still met, beside the names of the library. */
const ligandNames: Readonly<Record<string, readonly string[]>> = {
  f: ['fluorido', 'fluoro'],
  cl: ['chlorido', 'chloro'],
  br: ['bromido', 'bromo'],
  i: ['iodido', 'iodo'],
  oh: ['hydroxido', 'hydroxo'],
  oxo: ['oxido', 'oxo'],
  h2o: ['aqua', 'aquo'],
  nh3: ['ammine'],
  cn: ['cyanido', 'cyano'],
  ncs_n: ['isothiocyanato', 'thiocyanato-N', 'thiocyanato-κN'],
  scn_s: ['thiocyanato', 'thiocyanato-S', 'thiocyanato-κS'],
  no2_n: ['nitro', 'nitrito-N', 'nitrito-κN'],
  ono_o: ['nitrito', 'nitrito-O', 'nitrito-κO'],
  ox: ['oxalato', 'ethanedioato'],
  acac: ['acetylacetonato', 'pentane-2,4-dionato'],
  gly: ['glycinato'],
  mal: ['malonato'],
  en: ['ethylenediamine', 'ethane-1,2-diamine'],
  bipy: ['bipyridine', "2,2'-bipyridine", '2,2′-bipyridine'],
};

/** Stems of metals in anions where they differ from the name of the element (IUPAC Red Book 2005, table X). */
const anionStems: Readonly<Record<string, string>> = {
  Fe: 'ferrate',
  Cu: 'cuprate',
  Ag: 'argentate',
  Au: 'aurate',
  Co: 'cobaltate',
  Ni: 'nickelate',
  Zn: 'zincate',
  Mn: 'manganate',
  Mo: 'molybdate',
  W: 'tungstate',
  Hg: 'mercurate',
};

const anionName = (symbol: string, name: string): string =>
  anionStems[symbol] ?? `${name.replace(/(ium|um|en)$/, '')}ate`;

/** A metal at the end of a name: `cobalt`, `cobaltate`. */
const metalNames = transitionMetals
  .flatMap(({ symbol, name }) => [
    { symbol, text: name },
    { symbol, text: anionName(symbol, name) },
  ])
  .sort((one, other) => other.text.length - one.text.length);

const named = /^(.+?)\s*\((0|-?[IVX]+)\)\s*(.*)$/;

/** Whether a text is a name rather than a formula: a word that ends in an oxidation number. */
export const looksLikeName = (text: string): boolean =>
  !text.includes('[') && /[a-z]{4}\s*\((0|-?[IVX]+)\)/.test(text);

/** Reads `tris(ethane-1,2-diamine)cobalt(III)`; what follows the number (`ion`, `chloride`) is given back. */
export function readName(
  text: string,
  library: ParameterLibrary,
): Entity & { readonly oxidationState: number; readonly rest: string } {
  const match = named.exec(text.trim());
  if (match === null)
    throw new Unreadable(0, 'A name ends in its metal and oxidation number, as in cobalt(III)');
  const [, words, roman, rest] = match;
  const lower = words!.toLowerCase();
  const metal = metalNames.find((each) => lower.endsWith(each.text));
  if (metal === undefined) {
    const tail = /[a-z]+$/.exec(lower)?.[0] ?? '';
    const choices = metalNames.map((each) => ({ answer: each.text, names: [] }));
    throw new Unreadable(
      words!.length - tail.length,
      `“${tail}” does not end in a transition metal`,
      didYouMean(tail, choices),
    );
  }
  const ligands = readLigands(words!.slice(0, words!.length - metal.text.length), library);
  return { metal: metal.symbol, ligands, oxidationState: readRoman(roman!)!, rest: rest! };
}

interface LigandName {
  readonly id: string;
  readonly text: string;
}

function namesOf(library: ParameterLibrary): LigandName[] {
  return [...library.ligands.values()]
    .flatMap(({ id, commonName, iupacName }) =>
      [...(ligandNames[id] ?? []), iupacName, commonName].map((text) => ({ id, text: text.toLowerCase() })),
    )
    .sort((one, other) => other.text.length - one.text.length);
}

function readLigands(words: string, library: ParameterLibrary): Record<string, number> {
  const names = namesOf(library);
  const lower = words.toLowerCase();
  const ligands: Record<string, number> = {};
  let place = 0;
  while (place < lower.length) {
    if (/[\s-]/.test(lower[place]!)) {
      place += 1;
      continue;
    }
    const found = inBrackets(lower, place, names) ?? withPrefix(lower, place, names);
    if (found === undefined) {
      // The prefix before it is right, most likely: what follows is not.
      const start =
        place + Math.max(...simple.map((each) => (lower.startsWith(each, place) ? each.length : 0)));
      const word = /^[a-z]+|^./.exec(lower.slice(start))?.[0] ?? '';
      throw new Unreadable(
        start,
        `“${word}” is no ligand that is known by name`,
        didYouMean(
          word,
          names.map(({ text }) => ({ answer: text, names: [] })),
        ),
      );
    }
    ligands[found.id] = (ligands[found.id] ?? 0) + found.times;
    place += found.length;
  }
  if (Object.keys(ligands).length === 0) throw new Unreadable(0, 'No ligand is named');
  return ligands;
}

interface Counted {
  readonly id: string;
  readonly times: number;
  readonly length: number;
}

/** `tris(ethane-1,2-diamine)`, `bis{...}` */
function inBrackets(text: string, from: number, names: readonly LigandName[]): Counted | undefined {
  const times = composed.findIndex(
    (prefix) => prefix !== '' && new RegExp(`^${prefix}[({[]`).test(text.slice(from)),
  );
  const open = from + (times < 0 ? 0 : composed[times]!.length);
  if (!/[({[]/.test(text[open] ?? '')) return undefined;
  let depth = 0;
  for (let place = open; place < text.length; place++) {
    if (/[({[]/.test(text[place]!)) depth += 1;
    if (/[)}\]]/.test(text[place]!)) depth -= 1;
    if (depth > 0) continue;
    const word = text.slice(open + 1, place);
    const found = names.find((name) => name.text === word);
    return found && { id: found.id, times: Math.max(1, times), length: place + 1 - from };
  }
  return undefined;
}

function withPrefix(text: string, from: number, names: readonly LigandName[]): Counted | undefined {
  for (let times = simple.length - 1; times >= 0; times--) {
    const prefix = simple[times]!;
    if (!text.startsWith(prefix, from)) continue;
    // `pentaammine` keeps its vowel, `tetraaqua` too; old texts drop it: `pentammine`.
    for (const start of [from + prefix.length, from + prefix.length - 1]) {
      if (start < from || (start === from + prefix.length - 1 && times === 0)) continue;
      const found = names.find((name) => text.startsWith(name.text, start));
      if (found !== undefined && (start === from + prefix.length || /^[ao]/.test(found.text))) {
        return { id: found.id, times: Math.max(1, times), length: start + found.text.length - from };
      }
    }
  }
  return undefined;
}
