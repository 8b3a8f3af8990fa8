import { describe, expect, it } from 'vitest';
import { curveRow } from '../curve';
import { noConditions, type Measurement } from '../measurement';
import type { Candidate } from '../project';
import { correctMeasurement } from '../revisions';
import { emptyContent, mergeBundles, type BundleContent } from './index';

const at = '2026-03-01T09:00:00Z';
const later = '2026-03-02T09:00:00Z';
const row = (id: string) => ({ id, revision: 0, createdAt: at, updatedAt: at, deletedAt: null });
const candidate: Candidate = {
  ...row('c1'),
  projectId: 'p1',
  name: 'first',
  composition: { metal: 'Ni', oxidationState: 2, geometry: 'octahedral', ligands: { nh3: 6 } },
  counterIon: null,
  solvate: null,
  concentration_mM: null,
  path_cm: null,
  tags: [],
  starred: false,
  archived: false,
  notes: '',
};
const measurement: Measurement = {
  ...row('m1'),
  projectId: 'p1',
  candidateId: 'c1',
  sampleId: null,
  frozenPredictionId: null,
  revisions: [
    {
      number: 0,
      at,
      by: 'AB',
      why: '',
      content: {
        kind: 'observed colour',
        conditions: noConditions,
        remark: '',
        attachments: [],
        words: 'blue',
        lightSource: null,
        lab: null,
      },
    },
  ],
};
const corrected = (words: string): Measurement =>
  correctMeasurement(measurement, {
    at: later,
    by: 'CD',
    why: 'looked again in daylight',
    content: { ...measurement.revisions[0]!.content, words } as Measurement['revisions'][0]['content'],
  });
const holding = (content: Partial<BundleContent>): BundleContent => ({ ...emptyContent(), ...content });
const withCandidate = (change: Partial<Candidate>) =>
  holding({ candidates: [{ ...candidate, ...change, revision: 1, updatedAt: later }] });

describe('merging two copies of a project', () => {
  const base = holding({ candidates: [candidate] });

  it('takes changes of different fields from both sides without a question', () => {
    const merged = mergeBundles(base, withCandidate({ name: 'renamed' }), withCandidate({ starred: true }));
    expect(merged.conflicts).toEqual([]);
    expect(merged.content.candidates).toMatchObject([{ name: 'renamed', starred: true, revision: 2 }]);
    expect(merged.taken).toEqual([{ table: 'candidates', id: 'c1', what: 'changed' }]);
  });

  it('lists a field changed on both sides and keeps mine until told otherwise', () => {
    const sides = [base, withCandidate({ name: 'one' }), withCandidate({ name: 'two' })] as const;
    const merged = mergeBundles(...sides);
    expect(merged.conflicts).toEqual([
      {
        table: 'candidates',
        id: 'c1',
        field: 'name',
        base: 'first',
        mine: 'one',
        theirs: 'two',
        kept: 'mine',
      },
    ]);
    expect(merged.content.candidates[0]?.name).toBe('one');
    expect(mergeBundles(...sides, () => 'theirs').content.candidates[0]?.name).toBe('two');
  });

  it('without a common base asks about every field that differs and keeps rows that only one side has', () => {
    const other = { ...candidate, id: 'c2' };
    const merged = mergeBundles(null, base, holding({ candidates: [{ ...candidate, name: 'x' }, other] }));
    expect(merged.conflicts.map((each) => each.field)).toEqual(['name']);
    expect(merged.content.candidates.map((each) => each.id)).toEqual(['c1', 'c2']);
  });

  it('joins the histories of a measurement where one continues the other, whichever side is ahead', () => {
    const [short, long] = [
      holding({ measurements: [measurement] }),
      holding({ measurements: [corrected('violet')] }),
    ];
    for (const merged of [mergeBundles(null, short, long), mergeBundles(null, long, short)]) {
      expect(merged.conflicts).toEqual([]);
      expect(merged.content.measurements[0]?.revisions).toHaveLength(2);
    }
  });

  it('asks where two people corrected the same measurement differently', () => {
    const merged = mergeBundles(
      holding({ measurements: [measurement] }),
      holding({ measurements: [corrected('violet')] }),
      holding({ measurements: [corrected('green')] }),
    );
    expect(merged.conflicts).toMatchObject([{ table: 'measurements', field: 'revisions', kept: 'mine' }]);
  });

  it('never takes a changed curve silently, even where only the other side changed it', () => {
    const curve = curveRow({ kind: 'curve', xUnit: 'nm', yUnit: 'absorbance', x: [400, 500], y: [0.1, 0.2] });
    const merged = mergeBundles(
      holding({ curves: [curve] }),
      holding({ curves: [curve] }),
      holding({ curves: [{ ...curve, y: [0.1, 0.3] }] }),
    );
    expect(merged.conflicts).toMatchObject([{ table: 'curves', field: 'y' }]);
    expect(merged.content.curves).toEqual([curve]);
  });

  it('keeps a row that one side removed and the other changed, and says so', () => {
    const merged = mergeBundles(base, emptyContent(), withCandidate({ name: 'still needed' }));
    expect(merged.conflicts).toMatchObject([{ field: null, mine: null, kept: 'theirs' }]);
    expect(merged.content.candidates).toHaveLength(1);
    expect(mergeBundles(base, emptyContent(), base).content.candidates).toEqual([]);
  });

  it('of equal copies changes nothing', () => {
    expect(mergeBundles(null, base, base)).toEqual({ content: base, conflicts: [], taken: [] });
  });
});
