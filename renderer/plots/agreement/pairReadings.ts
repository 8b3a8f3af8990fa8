import { formatFigures } from '../../parts/number';
import { type ReadSeries } from '../frame';
import { type Pair } from './pairs';

const plusMinus = (value: number | null): string => (value === null ? '' : ` ± ${formatFigures(value, 2)}`);

/** A pair in words. */
export const pairText = (pair: Pair, unit: string): string =>
  `${pair.name}: predicted ${formatFigures(pair.predicted)}${plusMinus(pair.sigma)}, measured ${formatFigures(pair.measured, 4)}${plusMinus(pair.u)} ${unit}`;

/** One series over all pairs in rising x, whatever their group: reading goes from left to right. */
export function pairReadings(
  pairs: readonly Pair[],
  place: (pair: Pair) => { readonly x: number; readonly y: number },
  text: (pair: Pair) => string,
): { readonly series: ReadSeries[]; readonly ordered: readonly Pair[] } {
  const ordered = [...pairs].sort((one, other) => place(one).x - place(other).x);
  return {
    ordered,
    series: [
      {
        id: 'pairs',
        name: 'pairs',
        xs: ordered.map((pair) => place(pair).x),
        ys: ordered.map((pair) => place(pair).y),
        text: (index) => text(ordered[index]!),
      },
    ],
  };
}

/** The table behind every plot of pairs. */
export const pairTable = (pairs: readonly Pair[], unit: string) => ({
  columns: [
    'complex and quantity',
    'group',
    `predicted / ${unit}`,
    `σ / ${unit}`,
    `measured / ${unit}`,
    `u / ${unit}`,
  ],
  rows: pairs.map(({ name, group, predicted, sigma, measured, u }) => [
    name,
    group ?? null,
    ...[predicted, sigma, measured, u],
  ]),
});
