import { canonicalJson } from '../canonicalJson';
import type { Measurement } from '../measurement';
import { continuesHistory } from '../revisions';
import {
  emptyContent,
  rowsOf,
  tableNames,
  tableOf,
  type AnyRow,
  type BundleContent,
  type TableName,
} from './tables';

/** A place where two copies say different things and neither is plainly the later one. */
export interface MergeConflict {
  readonly table: TableName;
  readonly id: string;
  /** Field that differs; null where one copy removed the row that the other changed. */
  readonly field: string | null;
  readonly base: unknown;
  readonly mine: unknown;
  readonly theirs: unknown;
  /** `mine` until the user chooses otherwise. */
  readonly kept: Side;
}
export type Side = 'mine' | 'theirs';

export interface MergeResult {
  readonly content: BundleContent;
  readonly conflicts: readonly MergeConflict[];
  /** Rows that came from the other copy: new ones and ones that only it had changed. */
  readonly taken: readonly {
    readonly table: TableName;
    readonly id: string;
    readonly what: 'added' | 'changed' | 'removed';
  }[];
}

/** Answers a conflict; called once per conflict. */
export type Choose = (conflict: Omit<MergeConflict, 'kept'>) => Side;

type Fields = Record<string, unknown>;
const bookkeeping = new Set(['revision', 'updatedAt', 'createdAt']);
const same = (a: unknown, b: unknown): boolean =>
  a === b || (a !== undefined && b !== undefined && canonicalJson(a) === canonicalJson(b));

interface RowMerge {
  readonly row: AnyRow | null;
  readonly conflicts: MergeConflict[];
}

function mergeFields(
  table: TableName,
  base: Fields | null,
  mine: Fields,
  theirs: Fields,
  choose: Choose,
): RowMerge {
  const merged: Fields = { ...mine };
  const conflicts: MergeConflict[] = [];
  const policy = tableOf(table).change;
  for (const field of new Set([...Object.keys(mine), ...Object.keys(theirs)])) {
    if (bookkeeping.has(field) || same(mine[field], theirs[field])) continue;
    const fixed = policy === 'never' && field !== 'deletedAt';
    if (policy === 'history' && field === 'revisions') {
      const [a, b] = [mine, theirs] as unknown as [Measurement, Measurement];
      if (continuesHistory(a, b)) merged[field] = theirs[field];
      if (continuesHistory(a, b) || continuesHistory(b, a)) continue;
    } else if (base !== null && !fixed) {
      if (same(base[field], theirs[field])) continue;
      if (same(base[field], mine[field])) {
        merged[field] = theirs[field];
        continue;
      }
    }
    const question = {
      table,
      id: mine.id as string,
      field,
      base: base?.[field] ?? null,
      mine: mine[field] ?? null,
      theirs: theirs[field] ?? null,
    };
    const kept = choose(question);
    if (kept === 'theirs') merged[field] = theirs[field];
    conflicts.push({ ...question, kept });
  }
  if (typeof mine.revision === 'number' && typeof theirs.revision === 'number') {
    const changed = [mine, theirs].every(
      (side) => !same(withoutBookkeeping(merged), withoutBookkeeping(side)),
    );
    merged.revision = Math.max(mine.revision, theirs.revision) + (changed ? 1 : 0);
    merged.updatedAt = [mine.updatedAt as string, theirs.updatedAt as string].sort().at(-1);
    merged.createdAt = [mine.createdAt as string, theirs.createdAt as string].sort()[0];
  }
  return { row: merged as unknown as AnyRow, conflicts };
}

const withoutBookkeeping = (row: Fields): Fields =>
  Object.fromEntries(Object.entries(row).filter(([field]) => !bookkeeping.has(field)));

/** One side removed the row for good (the bin was emptied). */
function mergeRemoval(
  table: TableName,
  base: AnyRow,
  mine: AnyRow | undefined,
  theirs: AnyRow | undefined,
  choose: Choose,
): RowMerge {
  const left = mine ?? theirs;
  if (left === undefined || same(left, base)) return { row: null, conflicts: [] };
  const question = { table, id: base.id, field: null, base, mine: mine ?? null, theirs: theirs ?? null };
  const kept = choose(question);
  return { row: (kept === 'mine' ? mine : theirs) ?? null, conflicts: [{ ...question, kept }] };
}

/**
 * Brings two copies of a project together, row by row and field by field. With the `base` both came from, a change on
 * one side is taken; a change of the same field on both sides is a conflict. Without a base every differing field is
 * one. Histories of measurements are joined where one continues the other; frozen predictions, curves, files and log
 * lines never change, so a difference there is a conflict whatever the base says. Rows that only one side has are
 * kept. In a conflict where one side removed a row, `mine` keeps what my copy has, which may be nothing.
 */
export function mergeBundles(
  base: BundleContent | null,
  mine: BundleContent,
  theirs: BundleContent,
  choose: Choose = ({ mine: ours }) => (ours === null ? 'theirs' : 'mine'),
): MergeResult {
  const content = emptyContent() as unknown as Record<TableName, AnyRow[]>;
  const conflicts: MergeConflict[] = [];
  const taken: MergeResult['taken'][number][] = [];
  for (const table of tableNames) {
    const index = (side: BundleContent | null) =>
      new Map(rowsOf(side ?? {}, table).map((row) => [row.id, row]));
    const [inBase, inMine, inTheirs] = [index(base), index(mine), index(theirs)];
    for (const id of new Set([...inBase.keys(), ...inMine.keys(), ...inTheirs.keys()])) {
      const [b, m, t] = [inBase.get(id), inMine.get(id), inTheirs.get(id)];
      let outcome: RowMerge;
      if (m !== undefined && t !== undefined) {
        outcome = mergeFields(
          table,
          (b ?? null) as Fields | null,
          m as unknown as Fields,
          t as unknown as Fields,
          choose,
        );
      } else if (b !== undefined) outcome = mergeRemoval(table, b, m, t, choose);
      else outcome = { row: m ?? t ?? null, conflicts: [] };
      conflicts.push(...outcome.conflicts);
      if (outcome.row !== null) content[table].push(outcome.row);
      if (m === undefined && outcome.row !== null) taken.push({ table, id, what: 'added' });
      else if (m !== undefined && outcome.row === null) taken.push({ table, id, what: 'removed' });
      else if (m !== undefined && !same(m, outcome.row)) taken.push({ table, id, what: 'changed' });
    }
  }
  return { content: content as unknown as BundleContent, conflicts, taken };
}
