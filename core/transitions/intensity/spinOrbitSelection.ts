import type { BandLevel } from '../bandInput';

/** Irreducible representations whose product contains T1, as which the spin-orbit operator transforms. */
const coupled: Readonly<Record<string, readonly string[]>> = {
  A1: ['T1'],
  A2: ['T2'],
  E: ['T1', 'T2'],
  T1: ['A1', 'E', 'T1', 'T2'],
  T2: ['A2', 'E', 'T1', 'T2'],
};

const cubicIrrep = (label: string): string | null => /^\d+(A1|A2|E|T1|T2)[gu]?$/.exec(label)?.[1] ?? null;

/** Share of two levels whose configurations a one-electron operator can join; 1 where they are not known. */
function reach(one: BandLevel, other: BandLevel): number {
  if (one.configurations.length === 0 || other.configurations.length === 0) return 1;
  let sum = 0;
  for (const a of one.configurations) {
    for (const b of other.configurations) if (Math.abs(a.e - b.e) <= 1) sum += a.weight * b.weight;
  }
  return sum;
}

/**
 * How far spin-orbit coupling joins two levels, 0 to 1: their spins may differ by one, their product must contain T1 in
 * a cubic field, and their configurations may differ by one electron. Levels of lower symmetry are taken as joined.
 */
export function spinOrbitReach(one: BandLevel, other: BandLevel): number {
  if (Math.abs(one.multiplicity - other.multiplicity) > 2) return 0;
  const [a, b] = [cubicIrrep(one.label), cubicIrrep(other.label)];
  if (a !== null && b !== null && !coupled[a]!.includes(b)) return 0;
  return reach(one, other);
}
