import type { z } from 'zod';
import { analysisSchema, type Analysis } from '../analysis';
import { curveSchema, isIntactCurve, type Curve } from '../curve';
import { bytesOfFile, storedFileSchema, type StoredFile } from '../file';
import { logEntrySchema, type LogEntry } from '../log';
import { measurementSchema, type Measurement } from '../measurement';
import {
  candidateSchema,
  frozenPredictionSchema,
  parameterSetSchema,
  projectSchema,
  type Candidate,
  type FrozenPrediction,
  type ParameterSet,
  type Project,
} from '../project';
import { sampleSchema, type Sample } from '../sample';
import { savedWishSchema, type SavedWish } from '../wish';

interface RowTypes {
  projects: Project;
  candidates: Candidate;
  parameterSets: ParameterSet;
  frozenPredictions: FrozenPrediction;
  samples: Sample;
  measurements: Measurement;
  curves: Curve;
  analyses: Analysis;
  files: StoredFile;
  wishes: SavedWish;
  log: LogEntry;
}
export type TableName = keyof RowTypes;
export type TableRow<T extends TableName> = RowTypes[T];
export type BundleContent = { readonly [T in TableName]: readonly RowTypes[T][] };

/** A pointer from one row to another, found by the field it stands in. */
export interface Link {
  readonly field: string;
  readonly table: TableName;
  /** Null points nowhere on purpose. */
  readonly id: string | null;
}

interface Table<T extends TableName> {
  readonly schema: z.ZodType<RowTypes[T]>;
  readonly links: (row: RowTypes[T]) => Link[];
  /** What is wrong with a row that its schema cannot see. */
  readonly check?: (row: RowTypes[T]) => string | null;
  /** How two copies of a row are brought together: see `merge.ts`. */
  readonly change: 'free' | 'history' | 'never';
}

const project = (row: { projectId: string }): Link => ({
  field: 'projectId',
  table: 'projects',
  id: row.projectId,
});
const candidate = (row: { candidateId: string }): Link => ({
  field: 'candidateId',
  table: 'candidates',
  id: row.candidateId,
});

function measurementLinks(row: Measurement): Link[] {
  const links: Link[] = [
    project(row),
    candidate(row),
    { field: 'sampleId', table: 'samples', id: row.sampleId },
    { field: 'frozenPredictionId', table: 'frozenPredictions', id: row.frozenPredictionId },
  ];
  for (const [i, { content }] of row.revisions.entries()) {
    const place = `revisions[${i}].content`;
    if (content.kind === 'spectrum') {
      links.push({ field: `${place}.curveId`, table: 'curves', id: content.curveId });
      if (content.source !== null)
        links.push({ field: `${place}.source.fileId`, table: 'files', id: content.source.fileId });
    }
    for (const [k, attachment] of content.attachments.entries()) {
      links.push({ field: `${place}.attachments[${k}].fileId`, table: 'files', id: attachment.fileId });
    }
  }
  return links;
}

/** Everything a bundle holds: one list of rows per table. */
export const bundleTables: { readonly [T in TableName]: Table<T> } = {
  projects: {
    schema: projectSchema,
    links: (row) => [{ field: 'parameterSetId', table: 'parameterSets', id: row.parameterSetId }],
    change: 'free',
  },
  candidates: { schema: candidateSchema, links: (row) => [project(row)], change: 'free' },
  parameterSets: {
    schema: parameterSetSchema,
    links: (row) => [project(row), { field: 'parentId', table: 'parameterSets', id: row.parentId }],
    change: 'free',
  },
  frozenPredictions: {
    schema: frozenPredictionSchema,
    links: (row) => [project(row), candidate(row)],
    change: 'never',
  },
  samples: { schema: sampleSchema, links: (row) => [project(row), candidate(row)], change: 'free' },
  measurements: { schema: measurementSchema, links: measurementLinks, change: 'history' },
  curves: {
    schema: curveSchema,
    links: () => [],
    check: (row) => (isIntactCurve(row) ? null : 'the numbers do not fit the hash they are known by'),
    change: 'never',
  },
  analyses: {
    schema: analysisSchema,
    links: (row) => [
      project(row),
      { field: 'measurementId', table: 'measurements', id: row.measurementId },
      ...row.treatment.flatMap((step, i): Link[] =>
        step.op === 'subtract blank'
          ? [{ field: `treatment[${i}].curveId`, table: 'curves', id: step.curveId }]
          : [],
      ),
    ],
    change: 'free',
  },
  files: {
    schema: storedFileSchema,
    links: () => [],
    check: (row) =>
      bytesOfFile(row) === 'damaged' ? 'the bytes do not fit the hash and size they are known by' : null,
    change: 'never',
  },
  wishes: { schema: savedWishSchema, links: (row) => [project(row)], change: 'free' },
  log: { schema: logEntrySchema, links: (row) => [project(row)], change: 'never' },
};

export const tableNames = Object.keys(bundleTables).sort() as TableName[];

/** Any row, as far as all tables agree. */
export interface AnyRow {
  readonly id: string;
}

/** A table's definition with the type of its rows widened, for code that walks over all tables. */
export const tableOf = (name: TableName) =>
  bundleTables[name] as unknown as {
    readonly schema: z.ZodType<AnyRow>;
    readonly links: (row: AnyRow) => Link[];
    readonly check?: (row: AnyRow) => string | null;
    readonly change: 'free' | 'history' | 'never';
  };

/** Rows of a table as far as all tables agree; the element type is lost, the identity of the rows is not. */
export const rowsOf = (content: Partial<BundleContent>, table: TableName): readonly AnyRow[] =>
  content[table] ?? [];

export function emptyContent(): BundleContent {
  return Object.fromEntries(tableNames.map((name) => [name, []])) as unknown as BundleContent;
}
