function deepEqual(one: unknown, other: unknown): boolean {
  if (Object.is(one, other)) return true;
  if (typeof one !== 'object' || typeof other !== 'object' || one === null || other === null) return false;
  if (Array.isArray(one) !== Array.isArray(other)) return false;
  const keys = Object.keys(one);
  if (keys.length !== Object.keys(other).length) return false;
  return keys.every(
    (key) =>
      Object.hasOwn(other, key) &&
      deepEqual((one as Record<string, unknown>)[key], (other as Record<string, unknown>)[key]),
  );
}

const bookkeeping = { revision: 0, updatedAt: '' };

/** Whether two rows say the same, whatever their revision and time of change. Null means no row. */
export function sameContent(one: object | null | undefined, other: object | null | undefined): boolean {
  if (!one || !other) return !one && !other;
  return deepEqual({ ...one, ...bookkeeping }, { ...other, ...bookkeeping });
}
