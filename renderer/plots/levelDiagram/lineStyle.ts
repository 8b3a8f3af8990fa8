/** How lines of one spin multiplicity are drawn; told apart by dash and weight, also without colour. */
export interface LineStyle {
  readonly className: string;
  readonly dash: string | undefined;
  readonly width: number;
}

const styles: readonly LineStyle[] = [
  { className: 'level-highest', dash: undefined, width: 2.2 },
  { className: 'level-middle', dash: '9 4', width: 1.6 },
  { className: 'level-lowest', dash: '2 3', width: 1.6 },
];

/** Styles from the highest multiplicity down; a dⁿ ion has three at most. */
export function lineStyles(multiplicities: Iterable<number>): ReadonlyMap<number, LineStyle> {
  const falling = [...new Set(multiplicities)].sort((one, other) => other - one);
  return new Map(
    falling.map((multiplicity, place) => [multiplicity, styles[Math.min(place, styles.length - 1)]!]),
  );
}
