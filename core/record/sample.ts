import { z } from 'zod';
import { rowSchema } from './project';

export const phases = [
  'solution',
  'powder',
  'crystal',
  'glass',
  'film',
  'pellet',
  'frozen solution',
] as const;

/**
 * One batch of a substance as it was made. What nobody wrote down is null: it is shown as missing, never demanded.
 * Counter-ions and solvate molecules belong to the formula, because they are in the weighed mass.
 */
export const sampleSchema = z.strictObject({
  ...rowSchema.shape,
  projectId: z.string(),
  candidateId: z.string(),
  batch: z.string().min(1).max(100),
  /** With counter-ion and solvate, e.g. `[Ni(en)3]Cl2.2H2O`. */
  formula: z.string().max(300).nullable(),
  counterIon: z.string().max(100).nullable(),
  solvate: z.string().max(100).nullable(),
  molarMass_g_mol: z.number().positive().nullable(),
  /** Whether the molar mass was computed from the formula or typed. */
  molarMassBasis: z.enum(['computed', 'typed']).nullable(),
  /** Mass fraction of the compound, percent, and how it was found. */
  purity_percent: z.number().min(0).max(100).nullable(),
  purityBasis: z.string().max(300).nullable(),
  phase: z.enum(phases).nullable(),
  mass_mg: z.number().positive().nullable(),
  madeOn: z.iso.date().nullable(),
  operator: z.string().max(50).nullable(),
  notes: z.string().max(100_000),
});
export type Sample = z.infer<typeof sampleSchema>;
