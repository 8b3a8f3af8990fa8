import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { type LevelProblem } from '../problem';
import { type LabelGroup } from './labelGroup';
import { levels } from './levels';

interface Case extends LevelProblem {
  readonly id: string;
  readonly subkind: string;
  readonly labelGroup: string | null;
  readonly groupingTol_cm1: number;
  readonly groupingUnambiguous: boolean;
  readonly groundAbsolute_cm1: number;
  readonly levels: readonly {
    readonly energy_cm1: number;
    readonly degeneracy: number;
    readonly multiplicity: number | null;
    readonly label: string | null;
  }[];
}

/** Computed by an independent program over the full determinant space; see core/testing/levels/CONVENTIONS.md. */
const file = new URL('../../testing/levels/data/cases.json', import.meta.url);
const { cases } = JSON.parse(readFileSync(file, 'utf8')) as { cases: Case[] };

const expanded = (list: readonly { degeneracy: number }[], energyOf: (index: number) => number): number[] =>
  list
    .flatMap(({ degeneracy }, index) => new Array<number>(degeneracy).fill(energyOf(index)))
    .sort((a, b) => a - b);

describe('levels agree with every independently computed case: energies, degeneracies, multiplicities, labels', () => {
  it.each(cases.map((each) => [`${each.id} (${each.subkind})`, each] as const))('%s', (_, expected) => {
    const labelGroup = (expected.labelGroup?.replace('*', '') ?? null) as LabelGroup | null;
    const { levels: found, groundAbsolute } = levels(expected, {
      labelGroup,
      tolerance: expected.groupingTol_cm1,
    });
    const energies = expanded(found, (i) => found[i]!.energy);
    const wanted = expanded(expected.levels, (i) => expected.levels[i]!.energy_cm1);
    expect(energies.length).toBe(wanted.length);
    const span = wanted.at(-1)!;
    // The cases are rounded to 1e-6 cm-1.
    energies.forEach((energy, i) => expect(Math.abs(energy - wanted[i]!)).toBeLessThan(1e-6 + 1e-11 * span));
    expect(Math.abs(groundAbsolute - expected.groundAbsolute_cm1)).toBeLessThan(1e-6 + 1e-11 * span);
    if (!expected.groupingUnambiguous) return;
    const names = (
      list: readonly { degeneracy: number; multiplicity: number | null; label: string | null }[],
    ) => list.map(({ degeneracy, multiplicity, label }) => `${multiplicity} ${label} ${degeneracy}`).sort();
    expect(names(found)).toEqual(names(expected.levels));
    // Name by name, so that a right set of names on wrong energies is seen.
    const byName = (
      label: string | null,
      multiplicity: number | null,
      list: readonly { energy: number; label: string | null; multiplicity: number | null }[],
    ) =>
      list
        .filter((level) => level.label === label && level.multiplicity === multiplicity)
        .map(({ energy }) => energy)
        .sort((a, b) => a - b);
    const reference = expected.levels.map((level) => ({ ...level, energy: level.energy_cm1 }));
    for (const { label, multiplicity } of expected.levels) {
      const mine = byName(label, multiplicity, found);
      byName(label, multiplicity, reference).forEach((energy, i) =>
        expect(Math.abs(mine[i]! - energy)).toBeLessThan(1e-6 + 1e-11 * span),
      );
    }
  });
});
