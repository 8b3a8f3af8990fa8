import Papa from 'papaparse';
import type { Problem } from '../../../../core/errors';
import { readFormula } from '../../../../core/formula';
import { complexKey, type ParameterLibrary } from '../../../../core/library/parameterLibrary';
import { checkCandidate } from '../../../../core/record/candidateCheck';
import type { Composition } from '../../../../core/record/composition';
import type { Candidate } from '../../../../core/record/project';
import type { CandidateFields, NewCandidate } from '../../../store';
import { tagsOf } from '../../entry/draft';
import { asCell } from '../selection/tableText';

/** What one line of a pasted table would do. */
export type PastedLine =
  | { readonly kind: 'new'; readonly line: number; readonly candidate: NewCandidate }
  | {
      readonly kind: 'changed';
      readonly line: number;
      readonly candidate: Candidate;
      readonly fields: CandidateFields;
    }
  | { readonly kind: 'same'; readonly line: number }
  | { readonly kind: 'wrong'; readonly line: number; readonly text: string; readonly problem: Problem };

/** Columns that are understood, by the head that a copied table has. */
const heads = [
  'formula',
  'name',
  'metal',
  'oxidation state',
  'geometry',
  'isomer',
  'ligands',
  'tags',
  'notes',
] as const;
type Column = (typeof heads)[number];

const isHead = (cell: string): cell is Column => (heads as readonly string[]).includes(cell);

/** Without a head: formula, name, notes. */
const bareColumns: readonly (Column | null)[] = ['formula', 'name', 'notes'];

const withoutApostrophe = (cell: string): string => (/^'[=+\-@]/.test(cell) ? cell.slice(1) : cell);

/**
 * Reads lines copied from a spreadsheet (cells apart by tabs): a table with a head as the program copies it, or a plain
 * list of formulas, each with a name and notes if wanted. Lines that agree with a candidate of the project change
 * nothing; nothing is ever deleted.
 */
export function readPastedTable(
  text: string,
  present: readonly Candidate[],
  library: ParameterLibrary,
): PastedLine[] {
  const { data } = Papa.parse<string[]>(text.trim(), { delimiter: '\t' });
  const first = (data[0] ?? []).map((cell) => cell.trim().toLowerCase());
  const hasHead = first.some((cell) => cell === 'formula' || cell === 'metal');
  const columns = hasHead ? first.map((cell) => (isHead(cell) ? cell : null)) : bareColumns;
  const byKey = new Map<string, Candidate[]>();
  for (const each of present) {
    const key = complexKey(each.composition);
    byKey.set(key, [...(byKey.get(key) ?? []), each]);
  }
  return data.flatMap((cells, index): PastedLine[] => {
    if ((hasHead && index === 0) || cells.every((cell) => cell.trim() === '')) return [];
    const row = new Map<Column, string>();
    columns.forEach((column, place) => {
      if (column !== null && cells[place] !== undefined)
        row.set(column, withoutApostrophe(cells[place].trim()));
    });
    return [lineOf(index + 1, row, byKey, library)];
  });
}

function lineOf(
  line: number,
  row: ReadonlyMap<Column, string>,
  byKey: ReadonlyMap<string, Candidate[]>,
  library: ParameterLibrary,
): PastedLine {
  const text = row.get('formula') ?? row.get('metal') ?? '';
  const read = compositionOf(row, library);
  if ('problem' in read) return { kind: 'wrong', line, text, problem: read.problem };
  const checked = checkCandidate({ id: `line ${line}`, ...read.composition }, { library });
  if (!checked.ok) return { kind: 'wrong', line, text, problem: checked.problems[0]! };
  const fields = fieldsOf(row);
  // Two candidates with one composition are told apart by their names.
  const alike = byKey.get(complexKey(read.composition)) ?? [];
  const twin =
    alike.find(({ name }) => fields.name === undefined || asCell(name) === asCell(fields.name)) ?? alike[0];
  if (twin === undefined) {
    const { counterIon, solvate } = read;
    return {
      kind: 'new',
      line,
      candidate: { composition: read.composition, counterIon, solvate, ...fields },
    };
  }
  const changes = changesOf(twin, fields);
  return Object.keys(changes).length === 0
    ? { kind: 'same', line }
    : { kind: 'changed', line, candidate: twin, fields: changes };
}

type Read =
  | { readonly composition: Composition; readonly counterIon: string | null; readonly solvate: string | null }
  | { readonly problem: Problem };

const wrong = (field: string, message: string, remedy: string): { problem: Problem } => ({
  problem: { code: 'unknown-field-value', field, message, remedy },
});

function compositionOf(row: ReadonlyMap<Column, string>, library: ParameterLibrary): Read {
  const [metal, ligands] = [row.get('metal'), row.get('ligands')];
  const isomer = row.get('isomer') || null;
  const geometry = row.get('geometry')?.replaceAll(' ', '-');
  if (metal && ligands) {
    const counts: Record<string, number> = {};
    for (const part of ligands.split(',')) {
      const match = /^\s*(\d+)\s+(\S+)\s*$/.exec(part);
      if (!match)
        return wrong('ligands', `“${part.trim()}” is no ligand with its number.`, 'Write 3 en, 2 cl.');
      counts[match[2]!] = Number(match[1]);
    }
    const composition = {
      metal,
      oxidationState: Number(row.get('oxidation state') ?? NaN),
      geometry: (geometry ?? 'octahedral') as Composition['geometry'],
      ligands: counts,
      isomer,
    };
    return { composition, counterIon: null, solvate: null };
  }
  const reading = readFormula(row.get('formula') ?? '', library);
  if (!reading.ok) {
    const { at, message, suggestions } = reading.problem;
    const remedy =
      suggestions.length === 0 ? 'Correct the formula.' : `Perhaps ${suggestions.join(' or ')} is meant.`;
    return wrong('formula', `${message}, at character ${at + 1}.`, remedy);
  }
  const { composition, counterIon, solvate } = reading.value;
  return {
    composition: {
      ...composition,
      geometry: (geometry as Composition['geometry'] | undefined) ?? composition.geometry,
      isomer: isomer ?? composition.isomer ?? null,
    },
    counterIon,
    solvate,
  };
}

function fieldsOf(row: ReadonlyMap<Column, string>): Pick<CandidateFields, 'name' | 'tags' | 'notes'> {
  const [name, tags, notes] = [row.get('name'), row.get('tags'), row.get('notes')];
  return {
    ...(name === undefined ? {} : { name: name.slice(0, 200) }),
    ...(tags === undefined ? {} : { tags: tagsOf(tags).slice(0, 50) }),
    ...(notes === undefined ? {} : { notes: notes.slice(0, 100_000) }),
  };
}

/** Only what differs from how the candidate would be copied: line breaks of notes do not survive a cell. */
function changesOf(candidate: Candidate, fields: ReturnType<typeof fieldsOf>): CandidateFields {
  const { name, tags, notes } = fields;
  const shown = (text: string): string => withoutApostrophe(asCell(text)).trim();
  return {
    ...(name !== undefined && name !== shown(candidate.name) ? { name } : {}),
    ...(tags !== undefined && tags.join() !== candidate.tags.join() ? { tags } : {}),
    ...(notes !== undefined && notes !== shown(candidate.notes) ? { notes } : {}),
  };
}
