import { describe, expect, it } from 'vitest';
import { computedCases } from '../../testing/levels/computedCases';
import { type LabelGroup } from './labelGroup';
import { levels } from './levels';

interface Named {
  readonly energy: number;
  readonly degeneracy: number;
  readonly multiplicity: number | null;
  readonly label: string | null;
}

/** Energies by multiplicity and label, ascending, each as often as it is degenerate. */
function byName(list: readonly Named[]): Map<string, number[]> {
  const found = new Map<string, number[]>();
  for (const { energy, degeneracy, multiplicity, label } of list) {
    const name = `${multiplicity} ${label}`;
    const energies = found.get(name) ?? [];
    for (let i = 0; i < degeneracy; i++) energies.push(energy);
    found.set(name, energies);
  }
  for (const energies of found.values()) energies.sort((a, b) => a - b);
  return found;
}

const count = (list: readonly Named[]): string[] =>
  list.map(({ degeneracy, multiplicity, label }) => `${multiplicity} ${label} ${degeneracy}`).sort();

describe('levels agree with every independently computed case: energies, degeneracies, multiplicities, labels', () => {
  it.each(computedCases().map((each) => [`${each.id} (${each.subkind})`, each] as const))(
    '%s',
    (_, expected) => {
      const labelGroup = (expected.labelGroup?.replace('*', '') ?? null) as LabelGroup | null;
      const { levels: found, groundAbsolute } = levels(expected, {
        labelGroup,
        tolerance: expected.groupingTol_cm1,
      });
      const wanted = expected.levels.map((level) => ({ ...level, energy: level.energy_cm1 }));
      // The cases are rounded to 1e-6 cm-1.
      const tolerance = 1e-6 + 1e-11 * wanted.at(-1)!.energy;
      expect(Math.abs(groundAbsolute - expected.groundAbsolute_cm1)).toBeLessThan(tolerance);
      if (expected.groupingUnambiguous) expect(count(found)).toEqual(count(wanted));
      const mine = byName(found);
      const differences = [...byName(wanted)].flatMap(([name, energies]) => {
        expect(mine.get(name)).toHaveLength(energies.length);
        return energies.map((energy, i) => Math.abs(energy - mine.get(name)![i]!));
      });
      expect(Math.max(...differences)).toBeLessThan(tolerance);
    },
  );
});
