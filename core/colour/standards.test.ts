import { converter, modeLab65, modeOklab, modeOklch, modeRgb, modeXyz65, toGamut, useMode } from 'culori/fn';
import { describe, expect, it } from 'vitest';
import ciede2000 from '../testing/colour/ciede2000.json';
import { seeded } from '../testing/seeded';
import { adapt } from './chromaticAdaptation';
import { displayColour, linearSrgb, reduceChroma, srgbWhite } from './displayColour';
import { linearToOklab, oklabToLinear } from './oklab';
import { colourDifference, labFromXYZ, viewingWeights } from './index';

[modeRgb, modeXyz65, modeLab65, modeOklab, modeOklch].forEach((mode) => useMode(mode));

describe('CIEDE2000', () => {
  // Sharma, Wu and Dalal 2005, table 1: all 34 pairs, in both orders.
  it.each(ciede2000.pairs.map((pair, index) => [index + 1, pair] as const))(
    'pair %i of Sharma, Wu and Dalal to 1e-4',
    (_number, [L1, a1, b1, L2, a2, b2, difference]) => {
      const [one, other] = [
        [L1!, a1!, b1!],
        [L2!, a2!, b2!],
      ] as unknown as [[number, number, number], [number, number, number]];
      expect(Math.abs(colourDifference(one, other) - difference!)).toBeLessThan(1e-4);
      expect(Math.abs(colourDifference(other, one) - difference!)).toBeLessThan(1e-4);
    },
  );
});

describe('colour spaces, against culori on random colours', () => {
  const random = seeded(7);
  const samples = Array.from({ length: 200 }, () => [random.next(), random.next(), random.next()] as const);
  const toXyz = converter('xyz65');
  const toLab = converter('lab65');
  const toOklab = converter('oklab');

  it('agree in XYZ to sRGB, L*a*b* and OKLab', () => {
    for (const [r, g, b] of samples) {
      const { x, y, z } = toXyz({ mode: 'rgb', r, g, b });
      const xyz = [100 * x, 100 * y, 100 * z] as const;
      const shown = displayColour(xyz, srgbWhite);
      [r, g, b].forEach((value, index) => {
        const channel = Number.parseInt(shown.hex.slice(1 + 2 * index, 3 + 2 * index), 16);
        expect(Math.abs(channel - 255 * value)).toBeLessThan(0.51);
      });
      const lab = labFromXYZ(xyz, srgbWhite);
      const reference = toLab({ mode: 'rgb', r, g, b });
      [reference.l, reference.a, reference.b].forEach((value, index) =>
        expect(Math.abs(lab[index]! - value)).toBeLessThan(0.02),
      );
      const linear = linearSrgb(xyz, srgbWhite);
      const ok = linearToOklab(...linear);
      oklabToLinear(...ok).forEach((value, index) => expect(value).toBeCloseTo(linear[index]!, 10));
      const okReference = toOklab({ mode: 'rgb', r, g, b });
      [okReference.l, okReference.a, okReference.b].forEach((value, index) =>
        expect(Math.abs(ok[index]! - value)).toBeLessThan(1e-4),
      );
    }
  });

  it('reduce chroma as the gamut mapping of CSS Color 4 does', () => {
    const map = toGamut('rgb', 'oklch');
    for (const [r, g, b] of samples) {
      const wide = [1.6 * r - 0.3, 1.6 * g - 0.3, 1.6 * b - 0.3] as const;
      const [l, a, beta] = linearToOklab(...wide);
      const reference = map({ mode: 'oklab', l, a, b: beta }) as { r: number; g: number; b: number };
      const ours = reduceChroma(wide).map((value) =>
        value <= 0.0031308 ? 12.92 * value : 1.055 * value ** (1 / 2.4) - 0.055,
      );
      [reference.r, reference.g, reference.b].forEach((value, index) =>
        expect(Math.abs(ours[index]! - value)).toBeLessThan(2 / 255),
      );
    }
  });
});

describe('chromatic adaptation', () => {
  it('takes one white to the other and leaves a colour alone between equal whites', () => {
    const from = viewingWeights({ illuminant: 'A' }).white;
    const adapted = adapt(from, from, srgbWhite);
    adapted.forEach((value, index) => expect(value).toBeCloseTo(srgbWhite[index]!, 10));
    adapt([30, 20, 10], from, from).forEach((value, index) =>
      expect(value).toBeCloseTo([30, 20, 10][index]!, 10),
    );
  });

  // B. Lindbloom's published Bradford matrix, D65 to D50, first row 1.0478112 0.0228866 -0.0501270 (4 decimals).
  it('has the published Bradford matrix from D65 to D50', () => {
    const d65 = [95.047, 100, 108.883] as const;
    const d50 = [96.422, 100, 82.521] as const;
    expect(adapt([1, 0, 0], d65, d50)[0]).toBeCloseTo(1.0478112, 4);
    expect(adapt([0, 1, 0], d65, d50)[0]).toBeCloseTo(0.0228866, 4);
    expect(adapt([0, 0, 1], d65, d50)[0]).toBeCloseTo(-0.050127, 4);
  });
});
