import { z } from 'zod';
import { rowSchema } from './project';
import { fileNameSchema, positiveUncertainSchema, sha256Schema, uncertainSchema } from './uncertain';

const short = z.string().max(200).nullable();

/** Under what conditions something was measured; null where nobody wrote it down. */
export const conditionsSchema = z.strictObject({
  date: z.iso.date().nullable(),
  operator: short,
  instrument: short,
  /** `water`, `MeCN/CH2Cl2 9:1`, or `none (solid)`. */
  solvent: short,
  temperature_K: positiveUncertainSchema.nullable(),
  concentration_mM: positiveUncertainSchema.nullable(),
  path_cm: positiveUncertainSchema.nullable(),
  blank: short,
  bandwidth_nm: z.number().positive().nullable(),
});
export type Conditions = z.infer<typeof conditionsSchema>;
export const noConditions: Conditions = {
  date: null,
  operator: null,
  instrument: null,
  solvent: null,
  temperature_K: null,
  concentration_mM: null,
  path_cm: null,
  blank: null,
  bandwidth_nm: null,
};

/** What a band position is: a maximum and a shoulder are readings, a centre comes out of a fit. */
export const bandFeatures = ['maximum', 'shoulder', 'fitted centre'] as const;

export const listedBandSchema = z.strictObject({
  energy_cm1: uncertainSchema.extend({ value: z.number().positive().max(1e6) }),
  feature: z.enum(bandFeatures),
  molarAbsorptivity: uncertainSchema.nullable(),
  width_cm1: z.number().positive().nullable(),
  note: z.string().max(1000),
});
export type ListedBand = z.infer<typeof listedBandSchema>;

const common = {
  conditions: conditionsSchema,
  remark: z.string().max(100_000),
  attachments: z.array(z.strictObject({ name: fileNameSchema, fileId: sha256Schema })).max(100),
};

const diamagnetism = z.strictObject({
  /** Molar diamagnetic susceptibility as it stands in tables, negative, cm3/mol. */
  chi_cm3_mol: z.number(),
  basis: z.enum(['pascal sum', 'half molar mass', 'typed', 'none']),
});

export const measurementContentSchema = z.discriminatedUnion('kind', [
  z.strictObject({
    kind: z.literal('spectrum'),
    ...common,
    curveId: sha256Schema,
    /** The raw file and which spectrum of it; null where the numbers were pasted. */
    source: z
      .strictObject({ fileId: sha256Schema, fileName: fileNameSchema, index: z.int().nonnegative() })
      .nullable(),
    name: z.string().max(200).nullable(),
  }),
  z.strictObject({
    kind: z.literal('band list'),
    ...common,
    reportedIn: z.enum(['cm-1', 'nm']),
    bands: z.array(listedBandSchema).min(1).max(100),
  }),
  z.strictObject({
    kind: z.literal('moment'),
    ...common,
    method: z.enum(['Evans', 'balance', 'magnetometer', 'typed']),
    /** What was read off, for recomputing; names and units of `core/measured/magnetism`. */
    readings: z.record(z.string(), z.number()),
    diamagnetism,
    moment_BM: uncertainSchema,
  }),
  z.strictObject({
    kind: z.literal('moment series'),
    ...common,
    diamagnetism,
    /** chi T per formula unit with one metal centre, corrected for diamagnetism, cm3 K/mol. */
    points: z
      .array(z.strictObject({ temperature_K: z.number().positive(), chiT: uncertainSchema }))
      .min(1)
      .max(10_000),
  }),
  z.strictObject({
    kind: z.literal('emission'),
    ...common,
    maxima: z.array(listedBandSchema).min(1).max(50),
    excitation_nm: z.number().positive().nullable(),
    lifetime_us: positiveUncertainSchema.nullable(),
  }),
  z.strictObject({
    kind: z.literal('observed colour'),
    ...common,
    words: z.string().min(1).max(300),
    lightSource: short,
    lab: z.tuple([z.number(), z.number(), z.number()]).nullable(),
  }),
  z.strictObject({ kind: z.literal('note'), ...common }),
]);
export type MeasurementContent = z.infer<typeof measurementContentSchema>;
export type MeasurementKind = MeasurementContent['kind'];

export const revisionSchema = z.strictObject({
  /** 0 for the first entry. */
  number: z.int().nonnegative(),
  at: z.iso.datetime(),
  by: z.string().max(100),
  /** Why the entry was corrected; empty only for the first. */
  why: z.string().max(2000),
  content: measurementContentSchema,
});
export type Revision = z.infer<typeof revisionSchema>;

/** A measurement with every state it ever had; the last revision is the one that counts. */
export const measurementSchema = z
  .strictObject({
    ...rowSchema.shape,
    projectId: z.string(),
    candidateId: z.string(),
    sampleId: z.string().nullable(),
    /** The prediction that stood when this was saved; null where the candidate had none that could be frozen. */
    frozenPredictionId: z.string().nullable(),
    revisions: z.array(revisionSchema).min(1).max(1000),
  })
  .superRefine((measurement, context) => {
    for (const [i, revision] of measurement.revisions.entries()) {
      if (revision.number !== i) {
        context.addIssue({
          code: 'custom',
          path: ['revisions', i, 'number'],
          message: `expected ${i}: revisions are numbered without gaps`,
        });
      }
      if (i > 0 && revision.why.trim() === '') {
        context.addIssue({
          code: 'custom',
          path: ['revisions', i, 'why'],
          message: 'a correction needs its reason',
        });
      }
      if (revision.content.kind !== measurement.revisions[0]!.content.kind) {
        context.addIssue({
          code: 'custom',
          path: ['revisions', i, 'content', 'kind'],
          message: 'a correction cannot change what kind of measurement it is',
        });
      }
    }
  });
export type Measurement = z.infer<typeof measurementSchema>;
