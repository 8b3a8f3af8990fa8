import { describe, expect, it } from 'vitest';
import type { CurveData } from '../../record/curve';
import type { TreatmentStep } from '../../record/treatment';
import { localFit } from './localPolynomial';
import { absorbanceSanity } from './sanity';
import { stepsForFitting, treat } from './treat';
import { emissionInWavenumber, inWavenumber } from './wavenumber';

const curve = (x: number[], y: (number | null)[], change: Partial<CurveData> = {}): CurveData => ({
  kind: 'curve',
  xUnit: 'nm',
  yUnit: 'absorbance',
  x,
  y,
  ...change,
});
const grid = (from: number, to: number, step: number) =>
  Array.from({ length: Math.round((to - from) / step) + 1 }, (_, i) => from + i * step);

describe('molar absorptivity', () => {
  // Worked example by the law of propagation of uncertainty (JCGM 100, GUM, 5.1.6): A 0.650(5), c 0.0500(5) mol/L,
  // l 1.000(5) cm give 13.0 with a relative uncertainty of 1.36 %, 0.18.
  it('of A 0.650(5), c 50.0(5) mM, l 1.000(5) cm is 13.0(2) L/(mol cm)', () => {
    const treated = treat(curve([500, 501], [0.65, 0.65]), [
      {
        op: 'to molar absorptivity',
        concentration_mM: { value: 50, u: 0.5 },
        path_cm: { value: 1, u: 0.005 },
        absorbance_u: 0.005,
      },
    ]);
    expect(treated.yUnit).toBe('molar-absorptivity');
    expect(treated.y[0]).toBeCloseTo(13.0, 10);
    expect(treated.u![0]! / treated.y[0]!).toBeCloseTo(0.01357, 4);
  });

  it('says which uncertainty nobody stated', () => {
    const treated = treat(curve([500, 501], [0.65, null]), [
      {
        op: 'to molar absorptivity',
        concentration_mM: { value: 50, u: null },
        path_cm: { value: 1, u: null },
        absorbance_u: 0.005,
      },
    ]);
    expect(treated.remarks).toEqual([expect.stringContaining('concentration and path')]);
    expect(treated.y[1]).toBeNull();
  });
});

describe('transmittance', () => {
  it('of 10 % is absorbance 1, and no light has no absorbance', () => {
    const treated = treat(curve([1, 2, 3], [10, 100, 0], { yUnit: 'percent-transmittance' }), [
      { op: 'to absorbance' },
    ]);
    expect(treated.y).toEqual([1, -0, null]);
    expect(treated.remarks).toHaveLength(1);
    expect(treat(curve([1], [0.1], { yUnit: 'transmittance' }), [{ op: 'to absorbance' }]).y[0]).toBeCloseTo(
      1,
      12,
    );
  });

  it('goes there and back', () => {
    const treated = treat(curve([1, 2], [0.3, 1.7]), [
      { op: 'to percent transmittance' },
      { op: 'to absorbance' },
    ]);
    treated.y.forEach((y, i) => expect(y).toBeCloseTo([0.3, 1.7][i]!, 12));
  });
});

describe('background', () => {
  const x = grid(400, 800, 5);
  const band = x.map((v) => 0.8 * Math.exp(-(((v - 600) / 40) ** 2)));

  it('that slopes is taken off through points where nothing absorbs', () => {
    const raw = curve(
      x,
      band.map((b, i) => b + 0.02 + 1e-4 * x[i]!),
    );
    const treated = treat(raw, [
      {
        op: 'subtract baseline',
        form: 'linear',
        ranges: [
          [400, 440],
          [760, 800],
        ],
      },
    ]);
    treated.y.forEach((y, i) => expect(y).toBeCloseTo(band[i]!, 6));
  });

  it('of small scattering particles is found with its exponent of 4 (Rayleigh)', () => {
    const raw = curve(
      x,
      band.map((b, i) => b + 0.05 * (500 / x[i]!) ** 4),
    );
    const ranges: [number, number][] = [
      [400, 440],
      [760, 800],
    ];
    const treated = treat(raw, [{ op: 'subtract scatter', exponent: null, ranges }]);
    treated.y.forEach((y, i) => expect(y).toBeCloseTo(band[i]!, 5));
    expect(treated.remarks[0]).toContain('^4.00');
    expect(treat(raw, [{ op: 'subtract scatter', exponent: 4, ranges }]).y[40]).toBeCloseTo(0.8, 5);
  });

  it('measured as a blank is subtracted, interpolated between its own points, and not beyond them', () => {
    const blank = curve([390, 700], [0.039, 0.07]);
    const treated = treat(
      curve(
        x,
        band.map((b, i) => b + 1e-4 * x[i]!),
      ),
      [{ op: 'subtract blank', curveId: 'b' }],
      () => blank,
    );
    expect(treated.y[40]).toBeCloseTo(0.8, 10);
    expect(treated.y.at(-1)).toBeNull();
    expect(treated.remarks[0]).toContain('outside the blank');
  });

  it('in other units than the curve is refused with the step named', () => {
    const blank = curve([390, 900], [1, 1], { yUnit: 'transmittance' });
    expect(() =>
      treat(
        curve(x, band),
        [{ op: 'to percent transmittance' }, { op: 'subtract blank', curveId: 'b' }],
        () => blank,
      ),
    ).toThrow(expect.objectContaining({ field: 'treatment[1]' }) as Error);
  });
});

describe('smoothing', () => {
  // Savitzky and Golay, Anal. Chem. 36, 1627 (1964), table I: quadratic, 5 points, (-3 12 17 12 -3) / 35; table IV,
  // second derivative: (2 -1 -2 -1 2) / 7.
  it('of equally spaced points has the published weights', () => {
    const weights = (pick: 'value' | 'second') =>
      [0, 1, 2, 3, 4].map(
        (i) =>
          localFit(
            [0, 1, 2, 3, 4],
            [0, 1, 2, 3, 4].map((k) => (k === i ? 1 : 0)),
            2,
            5,
            2,
          )[pick],
      );
    weights('value').forEach((w, i) => expect(w * 35).toBeCloseTo([-3, 12, 17, 12, -3][i]!, 10));
    weights('second').forEach((w, i) => expect(w * 7).toBeCloseTo([2, -1, -2, -1, 2][i]!, 10));
  });

  it('leaves a polynomial of its degree as it is, also on uneven points and at the ends', () => {
    const x = [1, 2, 4, 5, 7, 11, 12, 13];
    const y = x.map((v) => 3 - 2 * v + 0.5 * v * v);
    x.forEach((v, i) => {
      const fit = localFit(x, y, i, 5, 2);
      expect(fit.value).toBeCloseTo(y[i]!, 8);
      expect(fit.first).toBeCloseTo(-2 + v, 8);
      expect(fit.second).toBeCloseTo(1, 8);
    });
  });

  it('never reaches the points that a fit is made on, and the raw curve stays as it was', () => {
    const raw = curve([1, 2, 3, 4, 5], [0.1, 0.5, 0.2, 0.6, 0.3]);
    const copy = structuredClone(raw);
    const steps: TreatmentStep[] = [
      { op: 'smooth', window: 5, degree: 2 },
      { op: 'leave out', ranges: [[4.5, 9]], why: 'lamp change' },
    ];
    expect(treat(raw, steps).y[1]).not.toBe(0.5);
    expect(treat(raw, stepsForFitting(steps)).y).toEqual([0.1, 0.5, 0.2, 0.6, null]);
    expect(raw).toEqual(copy);
  });

  it('replayed from its record gives the same numbers', () => {
    const raw = curve(
      grid(400, 500, 1),
      grid(400, 500, 1).map((x) => Math.sin(x)),
    );
    const steps = JSON.parse(
      JSON.stringify([{ op: 'derivative', order: 2, window: 9, degree: 3 }]),
    ) as TreatmentStep[];
    expect(treat(raw, steps)).toEqual(treat(raw, steps));
  });
});

describe('points', () => {
  it('that share one x are merged as asked', () => {
    const raw = curve([1, 2, 2, 3], [0, 1, 3, 0]);
    const y = (keep: 'mean' | 'first' | 'last') => treat(raw, [{ op: 'merge equal x', keep }]).y[1];
    expect([y('mean'), y('first'), y('last')]).toEqual([2, 1, 3]);
  });

  it('above a chosen absorbance become missing, not zero', () => {
    expect(treat(curve([1, 2], [0.5, 2.5]), [{ op: 'leave out above', absorbance: 2 }]).y).toEqual([
      0.5,
      null,
    ]);
  });
});

describe('the size of the absorbance', () => {
  // Common practice; 3.2 means that 0.06 % of the light comes through.
  it('is remarked on above 2, above 1 and below 0.1', () => {
    expect(absorbanceSanity(curve([1, 2], [0.3, 3.2])).map((each) => each.code)).toEqual(['beyond trust']);
    expect(absorbanceSanity(curve([1, 2], [0.3, 1.4])).map((each) => each.code)).toEqual(['high']);
    expect(absorbanceSanity(curve([1, 2], [0.03, 0.05])).map((each) => each.code)).toEqual(['weak']);
    expect(absorbanceSanity(curve([1, 2], [0.3, 0.8]))).toEqual([]);
  });
});

describe('the axis', () => {
  it('in nm becomes wavenumbers in ascending order with the ordinates beside them', () => {
    expect(inWavenumber(curve([400, 500], [0.1, 0.2]))).toEqual({
      wavenumber_cm1: [20_000, 25_000],
      y: [0.2, 0.1],
    });
    expect(inWavenumber(curve([1, 2], [0, 0], { xUnit: 'unknown' }))).toBeNull();
  });

  it('of an emission spectrum carries the factor lambda squared, which moves the maximum', () => {
    // I(nu) constant in nu means I(lambda) = const / lambda^2.
    const lambda = [500, 600, 700];
    const { y } = emissionInWavenumber(
      lambda,
      lambda.map((l) => 1 / (l / 1000) ** 2),
    );
    y.forEach((value) => expect(value).toBeCloseTo(1, 12));
  });
});
