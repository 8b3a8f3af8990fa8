import { z } from 'zod';

/** A measured value with its standard uncertainty (GUM: one standard deviation); `u` is null where nobody stated one. */
export const uncertainSchema = z.strictObject({
  value: z.number(),
  u: z.number().nonnegative().nullable(),
});
export type Uncertain = z.infer<typeof uncertainSchema>;

export const positiveUncertainSchema = uncertainSchema.extend({ value: z.number().positive() });

/** SHA-256 as 64 lower-case hexadecimal digits. */
export const sha256Schema = z.string().regex(/^[0-9a-f]{64}$/, 'expected 64 hexadecimal digits');

/** Name of a file without any folder: it labels content that is found by its hash and never leads to a place on disk. */
export const fileNameSchema = z
  .string()
  .min(1)
  .max(255)
  .refine(
    (name) => !/[/\\\u0000-\u001f\u007f]/.test(name) && name !== '.' && name !== '..',
    'a file name may not hold folders or control characters',
  );
