import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { readSpectrumFile } from './readSpectrumFile';
import type { SpectrumReading } from './types';

// Invented files with their expected results: see core/testing/spectra/PROVENANCE.md.
const folder = join(import.meta.dirname, '../../testing/spectra');
const bytesOf = (name: string) => new Uint8Array(readFileSync(join(folder, name)));

interface ExpectedSpectrum {
  name?: string | null;
  x: number[];
  y: (number | null)[];
  xUnits?: string;
  yUnits?: string;
  saturated?: number[];
}
interface Expected {
  outcome: string;
  reason?: string;
  blocks?: ExpectedSpectrum[];
  spectra?: ExpectedSpectrum[];
  x?: number[];
  y?: number[];
  xUnit?: string;
  yUnit?: string;
  encoding?: string;
  eol?: string;
  delimiter?: string;
  decimal?: string;
  fileOrder?: string;
  metadata?: Record<string, string>;
  warnings?: string[];
}
const expectedOf = (kind: string) =>
  JSON.parse(readFileSync(join(folder, kind, 'expected.json'), 'utf8')) as Record<string, Expected>;

const allowed: Record<string, SpectrumReading['outcome'][]> = {
  ok: ['ok'],
  ok_with_warning: ['warning'],
  ask: ['ask'],
  error: ['error'],
  error_or_warning: ['error', 'warning'],
  error_or_null: ['error', 'warning'],
  error_or_csv: ['error', 'ok'],
  ask_or_ok: ['ask', 'ok'],
  ok_or_ask: ['ok', 'ask'],
};
const unitNames: Record<string, string> = {
  percentT: 'percent-transmittance',
  'percent transmittance': 'percent-transmittance',
};

function compare(reading: SpectrumReading, expected: Expected) {
  expect(allowed[expected.outcome]).toContain(reading.outcome);
  if (reading.outcome === 'error') {
    expect(reading.spectra).toEqual([]);
    expect(reading.error?.message).toMatch(/\w+ \w+ \w+/);
    return;
  }
  const wanted = expected.blocks ?? expected.spectra ?? (expected.x ? [expected as ExpectedSpectrum] : []);
  if (wanted.length > 0) expect(reading.spectra).toHaveLength(wanted.length);
  for (const [i, want] of wanted.entries()) {
    const got = reading.spectra[i]!;
    const up = want.x.length < 2 || want.x[0]! < want.x.at(-1)!;
    const order = <T>(values: T[]) => (up ? values : values.toReversed());
    expect(got.x.length).toBe(want.x.length);
    order(want.x).forEach((x, k) => expect(got.x[k]).toBeCloseTo(x, 9));
    order(want.y).forEach((y, k) =>
      y === null ? expect(got.y[k]).toBeNull() : expect(got.y[k]).toBeCloseTo(y, 12),
    );
    for (const k of want.saturated ?? []) expect(got.y[k]).toBeNull();
    const [xUnit, yUnit] = [want.xUnits ?? expected.xUnit, want.yUnits ?? expected.yUnit];
    if (xUnit) expect(got.xUnit).toBe(xUnit);
    if (yUnit) expect(got.yUnit).toBe(unitNames[yUnit] ?? yUnit);
    if (want.name !== undefined && expected.spectra) expect(got.name).toBe(want.name);
    if (expected.metadata) expect(got.metadata).toEqual(expected.metadata);
    if (expected.fileOrder) expect(got.fileOrder).toBe(expected.fileOrder);
  }
  const { encoding, eol, delimiter, decimal } = expected;
  expect(reading.layout).toMatchObject(
    JSON.parse(JSON.stringify({ encoding, eol, delimiter, decimal })) as object,
  );
  if (expected.warnings)
    expect(reading.warnings.length > 0).toBe(expected.warnings.length > 0 || /_or_/.test(expected.outcome));
}

for (const kind of ['jcamp', 'csv']) {
  const expected = expectedOf(kind);
  describe(`the ${kind} files`, () => {
    it('are all described', () => {
      const names = readdirSync(join(folder, kind)).filter((name) => name !== 'expected.json');
      expect(names.sort()).toEqual(Object.keys(expected).sort());
    });
    it.each(Object.keys(expected))('%s is read as expected or refused as expected', (name) => {
      const started = performance.now();
      const reading = readSpectrumFile(bytesOf(`${kind}/${name}`));
      expect(performance.now() - started).toBeLessThan(2000);
      compare(reading, expected[name]!);
    });
  });
}

describe('the reasons given', () => {
  it.each([
    ['jcamp/m01_dif_check_wrong.jdx', 'y-check', /line 18/],
    ['jcamp/m04_huge_npoints.jdx', 'point-count', /2000000000/],
    ['jcamp/m05_binary.jdx', 'binary', /not text/],
    ['jcamp/m06_empty.jdx', 'empty', /empty/],
    ['jcamp/m09_yfactor_bad.jdx', 'bad-number', /YFACTOR=abc/],
    ['jcamp/m10_dropped_line.jdx', 'x-check', /line 20/],
    ['jcamp/m14_dup_bomb.jdx', 'repeat-count', /line 16/],
    ['jcamp/m17_xfactor_zero.jdx', 'bad-number', /XFACTOR/],
    ['csv/x02_no_numbers.csv', 'no-table', /table/],
    ['csv/x03_empty.csv', 'empty', /empty/],
    ['csv/x04_one_point.csv', 'too-few-points', /1 point/],
    ['csv/x05_nonmonotonic.csv', 'not-monotonic', /line 8/],
    ['csv/x06_nul_bytes.csv', 'binary', /not text/],
  ])('of %s: %s', (name, code, words) => {
    const { error } = readSpectrumFile(bytesOf(name));
    expect(error?.code).toBe(code);
    expect(error?.message).toMatch(words);
  });
});
