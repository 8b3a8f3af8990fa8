import { levels } from '../../../dshell';
import type { OrbitalFamily } from './patterns';

/** A level by spin, name where there is one, and order among those of the same spin and name. */
export interface OrbitalLevel {
  readonly energy: number;
  readonly multiplicity: number;
  readonly label: string | null;
  readonly ordinal: number;
}

export const keyOf = (level: Omit<OrbitalLevel, 'energy'>): string =>
  `${level.multiplicity}${level.label ?? ''}.${level.ordinal}`;

/** Levels relative to the lowest of the ground multiplicity. `p` holds the orbital energies, then B and C. */
export function orbitalLevels(
  dElectrons: number,
  family: OrbitalFamily,
  energies: ArrayLike<number>,
  B: number,
  C: number,
  groundMultiplicity: number,
): { readonly levels: readonly OrbitalLevel[]; readonly isGround: boolean; readonly groundLabel: string } {
  const found = levels({
    dElectrons,
    B,
    C,
    field: { type: 'matrix', matrix: family.field(energies) },
  }).levels;
  const counts = new Map<string, number>();
  const merged: OrbitalLevel[] = [];
  for (const level of found) {
    const multiplicity = level.multiplicity ?? 0;
    const label = family.named ? level.label : null;
    // In an axial field the two halves of a pair carry two names and one energy: one level.
    if (
      !family.named &&
      merged.some((each) => each.multiplicity === multiplicity && Math.abs(each.energy - level.energy) < 0.01)
    )
      continue;
    const name = `${multiplicity}${label ?? ''}`;
    const ordinal = counts.get(name) ?? 0;
    counts.set(name, ordinal + 1);
    merged.push({ energy: level.energy, multiplicity, label, ordinal });
  }
  const ground = merged.find((level) => level.multiplicity === groundMultiplicity) ?? merged[0]!;
  return {
    levels: merged.map((level) => ({ ...level, energy: level.energy - ground.energy })),
    isGround: ground.energy < 1e-6,
    groundLabel: `${ground.multiplicity}${ground.label ?? ''}`,
  };
}
