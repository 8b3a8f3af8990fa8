/** Numbers in [0, 1) from a 32-bit linear congruential generator: the same candidates on every machine. */
export function seededFractions(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (Math.imul(state, 1_664_525) + 1_013_904_223) >>> 0;
    return state / 2 ** 32;
  };
}
