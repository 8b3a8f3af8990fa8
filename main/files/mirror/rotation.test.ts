import { describe, expect, it } from 'vitest';
import { kept, parseSnapshotFile, snapshotFile, snapshotId, superfluous, type SnapshotId } from './rotation';

const at = (iso: string, reason: SnapshotId['reason'] = 'continuous'): SnapshotId =>
  parseSnapshotFile(snapshotFile(snapshotId(new Date(iso), reason)))!;

/** Every ten minutes of eight working hours, for so many days. */
function workingDays(days: number): SnapshotId[] {
  const start = Date.UTC(2026, 0, 5, 8);
  return Array.from({ length: days }, (_, day) =>
    Array.from({ length: 48 }, (_, i) => at(new Date(start + day * 86_400_000 + i * 600_000).toISOString())),
  ).flat();
}

describe('rotation of snapshots', () => {
  it('keeps the latest, the last of each day and the last of each week', () => {
    const all = workingDays(60);
    const gone = new Set(superfluous(all));
    const left = all.filter((each) => !gone.has(each));
    expect(left.slice(-kept.recent)).toEqual(all.slice(-kept.recent));
    const days = new Set(left.map(({ takenAt }) => takenAt.slice(0, 10)));
    expect(days.size).toBeGreaterThanOrEqual(kept.days);
    expect(left.length).toBeLessThanOrEqual(kept.recent + kept.days + kept.weeks);
    // Sunday 11 January 2026 ends the first week.
    expect(left[0]!.takenAt).toBe('2026-01-11T15:50:00.000Z');
  });

  it('removes nothing more when it runs again', () => {
    const all = workingDays(40);
    const gone = new Set(superfluous(all));
    expect(superfluous(all.filter((each) => !gone.has(each)))).toEqual([]);
  });

  it('never removes a snapshot taken before an import, upgrade, restore or recalibration to make room for routine ones', () => {
    const purposeful = [
      at('2025-01-01T00:00:00Z', 'before-import'),
      at('2025-02-01T00:00:00Z', 'before-upgrade'),
      at('2025-03-01T00:00:00Z', 'before-restore'),
      at('2025-04-01T00:00:00Z', 'before-recalibration'),
      at('2025-05-01T00:00:00Z', 'changed-elsewhere'),
    ];
    const gone = superfluous([...purposeful, ...workingDays(60)]);
    expect(gone.filter(({ reason }) => reason !== 'continuous')).toEqual([]);
  });

  it('a clock that jumps ahead for a while, or a month away, empties no slot', () => {
    const before = workingDays(3);
    const wild = [at('2099-01-01T10:00:00Z'), at('2099-01-01T10:10:00Z')];
    const after = [at('2026-03-01T10:00:00Z')];
    const gone = superfluous([...before, ...wild, ...after]);
    expect(gone).not.toContain(after[0]);
    expect(gone).not.toContain(before.at(-1));
  });

  it('leaves files alone that are not its own', () => {
    for (const name of [
      'notes.txt',
      '../20260101T000000000Z-by-hand.spinhue',
      'x.spinhue',
      '20260101T000000000Z-other.spinhue',
    ]) {
      expect(parseSnapshotFile(name)).toBeNull();
    }
  });
});
