import { z } from 'zod';
import { rowSchema } from './project';

/** What a search looks for, kept under a name. What is wished is checked by the search itself. */
export const savedWishSchema = z.strictObject({
  ...rowSchema.shape,
  projectId: z.string(),
  name: z.string().min(1).max(200),
  wish: z.looseObject({}),
});
export type SavedWish = z.infer<typeof savedWishSchema>;
