import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { CurveData } from '../../record/curve';
import { readJcamp } from './read';
import { writeJcamp } from './write';

const header = { title: 'treated spectrum', origin: 'test', owner: 'test' };
const curve = (x: number[], y: (number | null)[], change: Partial<CurveData> = {}): CurveData => ({
  kind: 'curve',
  xUnit: 'nm',
  yUnit: 'absorbance',
  x,
  y,
  ...change,
});

function roundTrip(data: CurveData) {
  const reading = readJcamp(writeJcamp(data, header));
  if (reading.error) throw new Error(reading.error.message);
  return reading;
}

describe('a written JCAMP-DX file', () => {
  it('with an even axis reads back equal, missing points included', () => {
    const x = Array.from({ length: 401 }, (_, i) => 400 + i);
    const y = x.map((v, i) => (i === 7 ? null : Math.round(1e4 * Math.exp(-(((v - 575) / 60) ** 2))) / 1e4));
    const { outcome, spectra } = roundTrip(curve(x, y));
    expect(outcome).toBe('ok');
    expect(spectra[0]).toMatchObject({ x, y, xUnit: 'nm', yUnit: 'absorbance', name: 'treated spectrum' });
  });

  it('with an uneven axis, as after conversion to wavenumber, reads back as pairs', () => {
    const x = [500, 499, 498, 497].map((nm) => 1e7 / nm);
    const { outcome, spectra } = roundTrip(
      curve(x, [0.1, 0.2, 0.3, 0.25], { xUnit: 'cm-1', yUnit: 'molar-absorptivity' }),
    );
    expect(outcome).toBe('ok');
    expect(spectra[0]!.x).toEqual(x);
    expect(spectra[0]!.yUnit).toBe('molar-absorptivity');
  });

  it('of peaks stays peaks', () => {
    expect(roundTrip(curve([380, 545], [0.9, 0.3], { kind: 'peaks' })).spectra[0]).toMatchObject({
      kind: 'peaks',
      x: [380, 545],
    });
  });

  it('has lines of at most 80 characters and cannot be broken by a title', () => {
    const x = Array.from({ length: 200 }, (_, i) => 400 + i / 2);
    const text = writeJcamp(
      curve(
        x,
        x.map((v) => v / 1000),
      ),
      { ...header, title: 'a\n##END=\n$$ b' },
    );
    expect(Math.max(...text.split('\r\n').map((line) => line.length))).toBeLessThanOrEqual(80);
    expect(readJcamp(text).spectra[0]!.x).toHaveLength(200);
  });

  it('is refused without units', () => {
    expect(() => writeJcamp(curve([1, 2], [0, 1], { yUnit: 'unknown' }), header)).toThrow(/units/);
  });

  it('reads back number by number, whatever the numbers', () => {
    fc.assert(
      fc.property(
        fc.array(fc.option(fc.double({ min: -10, max: 1e4, noNaN: true }), { freq: 9 }), {
          minLength: 3,
          maxLength: 60,
        }),
        fc.double({ min: 0.1, max: 5, noNaN: true }),
        fc.boolean(),
        (values, rawStep, even) => {
          const step = even ? Number(rawStep.toPrecision(3)) : rawStep;
          const x = values.map((_, i) => 300 + i * step);
          const y = values.map((value) => (value === 0 ? 0 : value));
          const [spectrum] = roundTrip(curve(x, y, { yUnit: 'molar-absorptivity' })).spectra;
          expect(spectrum!.x).toEqual(x);
          expect(spectrum!.y).toEqual(y);
        },
      ),
      { numRuns: 200 },
    );
  });

  it('keeps every digit of a treated spectrum on an even axis', () => {
    const x = Array.from({ length: 50 }, (_, i) => 400 + i);
    const y = x.map((nm) => Math.exp(-(((nm - 420) / 17) ** 2)) / 0.0499);
    expect(roundTrip(curve(x, y)).spectra[0]).toMatchObject({ x, y });
  });
});
