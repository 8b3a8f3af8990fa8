import type { TableName, TableRow } from '../../core/record/bundle';
import type { Row } from '../../core/record/project';

/** Tables whose rows have a revision and can be edited, deleted and undone. */
export const recordTables = [
  'projects',
  'candidates',
  'parameterSets',
  'frozenPredictions',
  'samples',
  'measurements',
  'analyses',
  'wishes',
] as const satisfies TableName[];
export type RecordTable = (typeof recordTables)[number];
export type RowOf = { readonly [T in RecordTable]: TableRow<T> };
export type AnyRow = RowOf[RecordTable];

/** Rows known by the hash of their content: stored once, never changed, left alone by undo. */
export const contentTables = ['curves', 'files'] as const satisfies TableName[];
export type ContentTable = (typeof contentTables)[number];

/** Rows that outlive the undoing of their creation: they go to the bin instead of vanishing. */
export const appendOnlyTables: ReadonlySet<RecordTable> = new Set<RecordTable>([
  'frozenPredictions',
  'samples',
  'measurements',
]);

/** Which field names the row that a row belongs to and goes with. Each needs an index. */
export const ownership: readonly { table: RecordTable; field: string; owner: RecordTable }[] = [
  ...recordTables
    .filter((table) => table !== 'projects')
    .map((table) => ({ table, field: 'projectId', owner: 'projects' as const })),
  { table: 'frozenPredictions', field: 'candidateId', owner: 'candidates' },
  { table: 'samples', field: 'candidateId', owner: 'candidates' },
  { table: 'measurements', field: 'candidateId', owner: 'candidates' },
  { table: 'analyses', field: 'measurementId', owner: 'measurements' },
];

/** What a caller supplies; the writer adds id, revision and times. */
export type NewRow<T extends RecordTable> = Omit<RowOf[T], keyof Row> & { id?: string };

/** The project a row belongs to: edits are undone project by project. */
export const projectOf = (row: AnyRow): string => ('projectId' in row ? row.projectId : row.id);

/** One row before and after a change; null where it did not exist. */
export interface Edit<T extends RecordTable = RecordTable> {
  readonly table: T;
  readonly id: string;
  readonly before: RowOf[T] | null;
  readonly after: RowOf[T] | null;
}

/** Head of a change in the journal; its edits lie in a table of their own, since they can be large. */
export interface Change {
  readonly order: number;
  /** Project it belongs to. */
  readonly scope: string;
  /** ISO 8601, UTC. */
  readonly at: string;
  /** What was done, as the undo button says it: `delete 3 candidates`. */
  readonly label: string;
  /** 1 once undone. A number because IndexedDB does not index booleans. */
  readonly undone: 0 | 1;
  /** Grows with each change, undo and redo: tells which came last. */
  readonly turn: number;
}

export interface ChangeEdits {
  readonly order: number;
  readonly edits: readonly Edit[];
}
