import { afterEach, describe, expect, it } from 'vitest';
import { cleanup, fireEvent, render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { diagramItem, fieldAxisEnd, firstSettings, readDiagramItem } from './diagramSettings';
import DiagramView from './DiagramView';
import { ionChoices } from './ionChoices';

afterEach(() => {
  cleanup();
  window.location.hash = '';
});

const rows = (name: string) =>
  within(screen.getByRole('group', { name }))
    .getAllByRole('row')
    .slice(1)
    .map((row) => row.textContent!.replace(/\s+/g, ' '));

describe('settings in an address', () => {
  it('come back as they were written', () => {
    const settings = { ...firstSettings, dElectrons: 6, geometry: 'tetrahedral', axes: 'absolute' } as const;
    expect(readDiagramItem(diagramItem(settings))).toEqual(settings);
  });

  it('keep their first value where they make no sense', () => {
    expect(readDiagramItem(null)).toEqual(firstSettings);
    expect(readDiagramItem('d0_cubic_-4_NaN_1e9_none')).toEqual(firstSettings);
  });

  it('leave room beyond the chosen field', () => {
    expect(fieldAxisEnd(firstSettings)).toBe(40);
    expect(fieldAxisEnd({ ...firstSettings, tenDq: 40_000, B: 500 })).toBe(100);
    expect(fieldAxisEnd({ ...firstSettings, axes: 'absolute', tenDq: 35_000 })).toBe(50_000);
  });
});

describe('ions to start from', () => {
  it('have free-ion parameters on file, none made up', () => {
    expect(ionChoices.size).toBeGreaterThan(5);
    for (const { dElectrons, B, cOverB } of ionChoices.values()) {
      expect(dElectrons).toBeGreaterThan(0);
      expect(B).toBeGreaterThan(0);
      if (cOverB !== null) expect(cOverB).toBeGreaterThan(1);
    }
  });
});

describe('the level diagram explorer', () => {
  it('lists the levels of d3 at 17 400/725/2 900: 4T2g at 17 400, 4T1g at 24 574, 2Eg at 14 011', () => {
    render(<DiagramView />);
    const levels = rows('Levels at this field, table');
    expect(levels[0]).toContain('ground level');
    for (const [term, energy] of [
      ['quartet T two g', '17 400'],
      ['quartet T one g', '24 574'],
      ['doublet E g', '14 011'],
    ]) {
      expect(levels.some((row) => row.includes(term!) && row.includes(energy!))).toBe(true);
    }
  });

  it('locates the crossover of d6 at C/B 4.5: 10Dq/B 18.9', async () => {
    window.location.hash = '#/diagram/d6_octahedral_16000_800_4.5_over-B';
    const { RouterProvider } = await import('../../app/router/RouterContext');
    render(
      <RouterProvider>
        <DiagramView />
      </RouterProvider>,
    );
    expect(screen.getByRole('region', { name: 'Ground level' }).textContent).toMatch(/at 10Dq\/B 18\.90/);
  });

  it('follows geometry and d count: d7 in a tetrahedron has the terms of d3 in an octahedron', async () => {
    render(<DiagramView />);
    await userEvent.click(screen.getByRole('radio', { name: '7' }));
    await userEvent.click(screen.getByRole('radio', { name: 'tetrahedral' }));
    expect(rows('Levels at this field, table')[0]).toContain('quartet A two');
    expect(screen.getByText(/does not change up to 10Dq\/B = 80|to.*at 10Dq\/B/)).toBeTruthy();
  });

  it('shows the four terms and 24 microstates of t2g1 eg1', async () => {
    render(<DiagramView />);
    await userEvent.click(screen.getByRole('radio', { name: '2' }));
    const row = rows('Terms of each configuration, table').find((text) =>
      text.includes('t two g one, e g one'),
    )!;
    for (const term of ['triplet T one g', 'triplet T two g', 'singlet T one g', 'singlet T two g']) {
      expect(row).toContain(term);
    }
    expect(row).toMatch(/24$/);
  });

  it('takes a typed field at once and keeps only the spin of the ground level when asked', async () => {
    render(<DiagramView />);
    const field = screen.getByRole('textbox', { name: /10Dq/ });
    await userEvent.clear(field);
    await userEvent.type(field, '20000');
    expect(rows('Levels at this field, table').some((row) => row.includes('20 000'))).toBe(true);
    await userEvent.click(screen.getByRole('checkbox'));
    expect(rows('Levels at this field, table')).toHaveLength(4);
  });

  it('moves the field by the slider', () => {
    render(<DiagramView />);
    fireEvent.change(screen.getByRole('slider', { name: '10Dq, slider' }), { target: { value: '10000' } });
    expect(screen.getByText(/at 10Dq\/B 13.8/)).toBeTruthy();
  });
});
