import { z } from 'zod';
import { xUnits, yUnits } from './curve';
import { positiveUncertainSchema, sha256Schema } from './uncertain';

/** Stretches of the x axis in the curve's own unit, each lower end first. */
const rangesSchema = z
  .array(z.tuple([z.number(), z.number()]).refine(([low, high]) => low < high, 'lower end first'))
  .min(1)
  .max(50);

const smoothing = {
  /** Points per window, odd. */
  window: z
    .int()
    .min(3)
    .max(501)
    .refine((n) => n % 2 === 1, 'an odd number of points'),
  /** Degree of the local polynomial, less than the window. */
  degree: z.int().min(1).max(6),
};

/**
 * One step from the raw curve towards the treated one, as data: the raw curve and the list of steps give the same
 * result at any time.
 */
export const treatmentStepSchema = z.discriminatedUnion('op', [
  z.strictObject({ op: z.literal('state units'), xUnit: z.enum(xUnits), yUnit: z.enum(yUnits) }),
  z.strictObject({ op: z.literal('to absorbance') }),
  z.strictObject({ op: z.literal('to percent transmittance') }),
  z.strictObject({ op: z.literal('merge equal x'), keep: z.enum(['mean', 'first', 'last']) }),
  z.strictObject({
    op: z.literal('leave out'),
    ranges: rangesSchema,
    why: z.string().max(300),
  }),
  z.strictObject({ op: z.literal('leave out above'), absorbance: z.number().positive() }),
  z.strictObject({ op: z.literal('subtract blank'), curveId: sha256Schema }),
  z.strictObject({
    op: z.literal('subtract baseline'),
    form: z.enum(['constant', 'linear', 'quadratic']),
    ranges: rangesSchema,
  }),
  z.strictObject({
    op: z.literal('subtract scatter'),
    /** Exponent n of a lambda^-n; null lets the fit find it between 0 and 6. */
    exponent: z.number().min(0).max(6).nullable(),
    ranges: rangesSchema,
  }),
  z.strictObject({
    op: z.literal('to molar absorptivity'),
    concentration_mM: positiveUncertainSchema,
    path_cm: positiveUncertainSchema,
    /** Standard uncertainty of the absorbance itself, where one is known. */
    absorbance_u: z.number().nonnegative().nullable(),
  }),
  z.strictObject({ op: z.literal('smooth'), ...smoothing }),
  z.strictObject({ op: z.literal('derivative'), order: z.literal([1, 2]), ...smoothing }),
]);
export type TreatmentStep = z.infer<typeof treatmentStepSchema>;
