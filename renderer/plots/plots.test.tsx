import { afterEach, describe, expect, it, vi } from 'vitest';
import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { type SeenColour } from '../../core/colour/types';
import { BandFitPlot } from './bandFit/BandFitPlot';
import { ColourCloudPlot } from './colourCloud/ColourCloudPlot';
import { cloudHeight, cloudMargin, planeReach } from './colourCloud/cloudPlane';
import { MomentPlot } from './moment/MomentPlot';
import { chiTToMoment, momentErrorOf } from './moment/momentQuantity';
import { paretoFront, spreadSideways } from './pareto/paretoFront';
import { ParetoPlot } from './pareto/ParetoPlot';

afterEach(cleanup);
const name = () => screen.getByRole('application').getAttribute('aria-label')!.replace(/\s/g, ' ');

describe('the colour plane', () => {
  const seen = (a: number, b: number): SeenColour => ({
    ...{ srgb: '#808080', inGamut: true, lab: [50, a, b], XYZ: [0, 0, 0], words: 'violet' },
    ...{ illuminant: 'D65', observer: 'CIE 1931 2°' },
  });
  const draws = [seen(30, -30), seen(32, -28), seen(-10, 5)];
  const target = { lab: [50, 30, -30], tolerance: 5 } as const;

  it('is square at any width, and reaches round all that is drawn', () => {
    for (const width of [320, 640, 1_100]) {
      const { left, right, top, bottom } = cloudMargin(width);
      expect(width - left - right).toBe(cloudHeight(width) - top - bottom);
    }
    expect(planeReach([{ a: 71, b: 0 }])).toBe(80);
    expect(planeReach([])).toBe(30);
  });

  it('counts the draws that meet the target, and marks them by a ring', () => {
    render(<ColourCloudPlot draws={draws} target={target} />);
    expect(name()).toContain('2 of 3 draws (67 %) lie within 5 of the target');
    expect(document.querySelectorAll('.plot-stage .cloud-met')).toHaveLength(2);
  });

  it('measures in the colour difference it is given', () => {
    render(<ColourCloudPlot draws={draws} target={target} difference={() => 99} differenceName="ΔE00" />);
    expect(name()).toContain('0 of 3 draws (0 %) lie within 5 of the target, ΔE00');
  });

  it('says where there are no colours', () => {
    render(<ColourCloudPlot draws={[]} />);
    expect(screen.getByText(/no spectrum could be estimated/)).toBeTruthy();
  });
});

describe('moments', () => {
  it('follow μ = 2.828 √χT: 4.62 for 2.668 cm³ K mol⁻¹, the constant of the textbooks', () => {
    expect(chiTToMoment(1)).toBeCloseTo(2.828, 3);
    expect(chiTToMoment(8.95e-3 * 298.15)).toBeCloseTo(4.62, 2);
    expect(chiTToMoment(-0.1)).toBe(0);
  });

  it('carry half the relative uncertainty of χT', () => {
    expect(momentErrorOf(2, 0.1) / chiTToMoment(2)).toBeCloseTo(0.025, 12);
  });

  it('are drawn as χT or μeff, points for measured and a line for a model', () => {
    const points = [100, 200, 300].map((temperature_K) => ({ temperature_K, chiT: 1, u: 0.1 }));
    render(
      <MomentPlot
        series={[
          { name: 'batch 7', kind: 'measured', points },
          { name: 'model', kind: 'model', points },
        ]}
      />,
    );
    expect(document.querySelectorAll('.plot-stage path.marker')).toHaveLength(3);
    fireEvent.click(screen.getByRole('button', { name: 'μeff' }));
    fireEvent.keyDown(screen.getByRole('application'), { key: 'ArrowRight' });
    expect(screen.getByRole('status').textContent).toBe('batch 7: 2.83 ± 0.14 μB at 100.0 K');
  });
});

describe('the choice plot', () => {
  const points = [
    { id: 'a', name: 'A', cost: 0, probability: 0.3 },
    { id: 'b', name: 'B', cost: 1, probability: 0.2 },
    { id: 'c', name: 'C', cost: 1, probability: 0.6 },
    { id: 'd', name: 'D', cost: 2, probability: 0.6 },
  ];

  it('finds the candidates that no other beats on both counts', () => {
    expect(paretoFront(points).map(({ id }) => id)).toEqual(['a', 'c']);
    expect(paretoFront([])).toEqual([]);
  });

  it('spreads equals sideways within the reach, always the same way', () => {
    const same = Array.from({ length: 40 }, () => points[0]!);
    const shifts = spreadSideways(same, 0.3);
    expect(new Set(shifts).size).toBe(40);
    expect(Math.max(...shifts.map(Math.abs))).toBeLessThanOrEqual(0.3);
    expect(spreadSideways(same, 0.3)).toEqual(shifts);
  });

  it('fills the unbeaten ones and opens the one being read', () => {
    const onOpen = vi.fn();
    render(<ParetoPlot points={points} costName="ligands to order" onOpen={onOpen} />);
    expect(document.querySelectorAll('.plot-stage .marker-solid')).toHaveLength(2);
    const stage = screen.getByRole('application');
    fireEvent.keyDown(stage, { key: 'Home' });
    expect(screen.getByRole('status').textContent).toMatch(/^A: probability 30.%.*no other beats it/);
    fireEvent.keyDown(stage, { key: 'Enter' });
    expect(onOpen).toHaveBeenCalledWith('a');
  });
});

describe('the band fit', () => {
  const grid = [15_000, 17_000, 19_000];
  const measured = { wavenumber_cm1: grid, value: [0.1, 0.5, 0.12] };

  it('shows points, bands and what is left over', () => {
    render(
      <BandFitPlot
        measured={measured}
        fit={[0.1, 0.48, 0.12]}
        noise={0.01}
        bands={[{ name: 'band 1', centre_cm1: 17_000, centreError_cm1: 25, value: [0.1, 0.48, 0.12] }]}
      />,
    );
    expect(document.querySelector('.plot-stage .fit-points')!.getAttribute('d')!.match(/M/g)).toHaveLength(3);
    expect(document.querySelectorAll('.plot-stage .residual-68')).toHaveLength(1);
    const stage = screen.getByRole('application');
    for (const key of ['ArrowRight', 'ArrowRight']) fireEvent.keyDown(stage, { key });
    expect(screen.getByRole('status').textContent!.replace(/\s/g, ' ')).toBe(
      'measured 0.500 at 17 000 cm⁻¹ (588 nm), residual 0.020',
    );
  });

  it('shows the spectrum alone before a fit', () => {
    render(<BandFitPlot measured={measured} fit={null} bands={[]} />);
    expect(document.querySelector('.fit-residual')).toBeNull();
    expect(document.querySelector('.plot-stage .fit-points')!.getAttribute('d')!.match(/M/g)).toHaveLength(3);
  });

  it('asks for a file where there is none', () => {
    render(<BandFitPlot measured={{ wavenumber_cm1: [], value: [] }} fit={null} bands={[]} />);
    expect(screen.getByText(/open a file/)).toBeTruthy();
  });
});
