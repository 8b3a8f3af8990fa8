import type { LogEntry } from '../../../core/record/log';
import { type AnyRow, type Edit, projectOf, type RecordTable } from '../rows';

/** Tables whose every change leaves a line in the project's log, undo and redo too. */
const nounOf: Partial<Record<RecordTable, string>> = {
  samples: 'sample',
  measurements: 'measurement',
  analyses: 'analysis',
  frozenPredictions: 'frozen prediction',
  parameterSets: 'parameter set',
};

function actionOf({ table, before, after }: Edit): LogEntry['action'] {
  if (after === null) return 'deleted';
  if (before === null) return table === 'frozenPredictions' ? 'frozen' : 'created';
  if (before.deletedAt === null && after.deletedAt !== null) return 'deleted';
  if (before.deletedAt !== null && after.deletedAt === null) return 'restored';
  return 'changed';
}

const bookkeeping = new Set(['revision', 'updatedAt', 'createdAt']);

/** Fields that differ, as they were and as they are. Long histories are named, not repeated. */
function differences(before: AnyRow, after: AnyRow): LogEntry['changes'] {
  const [was, is] = [before, after] as unknown as Record<string, unknown>[];
  return Object.keys({ ...was, ...is })
    .filter((field) => !bookkeeping.has(field) && JSON.stringify(was![field]) !== JSON.stringify(is![field]))
    .map((field) =>
      field === 'revisions'
        ? { field, before: lengthOf(was![field]), after: lengthOf(is![field]) }
        : { field, before: asJson(was![field]), after: asJson(is![field]) },
    );
}

const lengthOf = (value: unknown): number => (Array.isArray(value) ? value.length : 0);
const asJson = (value: unknown) =>
  JSON.parse(JSON.stringify(value ?? null)) as LogEntry['changes'][number]['before'];

/** Lines for the edits of one step, to be stored in the same transaction. */
export function logLines(edits: readonly Edit[], at: string, by: string, newId: () => string): LogEntry[] {
  return edits.flatMap((edit) => {
    const noun = nounOf[edit.table];
    const row = edit.after ?? edit.before;
    if (noun === undefined || row === null) return [];
    const action = actionOf(edit);
    return {
      id: newId(),
      projectId: projectOf(row),
      at,
      by,
      action,
      table: edit.table,
      rowId: edit.id,
      what: `${noun} ${action}`,
      changes: edit.before && edit.after ? differences(edit.before, edit.after) : [],
    };
  });
}
