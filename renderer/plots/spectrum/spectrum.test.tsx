import { afterEach, describe, expect, it } from 'vitest';
import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { bandCurve, gaussian } from '../../../core/spectrum';
import { type Band } from '../../../core/transitions/types';
import { UnitProvider } from '../../parts/number';
import { absorptionTop } from './absorptionTop';
import { SpectrumPlot } from './SpectrumPlot';
import { axisDomain, curveInUnit, shownRange_cm1 } from './spectrumUnits';

afterEach(cleanup);

const band: Band = {
  ...{ energy_cm1: 17_400, sigma_cm1: 1_000, wavelength_nm: 574.7, multiplicity: 4, label: '4T2g' },
  ...{ kind: 'spin-allowed', molarAbsorptivity: 13, molarAbsorptivityRange: [4, 40], width_cm1: 3_600 },
  ...{ intensityClass: 'spin-allowed, 1-100', reasons: [] },
};
const grid = Float64Array.from({ length: 91 }, (_, index) => 5_000 + 500 * index);
const predicted = {
  wavenumber_cm1: grid,
  value: bandCurve(band, grid),
};

describe('the axis of a spectrum', () => {
  it('rises from left to right in every unit', () => {
    const { xs } = curveInUnit(predicted, 'nm');
    expect(xs[0]!).toBeLessThan(xs.at(-1)!);
    expect(axisDomain([5_000, 50_000], 'nm')).toEqual([200, 2_000]);
  });

  it('keeps the near infrared, and the usual range where nothing is known', () => {
    expect(shownRange_cm1([predicted])).toEqual([5_000, 50_000]);
    expect(shownRange_cm1([])).toEqual([5_000, 50_000]);
  });

  it('follows the bands that make the colour where charge transfer towers over them', () => {
    const value = grid.map((at) => 13 * gaussian(at, 17_400, 3_600) + 8_000 * gaussian(at, 45_000, 5_000));
    const { top, cutOff } = absorptionTop([{ wavenumber_cm1: grid, value }]);
    expect(cutOff).toBe(true);
    expect(top).toBeLessThan(30);
    expect(absorptionTop([predicted]).cutOff).toBe(false);
    expect(absorptionTop([])).toEqual({ top: 1, cutOff: false });
  });

  it('makes room for the range, but not so much that the curve lies flat', () => {
    const upper = (factor: number) => ({
      wavenumber_cm1: grid,
      value: predicted.value.map((v) => v * factor),
    });
    const plain = absorptionTop([predicted]).top;
    expect(absorptionTop([predicted], upper(1.5)).top).toBeCloseTo(1.5 * plain, 6);
    expect(absorptionTop([predicted], upper(50)).top).toBeCloseTo(2 * plain, 6);
  });
});

describe('the spectrum plot', () => {
  const show = () =>
    render(
      <UnitProvider initial="cm-1">
        <SpectrumPlot predicted={predicted} bands={[band]} measured={[{ ...predicted, name: 'batch 7' }]} />
      </UnitProvider>,
    );

  it('names its bands with range and class', () => {
    show();
    expect(screen.getByRole('application').getAttribute('aria-label')!.replace(/\s/g, ' ')).toContain(
      'quartet T two g: 17 400 (16 400–18 400) cm⁻¹, spin-allowed, 1-100',
    );
  });

  it('changes its axis with the unit', async () => {
    show();
    expect(screen.getByText('Wavenumber / cm⁻¹')).toBeTruthy();
    await userEvent.click(screen.getByRole('radio', { name: 'nm' }));
    expect(screen.getByText('Wavelength / nm')).toBeTruthy();
  });

  it('reads a point in the unit of the axis and as a wavelength', () => {
    show();
    const stage = screen.getByRole('application');
    fireEvent.keyDown(stage, { key: 'Home' });
    expect(screen.getByRole('status').textContent!.replace(/\s/g, ' ')).toMatch(/at 5 000 cm⁻¹ \(2 000 nm\)/);
  });

  it('tells predicted, measured and kinds of band apart without colour', () => {
    show();
    for (const text of ['predicted', 'spin-allowed band', 'measured: batch 7']) {
      expect(screen.getByText(text)).toBeTruthy();
    }
  });

  it('switches to a logarithmic axis without losing points at zero', async () => {
    show();
    await userEvent.click(screen.getByRole('button', { name: 'Log' }));
    const path = document.querySelector('.spectrum-predicted')!.getAttribute('d')!;
    expect(path).not.toMatch(/NaN|Infinity/);
    expect(path.match(/M/g)).toHaveLength(1);
  });

  it('says when there is no spectrum', () => {
    render(<SpectrumPlot predicted={null} />);
    expect(screen.getByText(/no band of this complex could be estimated/)).toBeTruthy();
  });
});
