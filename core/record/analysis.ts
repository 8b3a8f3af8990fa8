import { z } from 'zod';
import { rowSchema } from './project';
import { treatmentStepSchema } from './treatment';
import { uncertainSchema } from './uncertain';

const fittedBandSchema = z.strictObject({
  centre_cm1: z.number(),
  fwhm_cm1: z.number(),
  height: z.number(),
  se: z.strictObject({
    centre_cm1: z.number().nullable(),
    fwhm_cm1: z.number().nullable(),
    height: z.number().nullable(),
  }),
});

/** A band fit as it was asked for and as it came out, enough to run it again and to compare. */
export const bandFitRecordSchema = z.strictObject({
  range_cm1: z.tuple([z.number(), z.number()]).nullable(),
  start: z
    .array(z.strictObject({ centre_cm1: z.number(), fwhm_cm1: z.number(), height: z.number() }))
    .max(20),
  baseline: z.enum(['none', 'linear']),
  bands: z.array(fittedBandSchema).max(20),
  baselineAt: z.tuple([z.number(), z.number()]).nullable(),
  status: z.string().max(100),
  rss: z.number(),
  points: z.int().nonnegative(),
});
export type BandFitRecord = z.infer<typeof bandFitRecordSchema>;

/** One measured band beside the predicted transition it is taken for. */
export const assignedBandSchema = z.strictObject({
  energy_cm1: uncertainSchema,
  /** Label of the upper level, e.g. `4T2g`; null where the band is left unassigned on purpose. */
  label: z.string().max(200).nullable(),
  multiplicity: z.int().positive().nullable(),
  predicted_cm1: z.number().nullable(),
  by: z.enum(['matching', 'person']),
});
export type AssignedBand = z.infer<typeof assignedBandSchema>;

const fitted = z.strictObject({
  value: z.number().nullable(),
  se: z.number().nullable(),
  /** `fitted`, or the reason why the value was held or cannot be said. */
  status: z.string().max(300),
});

export const fieldFitRecordSchema = z.strictObject({
  dElectrons: z.int(),
  geometry: z.string().max(50),
  tenDq: fitted,
  B: fitted,
  C: fitted,
  rms_cm1: z.number().nullable(),
  notDetermined: z.array(z.string().max(1000)).max(20),
  warnings: z.array(z.string().max(1000)).max(20),
});
export type FieldFitRecord = z.infer<typeof fieldFitRecordSchema>;

/** What was made of one spectrum or band list. It may be redone at will: the measurement itself is not touched. */
export const analysisSchema = z.strictObject({
  ...rowSchema.shape,
  projectId: z.string(),
  measurementId: z.string(),
  treatment: z.array(treatmentStepSchema).max(100),
  bandFit: bandFitRecordSchema.nullable(),
  assignment: z.array(assignedBandSchema).max(100),
  fieldFit: fieldFitRecordSchema.nullable(),
  notes: z.string().max(100_000),
});
export type Analysis = z.infer<typeof analysisSchema>;
