import { describe, expect, it } from 'vitest';
import { readSpectrumFile } from '../../../../core/measured/reading/readSpectrumFile';
import { writeJcamp } from '../../../../core/measured/jcamp/write';
import { treat } from '../../../../core/measured/treatment/treat';
import type { CurveData } from '../../../../core/record/curve';
import { noConditions } from '../../../../core/record/measurement';
import type { TreatmentStep } from '../../../../core/record/treatment';
import { stepText } from './stepText';
import { treatedLabels } from './treatedLabels';

const raw: CurveData = {
  kind: 'curve',
  xUnit: 'nm',
  yUnit: 'percent-transmittance',
  x: Array.from({ length: 301 }, (_, i) => 400 + i),
  y: Array.from({ length: 301 }, (_, i) =>
    i === 150 ? 0 : 100 * 10 ** (-0.3 * Math.exp(-(((i - 120) / 40) ** 2))),
  ),
};
const exact = { value: 10, u: 0.1 };
const steps: readonly TreatmentStep[] = [
  { op: 'to absorbance' },
  { op: 'leave out above', absorbance: 2 },
  {
    op: 'subtract baseline',
    form: 'linear',
    ranges: [
      [400, 420],
      [680, 700],
    ],
  },
  {
    op: 'to molar absorptivity',
    concentration_mM: exact,
    path_cm: { value: 1, u: null },
    absorbance_u: 0.002,
  },
];

describe('a treated spectrum as JCAMP-DX', () => {
  it('is read again as the same numbers, with its steps and conditions told', () => {
    const shown = treat(raw, steps, () => undefined);
    const conditions = {
      ...noConditions,
      date: '2026-03-10',
      solvent: 'water',
      concentration_mM: exact,
      temperature_K: { value: 298.15, u: null },
    };
    const labels = treatedLabels(steps.map(stepText), conditions);
    const text = writeJcamp(shown, { title: '[Cr(NH3)6]3+', origin: 'Spinhue', owner: 'MK', labels });
    const reading = readSpectrumFile(new TextEncoder().encode(text));
    expect(reading.error).toBeUndefined();
    const [spectrum] = reading.spectra;
    expect(spectrum!.x).toEqual(shown.x);
    expect(spectrum!.y).toEqual(shown.y);
    expect(spectrum!.yUnit).toBe('molar-absorptivity');
    expect(spectrum!.y[150]).toBeNull();
    expect(text).toContain('##TEMPERATURE=25.00');
    expect(text).toContain('##LONGDATE=2026/03/10');
    expect(text.match(/^##\$TREATMENT STEP \d=/gm)).toHaveLength(4);
  });

  it('says nothing of what nobody wrote down', () => {
    expect(treatedLabels([], noConditions)).toEqual([]);
  });
});
