import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Candidate, FrozenPrediction, Project } from '../project';
import { readBundle, writeBundle, type BundleContent } from './index';

const at = '2026-03-01T09:00:00Z';
const row = (id: string) => ({ id, revision: 0, createdAt: at, updatedAt: at, deletedAt: null });

const project = (id: string): Project => ({
  ...row(id),
  name: 'Liquid filter µ, Größe "A"',
  notes: '',
  demo: false,
  targetLab: [60, 20, -30],
  parameterSetId: null,
});
const candidate = (id: string, projectId: string): Candidate => ({
  ...row(id),
  projectId,
  name: 'hexaamminenickel',
  composition: { metal: 'Ni', oxidationState: 2, geometry: 'octahedral', ligands: { nh3: 6 } },
  counterIon: 'Cl-',
  solvate: null,
  concentration_mM: 20,
  path_cm: 1,
  tags: ['first round'],
  starred: true,
  archived: false,
  notes: '',
});
const frozen = (id: string, candidateId: string): FrozenPrediction => ({
  ...row(id),
  projectId: 'p1',
  candidateId,
  frozenAt: at,
  reason: 'before the first measurement',
  parameterHash: '0'.repeat(64),
  modelVersion: '1',
  prediction: { tenDq: { value: 10_900, sigma: 650 } },
});
const content: Partial<BundleContent> = {
  projects: [project('p1')],
  candidates: [candidate('c2', 'p1'), candidate('c1', 'p1')],
  frozenPredictions: [frozen('f1', 'c1')],
};

/** Reads, expects a refusal and gives the problems. */
function refusal(input: string | Uint8Array) {
  const reading = readBundle(input);
  if (reading.ok) throw new Error('was accepted');
  return reading;
}
const edited = (edit: (bundle: { content: Record<string, Record<string, unknown>[]> }) => void): string => {
  const bundle = JSON.parse(writeBundle(content)) as Parameters<typeof edit>[0];
  edit(bundle);
  return JSON.stringify(bundle);
};

describe('a project bundle', () => {
  it('comes back equal, and a second export has the same bytes', () => {
    const text = writeBundle(content);
    const reading = readBundle(new TextEncoder().encode(`\uFEFF${text}`));
    if (!reading.ok) throw new Error(JSON.stringify(reading.problems));
    expect(reading.content.projects).toEqual(content.projects);
    expect(reading.content.candidates.map((each) => each.id)).toEqual(['c1', 'c2']);
    expect(reading.content.frozenPredictions).toEqual(content.frozenPredictions);
    expect(writeBundle(reading.content)).toBe(text);
  });

  it('has one row per line, so that two versions can be compared line by line', () => {
    const lines = writeBundle(content).split('\n');
    expect(lines.filter((line) => line.includes('"id":"c1"') && line.includes('"nh3":6'))).toHaveLength(1);
  });

  it('is refused with the place named when a row does not fit', () => {
    const { problems, salvage } = refusal(
      edited((bundle) => {
        bundle.content.candidates![0]!.composition = { metal: 'Ni', oxidationState: 'two' };
      }),
    );
    expect(problems.map((each) => each.field)).toContain('candidates[0].composition.oxidationState');
    expect(salvage?.candidates.map((each) => each.id)).toEqual(['c2']);
  });

  it('is refused when two rows share an id', () => {
    const { problems } = refusal(edited((bundle) => (bundle.content.candidates![1]!.id = 'c1')));
    expect(problems[0]).toMatchObject({ code: 'integrity', field: 'candidates[1].id' });
  });

  it('is refused when a link leads nowhere', () => {
    const { problems, salvage } = refusal(edited((bundle) => (bundle.content.projects![0]!.id = 'other')));
    expect(problems.map((each) => each.field)).toContain('candidates.c1.projectId');
    expect(salvage?.candidates).toEqual([]);
  });

  it('is refused when a digit was changed by hand, and its rows are offered for a look', () => {
    const { problems, salvage } = refusal(
      edited((bundle) => (bundle.content.candidates![0]!.concentration_mM = 21)),
    );
    expect(problems).toMatchObject([{ code: 'integrity', field: 'checksum' }]);
    expect(salvage?.candidates).toHaveLength(2);
  });

  it('of a newer format is refused before anything else is looked at', () => {
    expect(refusal('{"format":"spinhue-project","version":99,"content":{"x":[]}}').problems).toMatchObject([
      { code: 'newer-format', field: 'version' },
    ]);
  });

  it('with keys that reach for a prototype, absurd nesting or numbers beyond a double is refused', () => {
    const head = '{"format":"spinhue-project","version":1,"checksum":"","content":{"projects":[';
    expect(refusal(`${head}{"__proto__":{"admin":true}}]}}`).problems[0]).toMatchObject({
      field: 'content.projects[0].__proto__',
    });
    expect(refusal(`${head}${'['.repeat(1000)}${']'.repeat(1000)}]}}`).problems[0]?.code).toBe('too-large');
    expect(refusal(`${head}{"id":1e999}]}}`).problems[0]).toMatchObject({ code: 'not-finite' });
    expect(({} as Record<string, unknown>).admin).toBeUndefined();
  });

  it('that is no bundle at all is refused with words', () => {
    for (const junk of ['', ' ', '[]', 'null', '{', '{"format":"other"}', '"text"', '12']) {
      expect(refusal(junk).problems[0]?.message).toMatch(/\w+ \w+/);
    }
    expect(refusal(new Uint8Array([0xff, 0xfe, 0x00, 0x80])).problems[0]?.code).toBe('malformed-json');
  });

  it('cut off anywhere is refused', () => {
    const text = writeBundle(content);
    for (let length = 0; length < text.length - 2; length += 37) {
      expect(readBundle(text.slice(0, length)).ok).toBe(false);
    }
  });

  it('never makes the reader throw, whatever bytes were changed', () => {
    const bytes = new TextEncoder().encode(writeBundle(content));
    fc.assert(
      fc.property(fc.nat(bytes.length - 1), fc.nat(255), (place, value) => {
        const changed = bytes.slice();
        changed[place] = value;
        const reading = readBundle(changed);
        // Only bytes outside what the checksum covers may change without a word: the white space and the head.
        if (reading.ok) expect(reading.content.candidates).toHaveLength(2);
        else expect(reading.problems.length).toBeGreaterThan(0);
      }),
      { numRuns: 500 },
    );
  });
});
