import { type CubicLevel } from '../../../core/dshell/types';

/** One level followed across the field: energies above the ground level, so that the ground level runs at zero. */
export interface LevelLine {
  /** `4T1g` or, where a label occurs several times, counted from below as in `4T1g #2`. */
  readonly id: string;
  readonly label: string;
  readonly multiplicity: number;
  readonly points: readonly { readonly x: number; readonly y: number }[];
}

/** Where the ground level changes. */
export interface Crossover {
  readonly x: number;
  /** Labels of the ground level below and above. */
  readonly from: string;
  readonly to: string;
}

/**
 * Joins levels computed at rising `x` into lines. Levels of one label never cross, so the k-th of a label stays the
 * k-th; `scale` turns energies into the unit of the diagram (1 for cm⁻¹, 1/B for E/B).
 */
export function linesFromLevels(
  columns: readonly { readonly x: number; readonly levels: readonly CubicLevel[] }[],
  scale = 1,
): LevelLine[] {
  const lines = new Map<
    string,
    { label: string; multiplicity: number; points: { x: number; y: number }[] }
  >();
  for (const { x, levels } of columns) {
    const met = new Map<string, number>();
    for (const level of [...levels].sort((one, other) => one.energy - other.energy)) {
      const place = (met.get(level.label) ?? 0) + 1;
      met.set(level.label, place);
      const id = `${level.label} #${place}`;
      const line = lines.get(id) ?? { label: level.label, multiplicity: level.multiplicity, points: [] };
      line.points.push({ x, y: level.energy * scale });
      lines.set(id, line);
    }
  }
  const single = (id: string): boolean => !lines.has(id.replace(/ #1$/, ' #2'));
  return [...lines].map(([id, line]) => ({
    id: id.endsWith(' #1') && single(id) ? line.label : id,
    ...line,
  }));
}

/** The line that is lowest at a column; the first where two coincide. */
function groundAt(lines: readonly LevelLine[], column: number): LevelLine | null {
  let ground: LevelLine | null = null;
  for (const line of lines) {
    const y = line.points[column]?.y;
    if (y === undefined) continue;
    if (ground === null || y < ground.points[column]!.y - 1e-9) ground = line;
  }
  return ground;
}

/** Changes of the ground level along lines on one grid, by linear interpolation between two columns. */
export function crossoversOf(lines: readonly LevelLine[]): Crossover[] {
  const count = lines[0]?.points.length ?? 0;
  const crossovers: Crossover[] = [];
  for (let column = 1; column < count; column++) {
    const [before, after] = [groundAt(lines, column - 1), groundAt(lines, column)];
    if (!before || !after || before === after) continue;
    // Difference of the two levels: negative before, positive after.
    const gap = (at: number): number => before.points[at]!.y - after.points[at]!.y;
    const [first, last] = [gap(column - 1), gap(column)];
    const [left, right] = [before.points[column - 1]!.x, before.points[column]!.x];
    // Without a field the levels of one free-ion term coincide; that is no crossover.
    if (last === first || (left === 0 && Math.abs(first) < 1e-6)) continue;
    crossovers.push({
      x: left + Math.max(0, Math.min(1, -first / (last - first))) * (right - left),
      from: before.label,
      to: after.label,
    });
  }
  return crossovers;
}
