import { z } from 'zod';
import { compositionSchema } from './composition';

/**
 * What a project keeps, as stored and as exported. Every row has a stable id, a revision that grows by one with each
 * change, and the time of the change in ISO 8601 UTC. Deleting sets `deletedAt`; the bin is emptied by hand or after
 * thirty days.
 */
const row = {
  id: z.string().min(1).max(100),
  revision: z.int().nonnegative(),
  createdAt: z.iso.datetime(),
  updatedAt: z.iso.datetime(),
  deletedAt: z.iso.datetime().nullable(),
};
export const rowSchema = z.strictObject(row);
export type Row = z.infer<typeof rowSchema>;

export const projectSchema = z.strictObject({
  ...row,
  name: z.string().min(1).max(200),
  notes: z.string().max(100_000),
  demo: z.boolean(),
  /** Colour that the candidate table measures its distance to; null where none is set. */
  targetLab: z.tuple([z.number(), z.number(), z.number()]).nullable(),
  parameterSetId: z.string().nullable(),
});
export type Project = z.infer<typeof projectSchema>;

export const candidateSchema = z.strictObject({
  ...row,
  projectId: z.string(),
  name: z.string().max(200),
  composition: compositionSchema,
  counterIon: z.string().max(100).nullable(),
  solvate: z.string().max(100).nullable(),
  concentration_mM: z.number().positive().nullable(),
  path_cm: z.number().positive().nullable(),
  tags: z.array(z.string().max(50)).max(50),
  starred: z.boolean(),
  archived: z.boolean(),
  notes: z.string().max(100_000),
});
export type Candidate = z.infer<typeof candidateSchema>;

/** Values that replace or add to the library's own, e.g. `ligand.nh3.f`; read-only once a prediction used it. */
export const parameterSetSchema = z.strictObject({
  ...row,
  projectId: z.string(),
  name: z.string().min(1).max(200),
  author: z.string().max(100),
  reason: z.string().max(10_000),
  parentId: z.string().nullable(),
  /** SHA-256 of the canonical JSON of `values` and the library version it is laid over. */
  hash: z.string(),
  values: z.record(
    z.string(),
    z.strictObject({ value: z.number(), sigma: z.number().nonnegative(), source: z.string() }),
  ),
  /** Complexes whose measurements went into the values: their agreement is in-sample. One key per complex. */
  informedBy: z.array(z.string().max(300)).max(100_000).optional(),
});
export type ParameterSet = z.infer<typeof parameterSetSchema>;

/** A prediction as it stood when it was frozen. `prediction` is the whole answer, kept as JSON. */
export const frozenPredictionSchema = z.strictObject({
  ...row,
  projectId: z.string(),
  candidateId: z.string(),
  frozenAt: z.iso.datetime(),
  reason: z.string().max(1000),
  parameterHash: z.string(),
  modelVersion: z.string(),
  prediction: z.looseObject({}),
});
export type FrozenPrediction = z.infer<typeof frozenPredictionSchema>;
