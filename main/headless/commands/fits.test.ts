import { describe, expect, it } from 'vitest';
import type { CommandIo } from '../command';
import { fitBands } from './fitBands';
import { fitField } from './fitField';

const reading = (value: unknown): CommandIo => ({
  readBytes: () => Promise.reject(new Error('not used')),
  readText: () => Promise.reject(new Error('not used')),
  readJson: () => Promise.resolve(value),
  note: () => undefined,
});
const args = { operands: ['in.json'], options: new Map() };

describe('fit-bands', () => {
  const v = Array.from({ length: 81 }, (_, i) => 10_000 + 200 * i);
  const request = {
    wavenumber_cm1: v,
    absorbance: v.map((x) => 0.8 * Math.exp(-4 * Math.LN2 * ((x - 17_400) / 3000) ** 2)),
    start: [{ centre_cm1: 17_000, fwhm_cm1: 2500, height: 0.5 }],
    baseline: 'none',
  };

  it('gives bands with standard errors, status, rss and correlation', async () => {
    const answer = await fitBands.run(args, reading(request));
    expect(answer).toMatchObject({
      bands: [
        { centre_cm1: expect.closeTo(17_400, 3) as number, fwhm_cm1: expect.closeTo(3000, 3) as number },
      ],
      baseline: null,
      status: 'converged',
      rss: expect.closeTo(0, 9) as number,
      correlation: { parameters: ['band 1 centre', 'band 1 width', 'band 1 height'] },
    });
  });

  it('names the field that is wrong', async () => {
    await expect(fitBands.run(args, reading({ ...request, baseline: 'cubic' }))).rejects.toMatchObject({
      field: 'baseline',
    });
    await expect(fitBands.run(args, reading({ ...request, start: [{}] }))).rejects.toMatchObject({
      field: 'start[0].centre_cm1',
    });
  });
});

describe('fit-field', () => {
  it('gives 10Dq, B and C, the assignment and what is not determined', async () => {
    const answer = await fitField.run(
      args,
      reading({
        dElectrons: 3,
        geometry: 'octahedral',
        bands: [{ energy_cm1: 17_400 }, { energy_cm1: 24_574 }],
      }),
    );
    expect(answer).toMatchObject({
      tenDq: { value: expect.closeTo(17_400, 1) as number, status: 'fitted' },
      B: { value: expect.closeTo(725, 1) as number },
      C: { value: null },
      assignment: [{ label: '4T2g' }, { label: '4T1g' }],
      notDetermined: [expect.stringMatching(/^C: /)],
    });
  });

  it('refuses a geometry that it has no levels for', async () => {
    await expect(
      fitField.run(args, reading({ dElectrons: 3, geometry: 'cubical', bands: [] })),
    ).rejects.toMatchObject({ field: 'geometry' });
  });
});
