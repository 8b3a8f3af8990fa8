import type { z } from 'zod';
import { candidateSchema, frozenPredictionSchema, parameterSetSchema, projectSchema } from '../project';

/**
 * What a bundle holds: one list of rows per table. `parent` names the fields that point to another table, so that a
 * broken link is found on reading; null links are allowed where the schema allows them.
 */
export const bundleTables = {
  projects: { schema: projectSchema, links: { parameterSetId: 'parameterSets' } },
  candidates: { schema: candidateSchema, links: { projectId: 'projects' } },
  parameterSets: {
    schema: parameterSetSchema,
    links: { projectId: 'projects', parentId: 'parameterSets' },
  },
  frozenPredictions: {
    schema: frozenPredictionSchema,
    links: { projectId: 'projects', candidateId: 'candidates' },
  },
} as const;

export type TableName = keyof typeof bundleTables;
export type TableRow<T extends TableName> = z.infer<(typeof bundleTables)[T]['schema']>;
export const tableNames = Object.keys(bundleTables).sort() as TableName[];

/** Any row, as far as all tables agree. */
export interface AnyRow {
  readonly id: string;
}

export type BundleContent = { readonly [T in TableName]: readonly TableRow<T>[] };

/** Rows of a table as far as all tables agree; the element type is lost, the identity of the rows is not. */
export const rowsOf = (content: Partial<BundleContent>, table: TableName): readonly AnyRow[] =>
  content[table] ?? [];

export function emptyContent(): BundleContent {
  return Object.fromEntries(tableNames.map((name) => [name, []])) as unknown as BundleContent;
}
