import { afterEach, describe, expect, it, vi } from 'vitest';
import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { BlandAltmanPlot } from './BlandAltmanPlot';
import { grouped, standardised, type Pair } from './pairs';
import { ParityPlot } from './ParityPlot';
import { ResidualPlot } from './ResidualPlot';

afterEach(cleanup);

const pair = (id: string, predicted: number, measured: number, more: Partial<Pair> = {}): Pair => ({
  ...{ id, name: `complex ${id}`, predicted, measured, sigma: 1_000, u: 0, group: 'Cr' },
  ...more,
});
const pairs = [
  pair('a', 17_400, 17_600),
  pair('b', 10_000, 11_500, { group: 'Ni' }),
  pair('c', 21_000, 26_000, { group: 'Fe' }),
  pair('d', 9_000, 9_300, { sigma: null }),
];

describe('a pair', () => {
  it('has a residual in units of the joint standard deviation: z = (m - p) / sqrt(u² + σ²)', () => {
    expect(standardised(pair('x', 100, 110, { sigma: 3, u: 4 }))).toBe(2);
    expect(standardised(pairs[3]!)).toBeNull();
  });

  it('belongs to a group, in order of first appearance', () => {
    expect([...grouped(pairs).keys()]).toEqual(['Cr', 'Ni', 'Fe']);
  });
});

describe('the parity plot', () => {
  it('draws every pair with a shape for its group, and the diagonal', () => {
    render(<ParityPlot pairs={pairs} quantity="10Dq" />);
    expect(document.querySelectorAll('.plot-stage path.marker')).toHaveLength(4);
    const shapes = new Set(
      Array.from(document.querySelectorAll('.plot-stage path.marker'), (path) => path.getAttribute('d')),
    );
    expect(shapes.size).toBe(3);
    expect(document.querySelectorAll('.plot-stage .parity-line').length).toBeGreaterThan(0);
  });

  it('reads pairs from left to right and opens one', () => {
    const onOpen = vi.fn();
    render(<ParityPlot pairs={pairs} quantity="10Dq" onOpen={onOpen} />);
    const stage = screen.getByRole('application');
    fireEvent.keyDown(stage, { key: 'ArrowRight' });
    expect(screen.getByRole('status').textContent!.replace(/\s/g, ' ')).toBe(
      'complex d: predicted 9 000, measured 9 300 ± 0 cm⁻¹',
    );
    fireEvent.keyDown(stage, { key: 'Enter' });
    expect(onOpen).toHaveBeenCalledWith('d');
  });

  it('says how to come by a first pair', () => {
    render(<ParityPlot pairs={[]} quantity="10Dq" />);
    expect(screen.getByText(/frozen prediction and a measurement/)).toBeTruthy();
  });
});

describe('the residual plot', () => {
  it('counts what lies inside both extents and says what it cannot draw', () => {
    render(<ResidualPlot pairs={pairs} quantity="10Dq" />);
    expect(
      screen.getByText(/1 of 3 .33.%. inside the 68 % extent, 2 .67.%. inside the 95 % extent/),
    ).toBeTruthy();
    expect(screen.getByText(/1 without a stated range is not drawn/)).toBeTruthy();
    expect(document.querySelectorAll('.plot-stage path.marker')).toHaveLength(3);
  });
});

describe('the difference plot', () => {
  const limits = { bias: 1_750, lower: -2_500, upper: 4_900, biasInterval: null };

  it('names what lies outside the limits and keeps it', () => {
    render(<BlandAltmanPlot pairs={pairs} quantity="10Dq" limits={limits} />);
    expect(screen.getByText('complex c')).toBeTruthy();
    expect(screen.queryByText('complex a')).toBeNull();
    expect(document.querySelectorAll('.plot-stage path.marker')).toHaveLength(4);
    expect(screen.getByText(/Bias 1.750 cm⁻¹, limits of agreement −2.500 to 4.900 cm⁻¹/)).toBeTruthy();
  });

  it('draws no limits from too few pairs', () => {
    render(<BlandAltmanPlot pairs={pairs.slice(0, 2)} quantity="10Dq" limits={null} />);
    expect(screen.getByRole('application').getAttribute('aria-label')).toContain('too few');
    expect(document.querySelector('.agreement-limit')).toBeNull();
  });
});
