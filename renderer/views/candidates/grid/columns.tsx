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
  /** Track of the grid. */
  readonly width: string;
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
    width: 'minmax(9.5rem, 1.3fr)',
    fixed: true,
    cell: (row) => <ComplexCell row={row} />,
  },
  {
    id: 'strip',
    title: 'Light that passes, nm',
    under: () => <TransmissionScale />,
    width: 'minmax(8rem, 1fr)',
    cell: (row) => estimated(row, ({ transmittance }) => <TransmissionStrip transmittance={transmittance} />),
  },
  {
    id: 'colour',
    title: 'Seen colour',
    width: '8.5rem',
    cell: (row) => estimated(row, ({ colour }) => <Swatch colour={colour} size="row" text="words" />),
  },
  {
    id: 'distance',
    title: 'ΔE00',
    under: () => 'to target',
    ranking: 'distance',
    width: '4rem',
    cell: ({ distance }) => (
      <span className="cell-figure">{distance === null ? '–' : distance.toFixed(distance < 10 ? 1 : 0)}</span>
    ),
  },
  {
    id: 'spin',
    title: 'Spin state',
    ranking: 'spin',
    width: '8rem',
    cell: (row) => estimated(row, ({ spin }) => <SpinBar spin={spin} compact />),
  },
  {
    id: 'band',
    title: 'First band',
    under: (unit) => unitText[unit],
    ranking: 'band',
    width: '6.75rem',
    cell: (row) => estimated(row, (summary) => <BandCell band={firstBandOf(summary)} />),
  },
  {
    id: 'tenDq',
    title: '10Dq',
    under: (unit) => unitText[intervalUnit(unit)],
    ranking: 'tenDq',
    width: '6.75rem',
    cell: (row) => estimated(row, ({ tenDq }) => <IntervalCell value={tenDq} />),
  },
  {
    id: 'remarks',
    title: 'Remarks',
    width: '4.25rem',
    cell: (row) => estimated(row, ({ flags }) => <FlagMark flags={flags} />),
  },
];

/** Columns on screen: the distance only where the project has a target. */
export const shownColumns = (hidden: readonly string[], hasTarget: boolean): readonly Column[] =>
  columns.filter(({ id, fixed }) => fixed || (!hidden.includes(id) && (id !== 'distance' || hasTarget)));
