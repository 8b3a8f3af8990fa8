import type { z } from 'zod';
import { SpinhueError } from '../../core/errors';
import { problemsFromZod } from '../../core/record/zodProblems';

/** Checks parsed JSON against a schema. Throws a SpinhueError that names the first misfit and how many there are. */
export function parseInput<T extends z.ZodType>(schema: T, value: unknown, name: string): z.output<T> {
  const checked = schema.safeParse(value, { reportInput: true });
  if (checked.success) return checked.data;
  const problems = problemsFromZod(checked.error, '');
  const first = problems[0]!;
  const more = problems.length > 1 ? ` (and ${problems.length - 1} more)` : '';
  throw new SpinhueError({ ...first, message: `${name}: ${first.message.replace(/^: /, '')}${more}` });
}
