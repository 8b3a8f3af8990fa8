/** `work` with its results kept: what depends on a few small arguments is worked out on first use only. */
export function remember<A extends readonly (string | number | boolean)[], R>(
  work: (...keys: A) => R,
): (...keys: A) => R {
  const known = new Map<string, R>();
  return (...keys) => {
    const key = keys.join();
    let result = known.get(key);
    if (result === undefined) {
      result = work(...keys);
      known.set(key, result);
    }
    return result;
  };
}
