/** What may be said at a probability: 0.95 and above "expected", 0.8 and above "likely", below that nothing certain. */
export function spinWords(probabilityHigh: number): string {
  const high = probabilityHigh >= 0.5;
  const larger = high ? probabilityHigh : 1 - probabilityHigh;
  const name = high ? 'high spin' : 'low spin';
  if (larger >= 0.95) return `${name} expected`;
  if (larger >= 0.8) return `${name} likely`;
  return 'cannot say: near crossover';
}

/** The larger probability below which a complex counts as near crossover. */
export const nearCrossoverBelow = 0.8;
