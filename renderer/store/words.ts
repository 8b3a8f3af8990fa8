/** `1 candidate`, `3 candidates`. */
export const counted = (count: number, noun: string): string =>
  `${count.toLocaleString('en-GB')} ${noun}${count === 1 ? '' : 's'}`;
