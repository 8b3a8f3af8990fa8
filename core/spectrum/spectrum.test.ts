import { describe, expect, it } from 'vitest';
import {
  absorbance,
  absorptionCurve,
  apparentMaximum_cm1,
  bandArea,
  emissionMaximum_nm,
  findSolvent,
  gaussian,
  hiddenBySolvent,
  kubelkaMunk,
  molarAbsorptivityAt,
  oscillatorStrength,
  perWavelength,
  percentTransmittance,
  reflectanceOf,
  spectrumGrid,
  transmittance,
  visibleTransmission,
} from './index';

const band = (energy_cm1: number, width_cm1: number, molarAbsorptivity: number) => ({
  energy_cm1,
  width_cm1,
  molarAbsorptivity,
});

describe('a band', () => {
  it('is a Gaussian in wavenumber: half height half a width from its centre on both sides', () => {
    expect(gaussian(17_400, 17_400, 3_600)).toBe(1);
    expect(gaussian(17_400 - 1_800, 17_400, 3_600)).toBeCloseTo(0.5, 12);
    expect(gaussian(17_400 + 1_800, 17_400, 3_600)).toBeCloseTo(0.5, 12);
  });

  it('is therefore not symmetric on a wavelength axis: 3 600 cm-1 at 17 400 reach from 521 to 641 nm', () => {
    const half = (nm: number): number => gaussian(1e7 / nm, 17_400, 3_600);
    expect(half(520.83)).toBeCloseTo(0.5, 4);
    expect(half(641.03)).toBeCloseTo(0.5, 4);
    expect(half(574.7 + 60)).not.toBeCloseTo(half(574.7 - 60), 2);
  });

  it('has the area of the integral of its curve', () => {
    let sum = 0;
    for (let place = 5_000; place < 30_000; place += 10) {
      sum += 10 * molarAbsorptivityAt(place, [band(17_400, 3_600, 13)]);
    }
    expect(bandArea(13, 3_600)).toBeCloseTo(sum, 4);
  });

  // Height 13, width 3 600: 2.2e-4, with f = 4.6e-9 eps w (Lever, Inorganic Electronic Spectroscopy, 1984; memory).
  it('of a d-d transition has an oscillator strength of about 2.2e-4', () => {
    expect(oscillatorStrength(13, 3_600)).toBeGreaterThan(2.1e-4);
    expect(oscillatorStrength(13, 3_600)).toBeLessThan(2.25e-4);
  });

  it('that is narrow keeps its height on the default grid', () => {
    const { molarAbsorptivity } = absorptionCurve([band(14_011, 120, 0.3)]);
    expect(Math.max(...molarAbsorptivity)).toBeGreaterThan(0.29);
  });
});

describe('the spectrum', () => {
  it('runs from 200 to 2500 nm, so that the first band of aqua nickel(II) at 1 176 nm is shown', () => {
    const curve = absorptionCurve([band(8_500, 2_500, 2)]);
    expect(curve.wavelength_nm[0]).toBeCloseTo(200, 6);
    expect(curve.wavelength_nm.at(-1)).toBeCloseTo(2_500, 6);
    const top = curve.molarAbsorptivity.indexOf(Math.max(...curve.molarAbsorptivity));
    expect(curve.wavelength_nm[top]).toBeGreaterThan(1_170);
    expect(curve.wavelength_nm[top]).toBeLessThan(1_182);
  });

  it('has equal steps in wavenumber', () => {
    const grid = spectrumGrid(25);
    expect(grid[0]! - grid[1]!).toBeCloseTo(grid[900]! - grid[901]!, 8);
    expect(grid).toHaveLength(1_841);
  });

  it('without bands absorbs nothing', () => {
    expect(Math.max(...absorptionCurve([]).molarAbsorptivity)).toBe(0);
    expect([...visibleTransmission([], 10, 1)].every((share) => share === 1)).toBe(true);
  });
});

describe('Beer and Lambert', () => {
  it('make 13 L/mol/cm, 0.0500 mol/L and 1 cm an absorbance of 0.650 and 22.4 % transmittance', () => {
    expect(absorbance(13, 0.05, 1)).toBeCloseTo(0.65, 12);
    expect(percentTransmittance(0.65)).toBeCloseTo(22.387, 3);
  });

  it('are decadic and add up: two cells in a row multiply their transmittances', () => {
    expect(transmittance(1)).toBeCloseTo(0.1, 15);
    expect(transmittance(0.3) * transmittance(0.4)).toBeCloseTo(transmittance(0.7), 12);
  });

  it('take mmol/L in the visible strip: 50 mM of a band with 20 L/mol/cm at 500 nm lets a tenth through there', () => {
    const passed = visibleTransmission([band(20_000, 3_000, 20)], 50, 1);
    expect(passed[24]).toBeCloseTo(0.1, 10);
  });
});

describe('Kubelka and Munk', () => {
  it('give K/S 0.25 for a reflectance of one half, and back', () => {
    expect(kubelkaMunk(0.5)).toBe(0.25);
    for (const reflectance of [1, 0.9, 0.5, 0.1, 0.001]) {
      expect(reflectanceOf(kubelkaMunk(reflectance))).toBeCloseTo(reflectance, 12);
    }
  });
});

describe('mistakes with shapes', () => {
  // Two bands of heights 10 and 6, both 3 500 wide and 3 000 apart, and a weaker pair: computed, 326 to 520 cm-1.
  it('an apparent maximum is not a band centre: overlap alone moves it by hundreds of cm-1', () => {
    const bands = [band(20_000, 3_500, 10), band(23_000, 3_500, 6)];
    expect(apparentMaximum_cm1(bands, bands[0]!)! - 20_000).toBeGreaterThan(300);
    expect(apparentMaximum_cm1(bands, bands[0]!)! - 20_000).toBeLessThan(350);
  });

  it('a shoulder has no maximum at all: the second of those bands shows none until 4 000 cm-1 apart', () => {
    const at = (apart: number) => {
      const bands = [band(20_000, 3_500, 10), band(20_000 + apart, 3_500, 6)];
      return apparentMaximum_cm1(bands, bands[1]!);
    };
    expect(at(3_000)).toBeNull();
    expect(at(4_100)).not.toBeNull();
    const onTail = [band(24_000, 3_500, 100), band(31_000, 5_000, 3_000)];
    expect(apparentMaximum_cm1(onTail, onTail[0]!)).toBeNull();
  });

  it('a width in nm is not a width in cm-1 times a constant, and a Gaussian is never drawn in nm', () => {
    const passed = visibleTransmission([band(18_000, 3_000, 10)], 100, 1);
    const densities = [...passed].map((share) => -Math.log10(share));
    const top = densities.indexOf(Math.max(...densities));
    expect(densities[top + 10]).toBeGreaterThan(densities[top - 10]! * 1.2);
  });

  it('emission on a wavelength axis carries the factor of ν²: its maximum is at 566 and not at 575 nm', () => {
    expect(1e7 / 17_400).toBeCloseTo(574.7, 1);
    expect(emissionMaximum_nm(17_400, 3_600)).toBeCloseTo(566.1, 1);
    const weighted = (nm: number): number => perWavelength(gaussian(1e7 / nm, 17_400, 3_600), 1e7 / nm);
    const peak = emissionMaximum_nm(17_400, 3_600);
    expect(weighted(peak)).toBeGreaterThan(weighted(peak - 1));
    expect(weighted(peak)).toBeGreaterThan(weighted(peak + 1));
  });
});

describe('the window of a solvent', () => {
  it('tells that a band below the cut-off cannot be seen, and one beyond the overtones of water neither', () => {
    expect(hiddenBySolvent(300, findSolvent('acetone')!)).toMatch(/330 nm/);
    expect(hiddenBySolvent(1_450, findSolvent('water')!)).toMatch(/overtones/);
    expect(hiddenBySolvent(500, findSolvent('water')!)).toBeNull();
  });
});
