import { afterEach, describe, expect, it } from 'vitest';
import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { NumberWithRange } from './NumberWithRange';
import { UnitProvider } from './UnitContext';
import { UnitSwitch } from './UnitSwitch';

afterEach(cleanup);
const shown = () => document.querySelector('.number-with-range')!.textContent!.replace(/\s/g, ' ');

describe('a number with its range', () => {
  it('reads value, 68 % range, unit', () => {
    render(<NumberWithRange value={21_700} sigma={1_750} />);
    expect(shown()).toBe('21 700 (20 000–23 500) cm⁻¹');
  });

  it('says that it is not estimated rather than showing a zero', () => {
    render(<NumberWithRange value={null} sigma={null} />);
    expect(screen.getByText('not estimated')).toBeTruthy();
  });

  it('stands without brackets where no uncertainty is known', () => {
    render(<NumberWithRange value={725} sigma={null} kind="interval" />);
    expect(shown()).toBe('725 cm⁻¹');
  });

  it('follows the unit switch: 17 400 cm-1 is 575 nm, 2.16 eV, 208 kJ/mol', async () => {
    render(
      <UnitProvider>
        <UnitSwitch />
        <NumberWithRange value={17_400} sigma={1_000} />
      </UnitProvider>,
    );
    await userEvent.click(screen.getByRole('radio', { name: 'nm' }));
    expect(shown()).toBe('575 (543–610) nm');
    await userEvent.click(screen.getByRole('radio', { name: 'eV' }));
    expect(shown()).toBe('2.16 (2.03–2.28) eV');
    await userEvent.click(screen.getByRole('radio', { name: 'kJ/mol' }));
    expect(shown()).toBe('208 (196–220) kJ/mol');
  });

  it('keeps an interval such as B out of wavelengths', () => {
    render(
      <UnitProvider initial="nm">
        <NumberWithRange kind="interval" value={725} sigma={65} />
      </UnitProvider>,
    );
    expect(shown()).toBe('725 (660–790) cm⁻¹');
  });

  it('converts a width at its centre: 3 600 cm-1 at 17 400 cm-1 is 120 nm', () => {
    render(
      <UnitProvider initial="nm">
        <NumberWithRange kind="width" centre={17_400} value={3_600} />
      </UnitProvider>,
    );
    expect(shown()).toBe('120 nm');
  });

  it('has no longest wavelength where the range reaches zero energy', () => {
    render(
      <UnitProvider initial="nm">
        <NumberWithRange value={1_000} sigma={1_200} />
      </UnitProvider>,
    );
    expect(shown()).toMatch(/above 4 550/);
  });
});

describe('the unit switch', () => {
  it('works by keyboard alone and reports the choice', async () => {
    const chosen: string[] = [];
    render(
      <UnitProvider initial="nm" onChange={(unit) => chosen.push(unit)}>
        <UnitSwitch />
      </UnitProvider>,
    );
    expect(screen.getByRole('group', { name: 'Energy unit' })).toBeTruthy();
    await userEvent.tab();
    await userEvent.keyboard('{ArrowRight}');
    expect(chosen).toEqual(['cm-1']);
  });
});
