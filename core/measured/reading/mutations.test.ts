import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, it } from 'vitest';
import { seeded } from '../../testing/seeded';
import { soak } from '../../testing/mutateSpectra';

const folder = join(import.meta.dirname, '../../testing/spectra');
const files = ['jcamp', 'csv'].flatMap((kind) =>
  readdirSync(join(folder, kind))
    .filter((name) => name !== 'expected.json' && name !== 'm18_long_label.jdx')
    .map((name) => new Uint8Array(readFileSync(join(folder, kind, name)))),
);

it('two thousand mutated files are read or refused: no crash, no hang, no NaN, no point lost in silence', () => {
  const result = soak(files, 2000, 1, seeded);
  expect(result.findings.map(({ seed, what }) => ({ seed, what }))).toEqual([]);
  // The mutations must reach past the first checks, or they would test nothing.
  expect(result.outcomes.ok).toBeGreaterThan(200);
  expect(result.outcomes.warning).toBeGreaterThan(100);
  expect(result.outcomes.error).toBeGreaterThan(200);
});
