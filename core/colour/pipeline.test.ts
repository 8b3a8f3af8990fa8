import { describe, expect, it } from 'vitest';
import pipeline from '../testing/colour/pipeline.json';
import { visibleReflectance, visibleTransmission } from '../spectrum';
import { chromaticity, displayColour, labFromXYZ, tristimulus, viewingWeights } from './index';
import type { IlluminantId, ObserverId } from './index';

interface Case {
  id: string;
  kind: string;
  bands: { centre_cm1: number; fwhm_cm1: number; eps: number }[];
  conc?: number;
  path_cm?: number;
  scale?: number;
  background?: number;
}
type Expected = Record<
  string,
  { XYZ: number[]; xy: number[]; Lab: number[]; hex_clipped: string; in_gamut: boolean }
>;

function passedBy(entry: Case): Float64Array {
  const bands = entry.bands.map(({ centre_cm1, fwhm_cm1, eps }) => ({
    energy_cm1: centre_cm1,
    width_cm1: fwhm_cm1,
    molarAbsorptivity: eps,
  }));
  return entry.kind === 'solution'
    ? visibleTransmission(bands, entry.conc! * 1000, entry.path_cm!)
    : visibleReflectance(bands, entry.scale!, entry.background!);
}

const channels = (hex: string): number[] =>
  [1, 3, 5].map((start) => Number.parseInt(hex.slice(start, start + 2), 16));

// Tolerances as stated with the reference numbers: XYZ 0.001, L*a*b* 0.002, screen channels one step.
describe('from bands to colour, against reference numbers of an independent script', () => {
  const cases = pipeline.cases as unknown as { case: Case; expected: Expected }[];
  const rows = cases.flatMap(({ case: entry, expected }) =>
    Object.keys(expected).map((view) => [entry.id, view, entry, expected[view]!] as const),
  );
  it.each(rows)('%s under %s', (_id, view, entry, expected) => {
    const [illuminant, observer] = view.split('_') as [IlluminantId, ObserverId];
    const weights = viewingWeights({ illuminant, observer });
    const XYZ = tristimulus(passedBy(entry), weights);
    const lab = labFromXYZ(XYZ, weights.white);
    const shown = displayColour(XYZ, weights.white);
    expected.XYZ.forEach((value, index) => expect(Math.abs(XYZ[index]! - value)).toBeLessThan(0.001));
    expected.Lab.forEach((value, index) => expect(Math.abs(lab[index]! - value)).toBeLessThan(0.002));
    const xy = chromaticity(XYZ, weights.white);
    expected.xy.forEach((value, index) => expect(Math.abs(xy[index]! - value)).toBeLessThan(1e-4));
    channels(expected.hex_clipped).forEach((value, index) =>
      expect(Math.abs(channels(shown.hexClipped)[index]! - value)).toBeLessThanOrEqual(1),
    );
    expect(shown.inGamut).toBe(expected.in_gamut);
  });
});
