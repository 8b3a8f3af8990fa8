import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { estimateField } from '../../estimation';
import { complexKey, defaultLibrary, withParameterSet } from '../../library';
import { gaussianUpdate } from '../../numerics/leastSquaresUpdate';
import { parameterSetSchema } from '../../record/project';
import type { Composition } from '../../record/composition';
import { seeded } from '../../testing/seeded';
import { readMeasuredSet } from '../measuredSet';
import { observationOf, parameterSetFrom, recalibrate, type Observation } from './index';

describe('shrinkage to the literature', () => {
  // Arithmetic: prior f 1.25 +- 8 %; 10Dq of a nickel(II) complex 11 200 over g 8700 is 1.287 +- 2 % measured and 5 % for the
  // model; precisions 156.25 and 344.8 add up: f = 1.275 +- 4.5 %.
  it('weighs a prior of 1.25 +- 8 % and a measured 1.287 +- 5.4 % to 1.275 +- 4.5 %', () => {
    const { shift, narrowed } = gaussianUpdate(
      [[0.08]],
      [Math.log(11_200 / 8700 / 1.25)],
      [0.02 ** 2 + 0.05 ** 2],
    );
    expect(Math.abs(1.25 * Math.exp(0.08 * shift[0]!) - 1.275)).toBeLessThan(0.001);
    expect(0.08 * narrowed[0]!).toBeCloseTo(0.0447, 4);
  });

  it('gives an outlier less weight and leaves ordinary observations alone', () => {
    const design = [[0.05], [0.05], [0.05], [0.05]];
    const { weights, shift } = gaussianUpdate(design, [0.01, 0.012, 0.008, 0.4], [1e-4, 1e-4, 1e-4, 1e-4]);
    expect(weights[3]).toBeLessThan(0.1);
    expect(Math.min(...weights.slice(0, 3))).toBeGreaterThan(0.8);
    expect(0.05 * shift[0]!).toBeLessThan(0.04);
  });

  it('without observations changes nothing', () => {
    expect(gaussianUpdate([], [], [])).toMatchObject({ shift: [], narrowed: [] });
  });
});

const octahedral = (metal: string, oxidationState: number, ligands: Record<string, number>): Composition => ({
  metal,
  oxidationState,
  geometry: 'octahedral',
  ligands,
  isomer: null,
});
/** Measurements that a world with another f of one ligand would give. */
function measuredWith(f: number, seed: number, compositions: readonly Composition[]): Observation[] {
  const random = seeded(seed);
  const source = 'simulated';
  const { library } = withParameterSet(defaultLibrary, {
    values: { 'ligand.im.f': { value: f, sigma: 0.01, source } },
  });
  return compositions.map((composition, i) => {
    const value =
      estimateField(composition, library)!.fields.middle.value! * Math.exp(0.01 * random.normal());
    return {
      id: `s${i}`,
      composition,
      spin: null,
      tenDq: { value, u: 0.01 * value },
      B: null,
      library: defaultLibrary,
      source,
    };
  });
}
const imidazoles = [
  octahedral('Ni', 2, { im: 6 }),
  octahedral('Ni', 2, { im: 4, cl: 2 }),
  octahedral('Cr', 3, { im: 6 }),
  octahedral('V', 3, { im: 6 }),
  octahedral('Ni', 2, { im: 2, h2o: 4 }),
  octahedral('Cr', 3, { im: 3, cl: 3 }),
];

describe('a recalibration', () => {
  const before = estimateField(imidazoles[2]!, defaultLibrary)!.fields.middle.value!;
  const truth = before * 1.12;
  const f = 1.12 * (before / defaultLibrary.ions.get('Cr3+')!.g.value!);
  const observations = measuredWith(f, 3, imidazoles);
  const result = recalibrate(observations);

  it('learns a ligand that the literature has wrong by 12 %, and the left-out complexes are predicted better', () => {
    const [field] = result.parts;
    expect(field!.adopt).toBe(true);
    expect(field!.leaveOneOut!.after).toBeLessThan(0.5 * field!.leaveOneOut!.before);
    const change = field!.changes.find((each) => each.key === 'ligand.im.f')!;
    expect(Math.abs(change.after.value / f - 1)).toBeLessThan(0.03);
    expect(change.after.sigma).toBeLessThan(change.before.sigma);
  });

  it('improves a relative that was not measured', () => {
    const relative = octahedral('Co', 2, { im: 6 });
    const library = withParameterSet(defaultLibrary, { values: result.values }).library;
    const [old, fresh] = [defaultLibrary, library].map((each) => estimateField(relative, each)!.fields.high);
    expect(fresh!.value! / old!.value!).toBeGreaterThan(1.06);
  });

  it('of B declines where there is nothing to learn from', () => {
    expect(result.parts[1]).toMatchObject({
      quantity: 'B',
      adopt: false,
      statement: expect.stringContaining('fewer than') as string,
    });
  });

  it('becomes a new parameter set with author, reason, parent and a hash of its own; the old one stays', () => {
    const adoption = {
      id: 'set-2',
      projectId: 'p1',
      name: 'after six imidazoles',
      author: 'AB',
      reason: 'six complexes measured in spring',
      at: '2026-04-01T10:00:00Z',
      libraryVersion: defaultLibrary.version,
      parent: null,
      keepMeasuredComplexes: true,
    };
    const set = parameterSetFrom(result, observations, adoption);
    expect(parameterSetSchema.parse(set)).toEqual(set);
    expect(set.informedBy).toContain(complexKey(imidazoles[0]!));
    expect(set.hash).not.toBe(
      parameterSetFrom(result, observations, { ...adoption, without: new Set(['ligand.im.f']) }).hash,
    );
    const { library, unused } = withParameterSet(defaultLibrary, set);
    expect(unused).toEqual([]);
    const own = estimateField(imidazoles[2]!, library)!.fields.middle;
    expect(own.route).toBe('measured-complex');
    expect(Math.abs(own.value! / truth - 1)).toBeLessThan(0.04);
    expect(estimateField(imidazoles[2]!, defaultLibrary)!.fields.middle.value).toBe(before);
  });

  it('names an outlier and does not follow it', () => {
    const wrong = observations.map((each, i) =>
      i === 1 ? { ...each, tenDq: { value: each.tenDq!.value * 1.5, u: each.tenDq!.u } } : each,
    );
    const [field] = recalibrate(wrong).parts;
    expect(field!.outliers.map((each) => each.id)).toEqual(['s1']);
    const change = field!.changes.find((each) => each.key === 'ligand.im.f')!;
    expect(Math.abs(change.after.value / f - 1)).toBeLessThan(0.05);
  });

  it('is declined where noise is all there is to learn', () => {
    const noise = measuredWith(before / defaultLibrary.ions.get('Cr3+')!.g.value!, 7, imidazoles);
    const [field] = recalibrate(noise).parts;
    expect(field!.adopt && field!.leaveOneOut!.after > field!.leaveOneOut!.before).toBe(false);
  });
});

describe('on published complexes', () => {
  // Band positions and 10Dq with their sources: core/testing/measured. Only entries that may inform parameters.
  const raw = JSON.parse(
    readFileSync(join(import.meta.dirname, '../../testing/measured/data/published.json'), 'utf8'),
  ) as { complexes: { id: string; dElectrons: number; published: { tenDq: number | null } }[] };
  const set = readMeasuredSet(raw);
  if (!set.ok) throw new Error('the published set is not readable');
  const electrons = new Map(raw.complexes.map((entry) => [entry.id, entry.dElectrons]));
  const tuning = set.value
    .filter((complex) => complex.useForTuning && complex.tenDq !== null)
    .map((complex) => observationOf(complex, electrons.get(complex.id)!))
    .filter((each) => each !== null);

  it('a random half either predicts the other half better or the recalibration is declined with the reason', () => {
    for (const seed of [1, 2]) {
      const random = seeded(seed);
      const shuffled = tuning
        .map((each) => ({ each, key: random.next() }))
        .sort((a, b) => a.key - b.key)
        .map(({ each }) => each);
      const half = shuffled.length >> 1;
      const { parts } = recalibrate(shuffled.slice(0, half), { check: shuffled.slice(half) });
      for (const part of parts) {
        if (part.adopt) expect(part.check!.after).toBeLessThan(part.check!.before);
        else expect(part.statement).toMatch(/declined|decide nothing/);
      }
    }
  });
});
