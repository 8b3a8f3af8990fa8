import type { TableRow } from './tableRow';

/** What the table can be divided by. */
export const groupings = ['none', 'metal', 'geometry', 'spin', 'tag'] as const;
export type Grouping = (typeof groupings)[number];

export const groupingNames: Readonly<Record<Grouping, string>> = {
  none: 'not grouped',
  metal: 'metal ion',
  geometry: 'geometry',
  spin: 'spin state',
  tag: 'first tag',
};

/** A run of rows under one heading; `start` is the place of its first row in the ordered list. */
export interface RowGroup {
  readonly label: string;
  readonly start: number;
  readonly count: number;
}

export interface GroupedRows {
  readonly rows: readonly TableRow[];
  /** Empty where nothing is grouped. */
  readonly groups: readonly RowGroup[];
}

const roman = ['0', 'I', 'II', 'III', 'IV', 'V', 'VI', 'VII', 'VIII'];
/** Groups that hold what has no value stand last. */
const without = { spin: 'no spin state', tag: 'no tag' };

function stateText(oxidationState: number): string {
  const figure = roman[Math.abs(oxidationState)] ?? String(Math.abs(oxidationState));
  return oxidationState < 0 ? `−${figure}` : figure;
}

const labels: Readonly<Record<Exclude<Grouping, 'none'>, (row: TableRow) => string>> = {
  metal: ({ candidate: { composition } }) => `${composition.metal}(${stateText(composition.oxidationState)})`,
  geometry: ({ candidate: { composition } }) => composition.geometry.replaceAll('-', ' '),
  spin: ({ summary }) =>
    !summary?.ok ? without.spin : summary.spin.nearCrossover ? 'near crossover' : summary.spin.state,
  tag: ({ candidate }) => candidate.tags[0] ?? without.tag,
};

const collator = new Intl.Collator('en', { numeric: true });
const isLast = (label: string): boolean => label === without.spin || label === without.tag;

/** Rows under their headings, each group in the order that the rows had. */
export function groupRows(rows: readonly TableRow[], by: Grouping): GroupedRows {
  if (by === 'none') return { rows, groups: [] };
  const members = new Map<string, TableRow[]>();
  for (const row of rows) {
    const label = labels[by](row);
    const group = members.get(label);
    if (group) group.push(row);
    else members.set(label, [row]);
  }
  const ordered = [...members].sort(
    ([one], [other]) => Number(isLast(one)) - Number(isLast(other)) || collator.compare(one, other),
  );
  const groups: RowGroup[] = [];
  const grouped: TableRow[] = [];
  for (const [label, group] of ordered) {
    groups.push({ label, start: grouped.length, count: group.length });
    for (const row of group) grouped.push(row);
  }
  return { rows: grouped, groups };
}

/** A line of the table on screen: the heading of a group, or a row by its place in the list. */
export type TableLine = { readonly group: RowGroup } | { readonly place: number };

/** Lines and, for each row, which line it is. */
export class TableLines {
  readonly count: number;
  readonly #starts: readonly number[];
  readonly #groups: readonly RowGroup[];

  constructor(rows: number, groups: readonly RowGroup[]) {
    this.count = rows + groups.length;
    this.#groups = groups;
    this.#starts = groups.map(({ start }, index) => start + index);
  }

  at(line: number): TableLine {
    if (this.#groups.length === 0) return { place: line };
    const index = this.#before(this.#starts, line);
    return this.#starts[index] === line ? { group: this.#groups[index]! } : { place: line - index - 1 };
  }

  ofRow(place: number): number {
    if (this.#groups.length === 0) return place;
    const starts = this.#groups.map(({ start }) => start);
    return place + this.#before(starts, place) + 1;
  }

  /** The last of the rising numbers that is not above the value. */
  #before(rising: readonly number[], value: number): number {
    let [low, high] = [0, rising.length - 1];
    while (low < high) {
      const middle = (low + high + 1) >> 1;
      if (rising[middle]! <= value) low = middle;
      else high = middle - 1;
    }
    return low;
  }
}
