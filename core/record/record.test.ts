import { describe, expect, it } from 'vitest';
import { fromBase64, toBase64 } from './base64';
import { curveRow, isIntactCurve } from './curve';
import { bytesOfFile, storeFile } from './file';
import { measurementSchema, noConditions, type Measurement } from './measurement';
import { continuesHistory, correctMeasurement, currentContent } from './revisions';
import { fileNameSchema } from './uncertain';

const at = '2026-03-01T09:00:00Z';
const note = (remark: string) => ({
  kind: 'note' as const,
  conditions: noConditions,
  remark,
  attachments: [],
});
const measurement: Measurement = {
  id: 'm1',
  revision: 0,
  createdAt: at,
  updatedAt: at,
  deletedAt: null,
  projectId: 'p1',
  candidateId: 'c1',
  sampleId: null,
  frozenPredictionId: null,
  revisions: [{ number: 0, at, by: 'AB', why: '', content: note('clear solution') }],
};

describe('a measurement', () => {
  it('keeps its former states when it is corrected', () => {
    const corrected = correctMeasurement(measurement, {
      at,
      by: 'CD',
      why: 'wrong vial',
      content: note('turbid'),
    });
    expect(corrected.revisions.map((each) => each.content.remark)).toEqual(['clear solution', 'turbid']);
    expect(currentContent(corrected).remark).toBe('turbid');
    expect(measurement.revisions).toHaveLength(1);
    expect(continuesHistory(measurement, corrected)).toBe(true);
    expect(continuesHistory(corrected, measurement)).toBe(false);
    expect(measurementSchema.parse(corrected)).toEqual(corrected);
  });

  it('is not corrected without a reason', () => {
    expect(() => correctMeasurement(measurement, { at, by: 'CD', why: '  ', content: note('x') })).toThrow(
      'a correction needs its reason',
    );
  });

  it('with gaps in its history is refused', () => {
    const broken = { ...measurement, revisions: [{ ...measurement.revisions[0]!, number: 3 }] };
    expect(measurementSchema.safeParse(broken).error?.issues[0]?.path).toEqual(['revisions', 0, 'number']);
  });
});

describe('content that is known by its hash', () => {
  it('shows when a number was changed', () => {
    const curve = curveRow({
      kind: 'curve',
      xUnit: 'nm',
      yUnit: 'absorbance',
      x: [400, 410],
      y: [0.1, null],
    });
    expect(isIntactCurve(curve)).toBe(true);
    expect(isIntactCurve({ ...curve, y: [0.1, 0.2] })).toBe(false);
  });

  it('comes back byte for byte, or is reported as missing or damaged', () => {
    const bytes = Uint8Array.from({ length: 1000 }, (_, i) => (i * 37) % 256);
    const file = storeFile(bytes, 'text/plain');
    expect(bytesOfFile(file)).toEqual(bytes);
    expect(bytesOfFile({ ...file, base64: null })).toBe('missing');
    expect(bytesOfFile({ ...file, base64: file.base64!.replace('A', 'B') })).toBe('damaged');
  });

  it('is never labelled with a path', () => {
    for (const name of ['../x', 'a/b', 'a\\b', '..', 'a\u0000b', '']) {
      expect(fileNameSchema.safeParse(name).success).toBe(false);
    }
    expect(fileNameSchema.safeParse('run 3 (µ).jdx').success).toBe(true);
  });
});

describe('base64', () => {
  it('agrees with the test vectors of RFC 4648, section 10', () => {
    const vectors = {
      '': '',
      f: 'Zg==',
      fo: 'Zm8=',
      foo: 'Zm9v',
      foob: 'Zm9vYg==',
      fooba: 'Zm9vYmE=',
      foobar: 'Zm9vYmFy',
    };
    for (const [plain, coded] of Object.entries(vectors)) {
      expect(toBase64(new TextEncoder().encode(plain))).toBe(coded);
      expect(new TextDecoder().decode(fromBase64(coded)!)).toBe(plain);
    }
  });

  it('refuses other spellings of the same bytes', () => {
    for (const text of ['Zg=', 'Zh==', 'Z===', 'Zm9*', 'Zm9é', '====']) expect(fromBase64(text)).toBeNull();
  });
});
