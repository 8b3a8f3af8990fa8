import { cubicLevels, type CubicGeometry, type CubicLevel } from '../../dshell';

export interface FieldParameters {
  readonly tenDq: number;
  readonly B: number;
  readonly C: number;
}

/** A level by what does not change when parameters do: levels of one symmetry never cross. */
export interface LevelKey {
  readonly multiplicity: number;
  readonly irrep: string;
  /** 0 for the lowest of its multiplicity and irrep. */
  readonly ordinal: number;
}

export interface KeyedLevel extends CubicLevel {
  readonly ordinal: number;
}

export const sameLevel = (a: LevelKey, b: LevelKey): boolean =>
  a.multiplicity === b.multiplicity && a.irrep === b.irrep && a.ordinal === b.ordinal;

export const levelKey = (key: LevelKey): string => `${key.multiplicity}${key.irrep}.${key.ordinal}`;

/**
 * Levels relative to the lowest one of `groundMultiplicity`, whether or not another spin lies lower: on the way to a
 * solution the parameters may pass through the other spin's realm, and energies must not jump there.
 */
export function levelsFrom(
  dElectrons: number,
  geometry: CubicGeometry,
  parameters: FieldParameters,
  groundMultiplicity: number,
): { readonly levels: readonly KeyedLevel[]; readonly ground: KeyedLevel; readonly isGround: boolean } {
  const raw = cubicLevels({ dElectrons, geometry, ...parameters });
  const counts = new Map<string, number>();
  const keyed = raw.map((level): KeyedLevel => {
    const name = `${level.multiplicity}${level.irrep}`;
    const ordinal = counts.get(name) ?? 0;
    counts.set(name, ordinal + 1);
    return { ...level, ordinal };
  });
  const ground = keyed.find((level) => level.multiplicity === groundMultiplicity) ?? keyed[0]!;
  const levels = keyed.map((level) => ({
    ...level,
    energy: level.energy - ground.energy,
    slope: {
      tenDq: level.slope.tenDq - ground.slope.tenDq,
      B: level.slope.B - ground.slope.B,
      C: level.slope.C - ground.slope.C,
    },
  }));
  return { levels, ground, isGround: ground.energy < 1e-6 };
}

/** Largest and, where a strong field can pair more, smallest multiplicity of a d^N ground level in a cubic field. */
export function groundMultiplicities(dElectrons: number, geometry: CubicGeometry): number[] {
  const high = (dElectrons <= 5 ? dElectrons : 10 - dElectrons) + 1;
  // In strong field t2g (octahedral) or e (tetrahedral) fills first.
  const inner = geometry === 'octahedral' ? 6 : 4;
  const lower = Math.min(dElectrons, inner);
  const unpaired = (electrons: number, orbitals: number) =>
    electrons <= orbitals ? electrons : 2 * orbitals - electrons;
  const low = unpaired(lower, inner / 2) + unpaired(dElectrons - lower, 5 - inner / 2) + 1;
  return low < high ? [high, low] : [high];
}
