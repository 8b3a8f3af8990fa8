import { describe, expect, it } from 'vitest';
import type { CurveData } from '../record/curve';
import { assignBands } from './assignment/assignBands';
import { evansMoment } from './magnetism/moment';
import { compareCounts } from './bandFit/compareCounts';
import { findBands } from './bandFit/findBands';
import { fitBands } from './bandFit/fitBands';
import { gaussian } from './bandFit/model';
import { fitField } from './fieldFit/fitField';
import { readSpectrumFile } from './reading/readSpectrumFile';
import { absorbanceSanity } from './treatment/sanity';
import { treat } from './treatment/treat';
import { inWavenumber } from './treatment/wavenumber';

const text = (lines: readonly string[]): Uint8Array => new TextEncoder().encode(lines.join('\n'));
const absorbance = (x: number[], y: number[]): CurveData => ({
  kind: 'curve',
  xUnit: 'nm',
  yUnit: 'absorbance',
  x,
  y,
});
const wavenumber_cm1 = Array.from({ length: 401 }, (_, i) => 12_000 + 35 * i);
const twoBands = wavenumber_cm1.map(
  (at) =>
    gaussian({ centre_cm1: 18_000, fwhm_cm1: 3500, height: 0.5 }, at) +
    gaussian({ centre_cm1: 21_000, fwhm_cm1: 3500, height: 0.3 }, at),
);

/** Slips in handling measurements that experts have met once too often; each must stay impossible here. */
describe('what experts complain of in a record', () => {
  it('an apparent maximum quoted as the centre: what is seen is called a maximum or a shoulder, only a fit has a centre', () => {
    const seen = findBands(wavenumber_cm1, twoBands);
    expect(seen.map(({ kind }) => kind)).toEqual(expect.arrayContaining(['maximum']));
    const apparent = seen[0]!.centre_cm1;
    const fit = fitBands({
      wavenumber_cm1,
      absorbance: twoBands,
      start: [
        { centre_cm1: apparent, fwhm_cm1: 3500, height: 0.5 },
        { centre_cm1: 21_500, fwhm_cm1: 3000, height: 0.2 },
      ],
      baseline: 'none',
    });
    expect(fit.bands[0]!.centre_cm1).toBeCloseTo(18_000, 0);
    // Overlap alone moves the maximum (arithmetic on the sum of the two Gaussians).
    expect(apparent - 18_000).toBeGreaterThan(150);
  });

  it('a band of 8000 L/(mol cm) assigned to the d-d transition that happens to lie there', () => {
    const assigned = assignBands(
      [{ energy_cm1: 20_000, u_cm1: 50, molarAbsorptivity: 8000 }],
      [
        { energy_cm1: 20_050, sigma_cm1: 500, label: '4T2g', multiplicity: 4, molarAbsorptivity: 10 },
        {
          energy_cm1: 21_000,
          sigma_cm1: 2000,
          label: 'Cl -> Cr',
          multiplicity: null,
          molarAbsorptivity: 5000,
        },
      ],
    );
    expect(assigned!.best.pairs[0]!.predicted).toBe(1);
  });

  it('B above the free ion accepted in a fit: it is given with a warning', () => {
    // Two bands of a d3 ion so far apart that only a B above the 918 cm-1 of free chromium(III) reproduces them.
    const fit = fitField({
      dElectrons: 3,
      geometry: 'octahedral',
      metal: 'Cr',
      oxidationState: 3,
      bands: [
        { energy_cm1: 17_400, label: '4T2g', multiplicity: 4 },
        { energy_cm1: 28_500, label: '4T1g', multiplicity: 4 },
      ],
    });
    expect(fit.B.value).toBeGreaterThan(918);
    expect(fit.warnings.join()).toMatch(/free-ion/);
  });

  it('a fit done in nm: a width in nm is not what it is in wavenumber, and the abscissa is converted before', () => {
    const [low, high] = [1e7 / (17_400 + 1800), 1e7 / (17_400 - 1800)];
    const converted = inWavenumber(absorbance([low, 1e7 / 17_400, high], [0.5, 1, 0.5]));
    expect(Array.from(converted!.wavenumber_cm1)).toEqual(
      [15_600, 17_400, 19_200].map((x) => expect.closeTo(x, 6)),
    );
    // Half widths of 1800 cm-1 to both sides are 54 and 66 nm.
    expect(1e7 / 17_400 - low).toBeCloseTo(53.9, 1);
    expect(high - 1e7 / 17_400).toBeCloseTo(66.3, 1);
  });

  it('the Evans factor of the wrong magnet: both fields are known, and a shift that has the wrong sign for one is remarked on', () => {
    const reading = {
      shift_Hz: { value: 150, u: 1 },
      spectrometer_MHz: 400,
      concentration_mM: { value: 10, u: 0.1 },
      temperature_K: { value: 298.15, u: 0.5 },
      diamagnetic_cm3_mol: -250e-6,
    };
    expect(evansMoment({ ...reading, field: 'across' }).remarks.join()).toMatch(/magnet/);
    // A diamagnetic correction is negative and raises the moment (Bain and Berry 2008).
    const corrected = evansMoment({ ...reading, field: 'along' }).moment_BM.value;
    const plain = evansMoment({ ...reading, field: 'along', diamagnetic_cm3_mol: 0 }).moment_BM.value;
    expect(corrected).toBeGreaterThan(plain);
  });

  it('a decimal comma read as thousands, transmittance as absorbance: what a file leaves open is asked', () => {
    const commas = readSpectrumFile(
      text(['nm;A', '400,5;0,125', '401,5;0,250', '402,5;0,375', '403,5;0,400']),
    );
    expect(commas.spectra[0]!.x).toEqual([400.5, 401.5, 402.5, 403.5]);
    expect(commas.spectra[0]!.y).toEqual([0.125, 0.25, 0.375, 0.4]);
    const silent = readSpectrumFile(text(['400 0.125', '401 0.250', '402 0.375', '403 0.400']));
    expect(silent.spectra[0]!.yUnit).toBe('unknown');
  });

  it('millimolar taken for molar, a path of 1 cm taken for granted', () => {
    const step = {
      op: 'to molar absorptivity',
      concentration_mM: { value: 50, u: 0.5 },
      absorbance_u: 0.005,
    } as const;
    const curve = absorbance([500, 501], [0.65, 0.65]);
    // Beer-Lambert: 0.65 / (0.050 mol/L x 1 cm) = 13, and twice the path halves it.
    expect(treat(curve, [{ ...step, path_cm: { value: 1, u: 0 } }]).y[0]).toBeCloseTo(13, 10);
    expect(treat(curve, [{ ...step, path_cm: { value: 2, u: 0 } }]).y[0]).toBeCloseTo(6.5, 10);
  });

  it('absorbance above 2 used for molar absorptivity without a word', () => {
    const remarks = absorbanceSanity(absorbance([400, 401, 402], [0.4, 1.5, 2.7]));
    expect(remarks.map(({ code }) => code)).toContain('beyond trust');
  });

  it('the number of bands chosen by fit statistics alone: further bands are fitted too, with what speaks against them', () => {
    const counts = compareCounts({ wavenumber_cm1, absorbance: twoBands, baseline: 'none' }, 3);
    expect(counts.map(({ count }) => count)).toEqual([1, 2, 3]);
    // However well three may do on two bands, that none of them is needed is said, and two are suggested.
    expect(counts[2]!.caution).not.toBeNull();
    expect(counts.filter(({ suggested }) => suggested).map(({ count }) => count)).toEqual([2]);
  });

  it('raw data changed by a treatment: the curve that was read stays as it was', () => {
    const curve = absorbance([400, 401, 402, 403, 404], [0.1, 0.4, 2.7, 0.4, 0.1]);
    const before = structuredClone(curve);
    treat(curve, [{ op: 'leave out above', absorbance: 2 }]);
    expect(curve).toEqual(before);
  });
});
