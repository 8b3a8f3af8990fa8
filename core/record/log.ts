import { z } from 'zod';

/** One line of the project's log. Lines are only ever added. */
export const logEntrySchema = z.strictObject({
  id: z.string().min(1).max(100),
  projectId: z.string(),
  at: z.iso.datetime(),
  /** Initials or name as the person set it; empty where none is set. */
  by: z.string().max(100),
  action: z.enum(['created', 'changed', 'deleted', 'restored', 'frozen', 'imported', 'merged', 'adopted']),
  table: z.string().max(50),
  rowId: z.string().max(100),
  /** A sentence for a person. */
  what: z.string().max(2000),
  changes: z
    .array(z.strictObject({ field: z.string().max(300), before: z.json(), after: z.json() }))
    .max(200),
});
export type LogEntry = z.infer<typeof logEntrySchema>;
