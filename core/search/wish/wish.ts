import { z } from 'zod';
import { geometryIds } from '../../record/composition';

/**
 * What a chemist wants, as data that can be saved, named, shared and run again. Every part is optional; a part that is
 * absent asks for nothing. Wavelengths in nm, molar absorptivities in L mol⁻¹ cm⁻¹, 10Dq in cm⁻¹, moments in Bohr
 * magnetons, concentration in mmol/L, path in cm.
 */
const wavelength = z.number().min(150).max(10_000);
const window_nm = { from_nm: wavelength, to_nm: wavelength };
const ordered = <T extends { from_nm: number; to_nm: number }>(window: T) => window.from_nm < window.to_nm;
const orderedMessage = { message: 'from_nm must be smaller than to_nm', path: ['to_nm'] };

export const bandWindowSchema = z
  .strictObject({ ...window_nm, minMolarAbsorptivity: z.number().nonnegative().optional() })
  .refine(ordered, orderedMessage);
export type BandWindow = z.infer<typeof bandWindowSchema>;

export const clearWindowSchema = z
  .strictObject({ ...window_nm, maxMolarAbsorptivity: z.number().positive() })
  .refine(ordered, orderedMessage);
export type ClearWindow = z.infer<typeof clearWindowSchema>;

const range = (lowest: number, highest: number) =>
  z
    .strictObject({ min: z.number().min(lowest).max(highest), max: z.number().min(lowest).max(highest) })
    .refine(({ min, max }) => min <= max, { message: 'min must not exceed max', path: ['max'] });

const listOrAll = <T extends z.ZodType>(item: T) => z.union([z.literal('all'), z.array(item).max(2000)]);

export const wishSchema = z.strictObject({
  name: z.string().min(1).max(200),
  /** `Fe2+` and so on. */
  ions: listOrAll(z.string().max(20)).default('all'),
  geometries: listOrAll(z.enum(geometryIds)).default(['octahedral', 'tetrahedral']),
  ligands: z
    .strictObject({
      allow: listOrAll(z.string().max(60)).default('all'),
      exclude: z.array(z.string().max(60)).max(2000).default([]),
      /** At most this many different ligands around one ion. */
      maxKinds: z.int().min(1).max(6).default(2),
      /** Only ligands whose donors are all among these elements. */
      donorAtoms: z.array(z.string().max(3)).min(1).optional(),
      /** Only ligands with these denticities. */
      denticities: z.array(z.int().min(1).max(8)).min(1).optional(),
      /** Ligands at hand: others count as new. */
      shelf: z.array(z.string().max(60)).max(2000).optional(),
      onlyShelf: z.boolean().optional(),
    })
    .prefault({}),
  /** Charge of the complex ion. */
  charge: z
    .strictObject({ min: z.int().min(-20).max(20), max: z.int().min(-20).max(20) })
    .refine(({ min, max }) => min <= max, { message: 'min must not exceed max', path: ['max'] })
    .optional(),
  bands: z.array(bandWindowSchema).max(10).optional(),
  clear: z.array(clearWindowSchema).max(10).optional(),
  colour: z
    .strictObject({
      lab: z.tuple([
        z.number().min(0).max(100),
        z.number().min(-200).max(200),
        z.number().min(-200).max(200),
      ]),
      /** CIEDE2000 */
      tolerance: z.number().positive(),
      concentration_mM: z.number().positive().max(1e5),
      path_cm: z.number().positive().max(1000),
    })
    .optional(),
  spin: z.enum(['high', 'low']).optional(),
  unpaired: range(0, 5).optional(),
  tenDq_cm1: range(0, 200_000).optional(),
  moment_BM: range(0, 20).optional(),
  /** Lowest spin-forbidden (spin-flip) level, as a wavelength window of its emission. */
  emission: z.strictObject(window_nm).refine(ordered, orderedMessage).optional(),
  exclude: z
    .strictObject({
      elements: z.array(z.string().max(3)).max(118).optional(),
      /** GHS hazard statements, e.g. `H350`. */
      hazards: z.array(z.string().max(12)).max(200).optional(),
    })
    .optional(),
});
export type Wish = z.infer<typeof wishSchema>;
export type WishInput = z.input<typeof wishSchema>;
