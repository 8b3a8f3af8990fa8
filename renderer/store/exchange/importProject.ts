import type { BundleContent } from '../../../core/record/bundle';
import type { SpinhueDatabase } from '../database';
import type { Journal } from '../journal/journal';
import { type AnyRow, contentTables, projectOf, type RecordTable, recordTables } from '../rows';
import { sameContent } from '../sameContent';
import { asStoreError, StoreError } from '../storeError';

/** What an import would do to each row of one table. */
export interface TablePlan {
  readonly table: RecordTable;
  /** Not here yet. */
  readonly added: readonly AnyRow[];
  /** Here with other content; the incoming row would replace it. */
  readonly changed: readonly { readonly here: AnyRow; readonly incoming: AnyRow }[];
  readonly same: number;
  /** Here but not in the file: an import leaves them alone. */
  readonly onlyHere: number;
}

export interface ImportPlan {
  readonly content: BundleContent;
  readonly projectId: string;
  readonly projectName: string;
  /** Whether this project is here already. */
  readonly known: boolean;
  readonly tables: readonly TablePlan[];
  /** Curves, files and lines of the log that are not here yet. */
  readonly others: { readonly curves: number; readonly files: number; readonly log: number };
}

const addedOnly = ['curves', 'files', 'log'] as const;

/**
 * Compares a bundle with the database without changing anything.
 *
 * @throws {StoreError} where the bundle holds no project, or several
 */
export async function planImport(db: SpinhueDatabase, content: BundleContent): Promise<ImportPlan> {
  const [project, ...others] = content.projects;
  if (!project || others.length > 0) {
    throw new StoreError(
      'not-found',
      `The file holds ${content.projects.length} projects; one is expected.`,
      'Choose a file that was written by exporting a project.',
    );
  }
  try {
    const known = (await db.projects.get(project.id)) !== undefined;
    const tables: TablePlan[] = [];
    for (const table of recordTables) tables.push(await planTable(db, table, content, project.id));
    const missing = async (table: (typeof addedOnly)[number]): Promise<number> => {
      const here = await db.table(table).bulkGet(content[table].map(({ id }) => id));
      return here.filter((row) => row === undefined).length;
    };
    const others = {
      curves: await missing('curves'),
      files: await missing('files'),
      log: await missing('log'),
    };
    return { content, projectId: project.id, projectName: project.name, known, tables, others };
  } catch (error) {
    throw asStoreError(error);
  }
}

async function planTable(
  db: SpinhueDatabase,
  table: RecordTable,
  content: BundleContent,
  projectId: string,
): Promise<TablePlan> {
  const incoming: readonly AnyRow[] = content[table];
  const here = await db.table<AnyRow, string>(table).bulkGet(incoming.map(({ id }) => id));
  const added: AnyRow[] = [];
  const changed: { here: AnyRow; incoming: AnyRow }[] = [];
  let same = 0;
  incoming.forEach((row, index) => {
    const present = here[index];
    if (present && projectOf(present) !== projectOf(row)) throw belongsElsewhere(row.id);
    if (!present) added.push(row);
    else if (sameContent(present, row)) same += 1;
    else changed.push({ here: present, incoming: row });
  });
  const count = table === 'projects' ? 1 : await db.table(table).where('projectId').equals(projectId).count();
  const matched = here.filter((row) => row !== undefined).length;
  return { table, added, changed, same, onlyHere: table === 'projects' ? 0 : Math.max(0, count - matched) };
}

const belongsElsewhere = (id: string): StoreError =>
  new StoreError(
    'not-found',
    `The file holds a record (${id}) that belongs to another project here.`,
    'Nothing was changed. Import a file that was exported from this project.',
  );

/** Carries the plan out as one step that can be undone: new rows are added, changed ones replaced. */
export async function bringIn(journal: Journal, plan: ImportPlan): Promise<string> {
  const label = plan.known
    ? `import into project "${plan.projectName}"`
    : `import project "${plan.projectName}"`;
  await journal.record(plan.projectId, label, async (writer) => {
    for (const { table, added, changed } of plan.tables) {
      await writer.putAsGiven(table, [...added, ...changed.map(({ incoming }) => incoming)] as never);
    }
    for (const table of addedOnly) await writer.addMissing(table, plan.content[table] as never);
  });
  return plan.projectId;
}

/** Adds the bundle as a project of its own beside the one that is here: every id is new. */
export async function bringInAsCopy(
  journal: Journal,
  plan: ImportPlan,
  newId: () => string,
): Promise<string> {
  const ids = new Map<string, string>();
  for (const table of recordTables) for (const row of plan.content[table]) ids.set(row.id, newId());
  const renamed = (row: AnyRow): AnyRow =>
    Object.fromEntries(
      Object.entries(row).map(([field, value]) =>
        (field === 'id' || field.endsWith('Id')) && typeof value === 'string'
          ? [field, ids.get(value) ?? value]
          : [field, value],
      ),
    ) as unknown as AnyRow;
  const projectId = ids.get(plan.projectId)!;
  const name = `${plan.projectName} (copy)`.slice(0, 200);
  await journal.record(projectId, `import project "${name}"`, async (writer) => {
    for (const table of recordTables) {
      const rows = plan.content[table].map(renamed);
      await writer.putAsGiven(
        table,
        (table === 'projects' ? rows.map((row) => ({ ...row, name, deletedAt: null })) : rows) as never,
      );
    }
    for (const table of contentTables) await writer.addMissing(table, plan.content[table] as never);
    await writer.addMissing(
      'log',
      plan.content.log.map((row) => ({ ...renamed(row as never), id: newId() })) as never,
    );
  });
  return projectId;
}
