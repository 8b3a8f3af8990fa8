import type { Problem } from '../../errors';
import type { BundleLimits } from './format';

const forbiddenKeys = new Set(['__proto__', 'constructor', 'prototype']);

const notFinite = (path: string): Problem => ({
  code: 'not-finite',
  message: `${path} is not a finite number`,
  field: path,
});

/**
 * Looks for what no honest bundle holds (keys that reach for a prototype, absurd nesting, numbers too large for a
 * double) without recursion, before any schema sees the value. Stops at the first few findings.
 */
export function findTraps(value: unknown, limits: BundleLimits): Problem[] {
  const problems: Problem[] = [];
  const stack: { value: unknown; path: string; depth: number }[] = [{ value, path: '', depth: 0 }];
  while (stack.length > 0 && problems.length < limits.problems) {
    const item = stack.pop()!;
    if (typeof item.value !== 'object' || item.value === null) continue;
    if (item.depth >= limits.depth) {
      problems.push({
        code: 'too-large',
        message: `${item.path.slice(0, 200)} is nested deeper than ${limits.depth} levels`,
        field: item.path.slice(0, 200),
      });
      continue;
    }
    if (Array.isArray(item.value)) {
      for (const [i, child] of item.value.entries()) {
        // Lists of numbers are long: no path is built unless something is wrong with one.
        if (typeof child === 'object' && child !== null) {
          stack.push({ value: child, path: `${item.path}[${i}]`, depth: item.depth + 1 });
        } else if (typeof child === 'number' && !Number.isFinite(child)) {
          problems.push(notFinite(`${item.path}[${i}]`));
        }
      }
      continue;
    }
    for (const key of Object.keys(item.value)) {
      const path = item.path === '' ? key : `${item.path}.${key}`;
      if (forbiddenKeys.has(key)) {
        problems.push({
          code: 'unknown-field-value',
          message: `${path} is a key that no bundle may hold`,
          field: path,
        });
        continue;
      }
      const child = (item.value as Record<string, unknown>)[key];
      if (typeof child === 'number' && !Number.isFinite(child)) problems.push(notFinite(path));
      else stack.push({ value: child, path, depth: item.depth + 1 });
    }
  }
  return problems;
}
