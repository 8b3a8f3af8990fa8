import type { z } from 'zod';
import type { ErrorCode, Problem } from '../errors';

/** `candidates[3].composition.metal` */
export function pathText(prefix: string, path: readonly PropertyKey[]): string {
  let text = prefix;
  for (const part of path) {
    if (typeof part === 'number') text += `[${part}]`;
    else text += text === '' ? String(part) : `.${String(part)}`;
  }
  return text;
}

function codeOf(issue: z.core.$ZodIssue): ErrorCode {
  // The input itself is not part of an issue by default; its type is, at the end of the message.
  if (issue.code === 'invalid_type') {
    return issue.message.endsWith('received undefined') ? 'missing-field' : 'wrong-type';
  }
  if (issue.code === 'too_big' || issue.code === 'too_small') return 'out-of-range';
  return 'unknown-field-value';
}

/** What a schema refused, as problems whose `field` starts with `prefix`. */
export function problemsFromZod(error: z.ZodError, prefix: string): Problem[] {
  return error.issues.map((issue) => {
    const field = pathText(prefix, issue.path);
    return { code: codeOf(issue), message: `${field}: ${issue.message}`, field };
  });
}
