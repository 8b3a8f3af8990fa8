import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { bundleVersion } from './format';
import { readBundle } from './index';

const folder = join(import.meta.dirname, 'fixtures');

/** One file per format version ever written, kept as it was; a reader that changes must still take all of them. */
describe('bundles of every format version that was ever written', () => {
  it('are kept, the current version among them', () => {
    expect(readdirSync(folder)).toEqual(
      Array.from({ length: bundleVersion }, (_, index) => `format-${index + 1}.json`),
    );
  });

  it('format 1 still reads, with every row', () => {
    const reading = readBundle(readFileSync(join(folder, 'format-1.json')));
    if (!reading.ok) throw new Error(reading.problems[0]!.message);
    const { projects, candidates, frozenPredictions, samples } = reading.content;
    expect(projects[0]!.name).toBe('Liquid filter µ');
    expect(candidates[0]!.composition.ligands).toEqual({ nh3: 6 });
    expect(frozenPredictions[0]!.prediction).toEqual({ tenDq: { value: 10_900, sigma: 650 } });
    expect(samples[0]!.batch).toBe('MK-3');
  });
});
