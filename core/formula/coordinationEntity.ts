import type { ParameterLibrary } from '../library';
import { transitionMetals } from '../library/elements';
import { ligandSpellings } from './ligandSpellings';
import { Unreadable } from './types';

export interface Entity {
  readonly metal: string;
  readonly ligands: Readonly<Record<string, number>>;
}

const symbols = transitionMetals.map(({ symbol }) => symbol).sort((one, other) => other.length - one.length);
const count = /^\d+/;

/** Reads `Co(en)2Cl2`, what stands between square brackets, from a place on; the whole of it must make sense. */
export function readEntity(text: string, from: number, to: number, library: ParameterLibrary): Entity {
  const inner = text.slice(0, to);
  const metal = symbols.find((symbol) => inner.startsWith(symbol, from));
  if (metal === undefined) {
    throw new Unreadable(
      from,
      `A complex begins with its metal, and “${inner.slice(from, from + 2)}” is none of them`,
    );
  }
  const ligands: Record<string, number> = {};
  let place = from + metal.length;
  while (place < to) {
    const ligand = inner[place] === '(' ? inParentheses(inner, place, library) : bare(inner, place, library);
    place += ligand.length;
    const times = count.exec(inner.slice(place))?.[0] ?? '';
    place += times.length;
    ligands[ligand.id] = (ligands[ligand.id] ?? 0) + (times === '' ? 1 : Number(times));
  }
  if (Object.keys(ligands).length === 0) throw new Unreadable(place, 'No ligand is written');
  return { metal, ligands };
}

interface Found {
  readonly id: string;
  /** Characters it takes. */
  readonly length: number;
}

function inParentheses(text: string, from: number, library: ParameterLibrary): Found {
  let depth = 0;
  for (let place = from; place < text.length; place++) {
    if (text[place] === '(') depth += 1;
    if (text[place] === ')') depth -= 1;
    if (depth > 0) continue;
    const word = text.slice(from + 1, place);
    const spellings = ligandSpellings(library);
    const id = spellings.find(word);
    if (id !== undefined) return { id, length: place + 1 - from };
    throw new Unreadable(from + 1, `“${word}” is not a ligand of the library`, spellings.like(word));
  }
  throw new Unreadable(from, 'This parenthesis is not closed');
}

function bare(text: string, from: number, library: ParameterLibrary): Found {
  const spellings = ligandSpellings(library);
  const found = spellings.at(text, from);
  if (found !== undefined) return found;
  const word = /^[A-Za-z]+|^./.exec(text.slice(from))![0];
  throw new Unreadable(from, `“${word}” is not a ligand of the library`, spellings.like(word));
}
