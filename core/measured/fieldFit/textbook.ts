import type { CubicGeometry } from '../../dshell';
import type { LevelKey } from './model';

/** A value by a closed formula, with the formula. */
export interface TextbookValue {
  readonly tenDq: number;
  readonly B: number;
  readonly rule: string;
}

/**
 * Closed formulas for d3 and d8 in octahedral and d2 and d7 in tetrahedral fields, where the ground level is orbitally
 * single: the first band is 10Dq; two bands fix B exactly, three overdetermine it and the sum rule is the usual choice
 * (A. B. P. Lever, Inorganic Electronic Spectroscopy, 2nd ed., 1984; from memory).
 */
export function textbookRule(
  dElectrons: number,
  geometry: CubicGeometry,
  energies: readonly number[],
  levels: readonly LevelKey[],
): TextbookValue | null {
  const singleGround = geometry === 'octahedral' ? [3, 8] : [2, 7];
  if (!singleGround.includes(dElectrons)) return null;
  const high = levels.length > 0 ? Math.max(...levels.map((level) => level.multiplicity)) : 0;
  const at = (irrep: string, ordinal: number): number | null => {
    const i = levels.findIndex(
      (level) => level.irrep === irrep && level.ordinal === ordinal && level.multiplicity === high,
    );
    return i < 0 ? null : energies[i]!;
  };
  const [v1, v2, v3] = [at('T2', 0), at('T1', 0), at('T1', 1)];
  if (v1 === null) return null;
  if (v2 !== null && v3 !== null) {
    return { tenDq: v1, B: (v2 + v3 - 3 * v1) / 15, rule: 'v1 = 10Dq, B = (v2 + v3 - 3 v1) / 15' };
  }
  const v = v2 ?? v3;
  if (v === null || 15 * v - 27 * v1 === 0) return null;
  return {
    tenDq: v1,
    B: (2 * v1 * v1 + v * v - 3 * v1 * v) / (15 * v - 27 * v1),
    rule: `v1 = 10Dq, B = (2 v1^2 + v^2 - 3 v1 v) / (15 v - 27 v1) with v = ${v2 !== null ? 'v2' : 'v3'}`,
  };
}
