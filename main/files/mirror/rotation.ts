import { snapshotReasons, type SnapshotReason } from '../../../renderer/host/bridge';

const ending = '.spinhue';
const pattern = /^(\d{4})(\d\d)(\d\d)T(\d\d)(\d\d)(\d\d)(\d{3})Z-([a-z-]+)$/;

export interface SnapshotId {
  readonly id: string;
  /** ISO 8601, UTC. */
  readonly takenAt: string;
  readonly reason: SnapshotReason;
}

export const snapshotId = (at: Date, reason: SnapshotReason): string =>
  `${at.toISOString().replace(/[-:.]/g, '')}-${reason}`;

export const snapshotFile = (id: string): string => `${id}${ending}`;

/** What a file name in the snapshots folder says; null for files that are not ours. */
export function parseSnapshotFile(name: string): SnapshotId | null {
  if (!name.endsWith(ending)) return null;
  const id = name.slice(0, -ending.length);
  const match = pattern.exec(id);
  const reason = match?.[8] as SnapshotReason | undefined;
  if (!match || !snapshotReasons.includes(reason!)) return null;
  const [, year, month, day, hour, minute, second, ms] = match;
  return { id, takenAt: `${year}-${month}-${day}T${hour}:${minute}:${second}.${ms}Z`, reason: reason! };
}

/** A state is worth keeping when the one before is this old. */
export const snapshotEvery_ms = 10 * 60_000;

/** How many are kept: of the latest, of the last in each day, of the last in each week; of those taken on purpose. */
export const kept = { recent: 6, days: 14, weeks: 26, purposeful: 30 } as const;

const dayOf = (takenAt: string): string => takenAt.slice(0, 10);
/** Weeks counted from a Monday; only sameness matters. */
const weekOf = (takenAt: string): string =>
  String(Math.floor((Date.parse(`${dayOf(takenAt)}T00:00:00Z`) / 86_400_000 + 3) / 7));

/**
 * Snapshots to remove. Days and weeks are counted among those that have a snapshot, not from today, so that a clock
 * which jumps, or a month away from the bench, removes nothing.
 */
export function superfluous(snapshots: readonly SnapshotId[]): SnapshotId[] {
  const newestFirst = [...snapshots].sort((a, b) => (a.id < b.id ? 1 : a.id > b.id ? -1 : 0));
  const continuous = newestFirst.filter(({ reason }) => reason === 'continuous');
  const keep = new Set<SnapshotId>(continuous.slice(0, kept.recent));
  const keepLastOfEach = (periodOf: (takenAt: string) => string, count: number): void => {
    const periods = new Set<string>();
    for (const snapshot of continuous) {
      const period = periodOf(snapshot.takenAt);
      if (periods.has(period)) continue;
      if (periods.size === count) return;
      periods.add(period);
      keep.add(snapshot);
    }
  };
  keepLastOfEach(dayOf, kept.days);
  keepLastOfEach(weekOf, kept.weeks);
  const purposeful = newestFirst.filter(({ reason }) => reason !== 'continuous');
  for (const snapshot of purposeful.slice(0, kept.purposeful)) keep.add(snapshot);
  return newestFirst.filter((snapshot) => !keep.has(snapshot));
}
