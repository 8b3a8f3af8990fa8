import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { estimateField } from '../../estimation';
import {
  complexKey,
  defaultLibrary,
  withParameterSet,
  type ParameterLibrary,
  type ParameterValues,
} from '../../library';
import { seeded } from '../../testing/seeded';
import { readMeasuredSet } from '../measuredSet';
import { observationOf, recalibrate, type Observation } from './index';

// 10Dq of published complexes with their sources: core/testing/measured. Only entries that may inform parameters.
const raw = JSON.parse(
  readFileSync(join(import.meta.dirname, '../../testing/measured/data/published.json'), 'utf8'),
) as { complexes: { id: string; dElectrons: number }[] };
const set = readMeasuredSet(raw);
if (!set.ok) throw new Error('the published set is not readable');
const electrons = new Map(raw.complexes.map((entry) => [entry.id, entry.dElectrons]));
const published = set.value
  .filter((complex) => complex.useForTuning)
  .map((complex) => observationOf(complex, electrons.get(complex.id)!))
  .filter((each) => each !== null)
  .map((each) => ({ ...each, B: null }));

/** The published complexes in two random halves, to be estimated with that library. */
function halves(library: ParameterLibrary, seed: number): [Observation[], Observation[]] {
  const random = seeded(seed);
  const order = published
    .map((each) => ({ each: { ...each, library }, key: random.next() }))
    .sort((one, other) => one.key - other.key)
    .map(({ each }) => each);
  return [order.slice(0, order.length >> 1), order.slice(order.length >> 1)];
}

/** Root mean square of ln measured - ln estimated, worked out apart from the recalibration. */
function errorOn(observations: readonly Observation[], values: ParameterValues['values']): number {
  const misfits = observations.flatMap(({ composition, spin, tenDq, library }) => {
    const { library: overlaid } = withParameterSet(library, { values });
    const field = estimateField(composition, overlaid)!;
    const { value } = spin === null ? field.fields.middle : field.fields[spin];
    return tenDq === null || value === null ? [] : [Math.log(tenDq.value / value)];
  });
  return Math.sqrt(misfits.reduce((sum, misfit) => sum + misfit ** 2, 0) / misfits.length);
}

/** The library with every field factor f of a ligand too high by that share, and unsure of it by 10 %. */
function tooStrong(share: number): ParameterLibrary {
  const values = Object.fromEntries(
    [...defaultLibrary.ligands].flatMap(([id, { f }]) =>
      typeof f.value === 'number'
        ? [
            [
              `ligand.${id}.f`,
              { value: f.value * (1 + share), sigma: 0.1 * f.value, source: 'made wrong on purpose' },
            ],
          ]
        : [],
    ),
  );
  return withParameterSet(defaultLibrary, { values }).library;
}

const seeds = [1, 2, 3, 4, 5, 6, 7, 8];

describe('a recalibration on a random half of the published complexes', () => {
  it('with factors made wrong by 12 % learns from one half what makes the other half better, or declines', () => {
    const wrong = tooStrong(0.12);
    let adopted = 0;
    for (const seed of seeds) {
      const [half, other] = halves(wrong, seed);
      const seen = new Set(half.map(({ composition }) => complexKey(composition)));
      expect(other.some(({ composition }) => seen.has(complexKey(composition)))).toBe(false);
      const result = recalibrate(half, { check: other });
      const [field] = result.parts;
      if (!field!.adopt) {
        expect(field!.statement).toMatch(/^declined: /);
        expect(result.values).toEqual({});
        continue;
      }
      adopted++;
      expect(errorOn(other, result.values)).toBeLessThan(errorOn(other, {}));
      expect(field!.leaveOneOut!.after).toBeLessThan(field!.leaveOneOut!.before);
    }
    expect(adopted).toBeGreaterThanOrEqual(2);
  });

  it('with the factors as published gains nothing worth a change: it declines', () => {
    for (const seed of seeds.slice(0, 4)) {
      const [half, other] = halves(defaultLibrary, seed);
      const result = recalibrate(half, { check: other });
      expect(result.parts[0]!.statement).toMatch(/^declined: leave-one-out error/);
      expect(result.values).toEqual({});
    }
  });
});
