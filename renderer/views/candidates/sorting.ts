import { firstBandOf } from '../../workers/estimateSummary';
import type { TableRow } from './tableRow';

/** What the table can be ranked by. */
export const rankings = ['added', 'formula', 'distance', 'spin', 'band', 'tenDq', 'starred'] as const;
export type Ranking = (typeof rankings)[number];

export const rankingNames: Readonly<Record<Ranking, string>> = {
  added: 'order of entry',
  formula: 'formula',
  distance: 'colour distance to the target',
  spin: 'probability of high spin',
  band: 'first spin-allowed band',
  tenDq: '10Dq',
  starred: 'star',
};

export interface Sort {
  readonly by: Ranking;
  readonly descending: boolean;
}

type NumberOf = (row: TableRow) => number | null;

const numbers: Readonly<Record<Exclude<Ranking, 'formula'>, NumberOf>> = {
  added: ({ candidate }) => Date.parse(candidate.createdAt),
  distance: ({ distance }) => distance,
  spin: ({ summary }) => (summary?.ok ? summary.spin.probabilityHigh : null),
  band: ({ summary }) => (summary?.ok ? (firstBandOf(summary)?.energy ?? null) : null),
  tenDq: ({ summary }) => (summary?.ok ? (summary.tenDq?.value ?? null) : null),
  starred: ({ candidate }) => (candidate.starred ? 1 : 0),
};

const formulaOf = ({ candidate, summary }: TableRow): string =>
  summary?.ok ? summary.formula : candidate.composition.metal;

const collator = new Intl.Collator('en', { numeric: true });

/** Ids rise in the order of entry, so that a row that was deleted and brought back is where it was. */
const asEntered = (one: TableRow, other: TableRow): number =>
  one.candidate.id < other.candidate.id ? -1 : 1;

/** Rows in order; those without the quantity come last whichever way it is sorted, equals in the order of entry. */
export function sortRows(rows: readonly TableRow[], { by, descending }: Sort): TableRow[] {
  const sign = descending ? -1 : 1;
  if (by === 'formula') {
    const keyed = rows.map((row) => ({ row, key: formulaOf(row) }));
    return keyed.sort((one, other) => sign * collator.compare(one.key, other.key)).map(({ row }) => row);
  }
  const keys = Float64Array.from(rows, (row) => numbers[by](row) ?? NaN);
  const places = Uint32Array.from(rows, (_, index) => index);
  places.sort((one, other) => {
    const [a, b] = [keys[one]!, keys[other]!];
    if (Number.isNaN(a) !== Number.isNaN(b)) return Number.isNaN(a) ? 1 : -1;
    return a === b || Number.isNaN(a) ? asEntered(rows[one]!, rows[other]!) : sign * (a - b);
  });
  return Array.from(places, (place) => rows[place]!);
}
