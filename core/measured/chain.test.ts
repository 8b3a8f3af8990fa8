import { expect, it } from 'vitest';
import { analysisSchema } from '../record/analysis';
import { cubicLevels } from '../dshell';
import { assignBands } from './assignment/assignBands';
import { findBands } from './bandFit/findBands';
import { fitBands } from './bandFit/fitBands';
import { gaussian } from './bandFit/model';
import { fitField } from './fieldFit/fitField';
import { recordAssignment, recordBandFit, recordFieldFit } from './records';
import { readSpectrumFile } from './reading/readSpectrumFile';
import { treat } from './treatment/treat';
import { inWavenumber } from './treatment/wavenumber';

// Hexaamminechromium(III) as commonly quoted, 10Dq 21 550 and B about 650: a file is made from the exact levels and must
// lead back to these parameters through every step that a user takes.
it('a file goes through treatment, band fit, assignment and field fit to the parameters it was made from', () => {
  const levels = cubicLevels({ dElectrons: 3, geometry: 'octahedral', tenDq: 21_550, B: 650, C: 2925 });
  const quartets = levels.filter((level) => level.multiplicity === 4 && level.energy > 0).slice(0, 2);
  const bands = quartets.map((level, i) => ({
    centre_cm1: level.energy,
    fwhm_cm1: 3200,
    height: [40, 33][i]!,
  }));
  const rows = Array.from({ length: 321 }, (_, i) => {
    const nm = 280 + 1.25 * i;
    const absorbance = bands.reduce((sum, band) => sum + gaussian(band, 1e7 / nm), 0) * 0.02;
    return `${nm};${absorbance.toFixed(5)}`.replaceAll('.', ',');
  });
  const reading = readSpectrumFile(
    new TextEncoder().encode(`Wellenlänge [nm];Extinktion\r\n${rows.join('\r\n')}\r\n`),
  );
  expect(reading.outcome).toBe('ok');

  const treated = treat(reading.spectra[0]!, [
    {
      op: 'to molar absorptivity',
      concentration_mM: { value: 20, u: 0.2 },
      path_cm: { value: 1, u: 0.005 },
      absorbance_u: 0.002,
    },
  ]);
  const curve = inWavenumber(treated)!;
  const start = findBands(curve.wavenumber_cm1, curve.y);
  expect(start).toHaveLength(2);
  const request = {
    wavenumber_cm1: curve.wavenumber_cm1,
    absorbance: curve.y,
    start,
    baseline: 'none' as const,
  };
  const bandFit = fitBands(request);
  bandFit.bands.forEach((band, i) =>
    expect(Math.abs(band.centre_cm1 - bands[i]!.centre_cm1)).toBeLessThan(2),
  );

  const measured = bandFit.bands.map((band) => ({
    energy_cm1: band.centre_cm1,
    u_cm1: 50,
    molarAbsorptivity: band.height,
  }));
  const predicted = levels
    .filter((level) => level.energy > 0)
    .map((level) => ({
      energy_cm1: level.energy * 1.04,
      sigma_cm1: 0.06 * level.energy,
      label: level.label,
      multiplicity: level.multiplicity,
      molarAbsorptivity: level.multiplicity === 4 ? 30 : 0.1,
    }));
  const { best } = assignBands(measured, predicted)!;
  expect(best.pairs.map((pair) => predicted[pair.predicted!]!.label)).toEqual(['4T2g', '4T1g']);

  const fieldRequest = {
    dElectrons: 3,
    geometry: 'octahedral' as const,
    bands: measured.map((band, i) => ({
      energy_cm1: band.energy_cm1,
      se_cm1: 50,
      label: predicted[best.pairs[i]!.predicted!]!.label,
    })),
  };
  const fieldFit = fitField(fieldRequest);
  expect(Math.abs(fieldFit.tenDq.value! - 21_550)).toBeLessThan(5);
  expect(Math.abs(fieldFit.B.value! - 650)).toBeLessThan(2);

  const at = '2026-03-01T09:00:00Z';
  const analysis = {
    ...{
      id: 'a',
      revision: 0,
      createdAt: at,
      updatedAt: at,
      deletedAt: null,
      projectId: 'p',
      measurementId: 'm',
      notes: '',
    },
    treatment: [],
    bandFit: recordBandFit(request, bandFit, null),
    assignment: recordAssignment(measured, predicted, best, new Set()),
    fieldFit: recordFieldFit(fieldRequest, fieldFit),
  };
  expect(analysisSchema.parse(analysis)).toEqual(analysis);
});
