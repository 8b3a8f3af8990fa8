import type { ReactNode } from 'react';
import type { EnergyUnit } from '../../../../core/units';
import {
  FlagMark,
  intervalUnit,
  SpinBar,
  Swatch,
  TransmissionScale,
  TransmissionStrip,
  unitText,
} from '../../../parts';
import { firstBandOf } from '../../../workers/estimateSummary';
import { BandCell } from '../cells/BandCell';
import { ComplexCell } from '../cells/ComplexCell';
import { IntervalCell } from '../cells/IntervalCell';
import type { Ranking } from '../sorting';
import type { TableRow } from '../tableRow';

export interface Column {
  readonly id: string;
  readonly title: string;
  /** Said under the title: the unit, a scale. */
  readonly under?: (unit: EnergyUnit) => ReactNode;
  /** What a click on the title ranks by. */
  readonly ranking?: Ranking;
  /** Least width, rem, and its share of what is left over; fixed without one. */
  readonly least: number;
  readonly share?: number;
  /** Cannot be hidden. */
  readonly fixed?: true;
  readonly cell: (row: TableRow) => ReactNode;
}

const waiting = <span className="cell-waiting">…</span>;
const estimated = (
  row: TableRow,
  draw: (summary: Extract<TableRow['summary'], { ok: true }>) => ReactNode,
) =>
  row.summary === undefined ? waiting : row.summary.ok ? draw(row.summary) : <span className="soft">–</span>;

export const columns: readonly Column[] = [
  {
    id: 'complex',
    title: 'Complex',
    ranking: 'formula',
    least: 9.5,
    share: 0.6,
    fixed: true,
    cell: (row) => <ComplexCell row={row} />,
  },
  {
    id: 'strip',
    title: 'Light that passes',
    under: () => <TransmissionScale />,
    least: 8,
    share: 1.4,
    cell: (row) => estimated(row, ({ transmittance }) => <TransmissionStrip transmittance={transmittance} />),
  },
  {
    id: 'colour',
    title: 'Seen colour',
    least: 8.25,
    cell: (row) => estimated(row, ({ colour }) => <Swatch colour={colour} size="row" text="words" />),
  },
  {
    id: 'distance',
    title: 'ΔE00',
    under: () => 'to target',
    ranking: 'distance',
    least: 4,
    cell: ({ distance }) => (
      <span className="cell-figure">{distance === null ? '–' : distance.toFixed(distance < 10 ? 1 : 0)}</span>
    ),
  },
  {
    id: 'spin',
    title: 'Spin state',
    ranking: 'spin',
    least: 8,
    cell: (row) => estimated(row, ({ spin }) => <SpinBar spin={spin} compact />),
  },
  {
    id: 'band',
    title: 'First band',
    under: (unit) => unitText[unit],
    ranking: 'band',
    least: 6.5,
    cell: (row) => estimated(row, (summary) => <BandCell band={firstBandOf(summary)} />),
  },
  {
    id: 'tenDq',
    title: '10Dq',
    under: (unit) => unitText[intervalUnit(unit)],
    ranking: 'tenDq',
    least: 6.5,
    cell: (row) => estimated(row, ({ tenDq }) => <IntervalCell value={tenDq} />),
  },
  {
    id: 'remarks',
    title: 'Remarks',
    least: 4,
    cell: (row) => estimated(row, ({ flags }) => <FlagMark flags={flags} />),
  },
];

/** Columns on screen: the distance only where the project has a target. */
export const shownColumns = (hidden: readonly string[], hasTarget: boolean): readonly Column[] =>
  columns.filter(({ id, fixed }) => fixed || (!hidden.includes(id) && (id !== 'distance' || hasTarget)));

/** Box and star before the columns, rem. */
const mark = 1.9;

/** Tracks of head and rows, and the width below which the table scrolls: the same for both, so that they line up. */
export function tracksOf(shown: readonly Column[]): { readonly tracks: string; readonly least: string } {
  const columnTracks = shown.map(({ least, share }) =>
    share === undefined ? `${least}rem` : `minmax(${least}rem, ${share}fr)`,
  );
  const least = shown.reduce((sum, column) => sum + column.least, 2 * mark);
  return {
    tracks: `${mark}rem ${mark}rem ${columnTracks.join(' ')}`,
    least: `calc(${least}rem + ${shown.length + 1} * var(--gap-2) + 2 * var(--gap-2))`,
  };
}
