import {
  type BundleContent,
  emptyContent,
  type TableName,
  tableNames,
  writeBundle,
} from '../../../core/record/bundle';
import { tableOf } from '../../../core/record/bundle/tables';
import type { SpinhueDatabase } from '../database';
import { contentTables, recordTables } from '../rows';
import { asStoreError, StoreError } from '../storeError';

/** All rows of one project, those in the bin too, with the curves and files that they name. */
export async function projectContent(db: SpinhueDatabase, projectId: string): Promise<BundleContent> {
  const content = emptyContent() as unknown as Record<TableName, { readonly id: string }[]>;
  try {
    await db.transaction(
      'r',
      tableNames.map((table) => db.table(table)),
      async () => {
        const project = await db.projects.get(projectId);
        if (!project)
          throw new StoreError('not-found', 'This project no longer exists.', 'Look into the bin.');
        content.projects = [project];
        for (const table of [...recordTables, 'log'] as const) {
          if (table === 'projects') continue;
          content[table] = await db.table(table).where('projectId').equals(projectId).toArray();
        }
        for (const table of contentTables) {
          const named = recordTables.flatMap((from) =>
            content[from].flatMap((row) => tableOf(from).links(row)),
          );
          const ids = new Set(
            named.flatMap((link) => (link.table === table && link.id !== null ? [link.id] : [])),
          );
          const found = await db.table(table).bulkGet([...ids]);
          content[table] = found.filter((row) => row !== undefined);
        }
      },
    );
  } catch (error) {
    throw asStoreError(error);
  }
  return content as unknown as BundleContent;
}

/** The text of a project bundle. */
export async function exportProject(db: SpinhueDatabase, projectId: string): Promise<string> {
  return writeBundle(await projectContent(db, projectId));
}

/** A name for the file that any system accepts. */
export function fileNameFor(projectName: string, date: string): string {
  const plain = projectName
    .normalize('NFKD')
    .replace(/[^\p{L}\p{N}]+/gu, '-')
    .replace(/^-+|-+$/g, '')
    .slice(0, 60);
  return `${plain || 'project'}-${date.slice(0, 10)}.spinhue.json`;
}
