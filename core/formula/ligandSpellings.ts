import type { LigandRecord, ParameterLibrary } from '../library';
import { withoutCharge } from '../library/molarMass';
import { didYouMean } from '../record/didYouMean';

/** Spellings in use beside those of the library. */
const alsoWritten: Readonly<Record<string, readonly string[]>> = {
  h2o: ['OH2', 'water'],
  bipy: ['bipy', 'bipyridine'],
  terpy: ['terpy'],
  im: ['Him', 'imH'],
  mecn: ['NCMe', 'NCCH3'],
  menh2: ['NH2Me', 'CH3NH2'],
  ac: ['ac', 'CH3COO', 'CH3CO2'],
  co3: ['CO3'],
  ncs_n: ['NCS'],
  scn_s: ['SCN'],
  ono_o: ['ONO'],
  no2_n: ['NO2'],
  oh: ['HO'],
  mal: ['malonate'],
  tpp: ['TPP'],
};

const spellingsOf = (ligand: LigandRecord): string[] => [
  ligand.abbreviation,
  withoutCharge(ligand.formula, ligand.charge),
  ligand.commonName,
  ligand.iupacName,
  ligand.id,
  ...(alsoWritten[ligand.id] ?? []),
];

/** All ways to write each ligand of a library. */
export class LigandSpellings {
  readonly #exact = new Map<string, string>();
  readonly #folded = new Map<string, string>();
  readonly #longestFirst: readonly string[];
  readonly #choices: readonly { readonly answer: string; readonly names: readonly string[] }[];

  constructor(library: ParameterLibrary) {
    const choices: { answer: string; names: string[] }[] = [];
    for (const ligand of library.ligands.values()) {
      const spellings = spellingsOf(ligand).filter((spelling) => spelling !== '');
      choices.push({ answer: ligand.abbreviation, names: spellings });
      for (const spelling of spellings) {
        if (!this.#exact.has(spelling)) this.#exact.set(spelling, ligand.id);
        const folded = spelling.toLowerCase();
        if (!this.#folded.has(folded)) this.#folded.set(folded, ligand.id);
      }
    }
    this.#choices = choices;
    this.#longestFirst = [...this.#exact.keys()].sort((one, other) => other.length - one.length);
  }

  /** The ligand of a whole word, case minded first. */
  find(word: string): string | undefined {
    return this.#exact.get(word) ?? this.#folded.get(word.toLowerCase());
  }

  /** The longest spelling that begins at a place, for formulas without parentheses. */
  at(text: string, place: number): { readonly id: string; readonly length: number } | undefined {
    const found = this.#longestFirst.find((spelling) => text.startsWith(spelling, place));
    return found === undefined ? undefined : { id: this.#exact.get(found)!, length: found.length };
  }

  like(word: string): string[] {
    return didYouMean(word, this.#choices);
  }
}

const made = new WeakMap<ParameterLibrary, LigandSpellings>();

export function ligandSpellings(library: ParameterLibrary): LigandSpellings {
  const known = made.get(library) ?? new LigandSpellings(library);
  made.set(library, known);
  return known;
}
