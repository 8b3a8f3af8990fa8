import { afterEach, describe, expect, it } from 'vitest';
import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { groundCrossovers, type CubicLevel } from '../../../core/dshell';
import { UnitProvider } from '../../parts/number';
import { computedLines } from './computedLines';
import { fittingLabels, labelPlaces } from './labelPlaces';
import { LevelDiagram } from './LevelDiagram';
import { crossoversOf, linesFromLevels, type LevelLine } from './levelLine';
import { heightAt, lineEnd } from './lineEnds';
import { lineStyles } from './lineStyle';

afterEach(cleanup);

const level = (label: string, energy: number): CubicLevel => ({
  ...{ label, energy, multiplicity: Number(label[0]), irrep: 'A1', degeneracy: 1, configurations: [] },
  slope: { tenDq: 0, B: 0, C: 0 },
});

/** Two levels that change places at 10Dq/B of 25, and a third that runs along. */
const columns = [0, 10, 20, 30, 40].map((x) => {
  const [high, low] = [-0.4 * x, 20 - 1.2 * x];
  const ground = Math.min(high, low);
  return {
    x,
    levels: [level('6A1g', high - ground), level('2T2g', low - ground), level('4T1g', 30 - ground)],
  };
});

describe('lines of a level diagram', () => {
  it('join the k-th level of each label', () => {
    const twice = [0, 1].map((x) => ({
      x,
      levels: [level('3T1g', 0), level('3T1g', 15 + x), level('3T2g', 8 + x)],
    }));
    const lines = linesFromLevels(twice, 2);
    expect(lines.map(({ id }) => id)).toEqual(['3T1g #1', '3T2g', '3T1g #2']);
    expect(lines[2]!.points).toEqual([
      { x: 0, y: 30 },
      { x: 1, y: 32 },
    ]);
  });

  it('change their ground level where two cross', () => {
    const [crossover, ...more] = crossoversOf(linesFromLevels(columns));
    expect(more).toHaveLength(0);
    expect(crossover).toMatchObject({ from: '6A1g', to: '2T2g' });
    expect(crossover!.x).toBeCloseTo(25, 9);
  });

  it('have heights between their points, and none outside', () => {
    const line: LevelLine = {
      id: 'a',
      label: 'a',
      multiplicity: 1,
      points: [
        { x: 0, y: 0 },
        { x: 10, y: 50 },
      ],
    };
    expect(heightAt(line, 4)).toBe(20);
    expect(heightAt(line, 11)).toBeNull();
    expect(lineEnd(line, [0, 10], [0, 60])).toMatchObject({ edge: 'right', y: 50 });
    expect(lineEnd(line, [0, 10], [0, 25])).toMatchObject({ edge: 'top', x: 5 });
    expect(lineEnd(line, [0, 10], [60, 80])).toBeNull();
  });
});

describe('labels', () => {
  it('stay where they are while there is room', () => {
    expect(labelPlaces([0, 20, 40], 14, [0, 100])).toEqual([0, 20, 40]);
  });

  it('move apart evenly about where they would stand, and stay inside', () => {
    expect(labelPlaces([50, 50, 50], 14, [0, 100])).toEqual([36, 50, 64]);
    expect(labelPlaces([98, 99], 14, [0, 100])).toEqual([86, 100]);
  });

  it('never come nearer than the gap, in their order, for any wish', () => {
    const wanted = Array.from({ length: 30 }, (_, index) => 50 + 40 * Math.sin(index)).sort((a, b) => a - b);
    const places = labelPlaces(wanted, 10, [0, 400])!;
    for (let index = 1; index < places.length; index++) {
      expect(places[index]! - places[index - 1]!).toBeGreaterThanOrEqual(10 - 1e-9);
    }
    expect(places[0]).toBeGreaterThanOrEqual(0);
    expect(places.at(-1)).toBeLessThanOrEqual(400);
  });

  it('stand within reach of their lines, and those that matter least give way', () => {
    expect(labelPlaces([0, 0, 0], 60, [0, 100])).toBeNull();
    const wanted = [
      { at: 50, priority: 2 },
      { at: 50, priority: 1 },
      { at: 51, priority: 3 },
      { at: 90, priority: 1 },
    ];
    const kept = fittingLabels(wanted, 14, [0, 100], 10);
    expect(kept.map(({ label }) => label.priority)).toEqual([2, 3, 1]);
    for (const { label, place } of kept) expect(Math.abs(place - label.at)).toBeLessThanOrEqual(10);
    expect(fittingLabels([], 14, [0, 100], 10)).toEqual([]);
  });

  it('keep one at the end of the span although it cannot reach its line', () => {
    expect(fittingLabels([{ at: 130, priority: 1 }], 14, [0, 100], 10)).toHaveLength(1);
  });
});

describe('computed lines', () => {
  // Ground-state changes at C/B = 4.5 as tabulated from the complete matrices (Tanabe and Sugano 1954; printed to 0.1).
  it.each([
    [4, 26.8],
    [5, 28.4],
    [6, 18.9],
    [7, 21.2],
  ])('of d%i change their ground level at 10Dq/B = %f', (dElectrons, expected) => {
    const lines = computedLines({
      ...{ dElectrons, geometry: 'octahedral', B: 1_000, C: 4_500, axes: 'over-B', upTo: 40, count: 41 },
    });
    const [crossover] = crossoversOf(lines);
    expect(crossover!.x).toBeCloseTo(expected, 1);
  });

  it('have a point at the kink itself', () => {
    const lines = computedLines({
      ...{
        dElectrons: 6,
        geometry: 'octahedral',
        B: 800,
        C: 3_600,
        axes: 'absolute',
        upTo: 30_000,
        count: 7,
      },
    });
    expect(lines[0]!.points).toHaveLength(8);
    const [one, ...more] = crossoversOf(lines);
    expect(more).toHaveLength(0);
    expect(one!.x / 800).toBeCloseTo(groundCrossovers(6, 4.5)[0]!.tenDqOverB, 6);
  });

  it('start from the terms of the free ion and never fall below the ground level', () => {
    const lines = computedLines({
      ...{
        dElectrons: 3,
        geometry: 'octahedral',
        B: 725,
        C: 2_900,
        axes: 'absolute',
        upTo: 30_000,
        count: 11,
      },
    });
    for (const { points } of lines) for (const { y } of points) expect(y).toBeGreaterThanOrEqual(0);
    // 4P above 4F of d3 is 15 B (Racah 1942).
    const upper = lines.filter(({ label }) => label === '4T1g').at(-1)!;
    expect(upper.points[0]!.y).toBeCloseTo(15 * 725, 6);
  });
});

describe('line styles', () => {
  it('differ in dash for each multiplicity, highest solid', () => {
    const styles = lineStyles([2, 6, 4, 4]);
    expect([...styles.keys()]).toEqual([6, 4, 2]);
    expect(styles.get(6)!.dash).toBeUndefined();
    expect(new Set([...styles.values()].map(({ dash }) => dash)).size).toBe(3);
  });
});

describe('the level diagram', () => {
  const lines = linesFromLevels(columns);

  it('says levels, crossover and what the candidate meets', () => {
    render(<LevelDiagram lines={lines} axes="over-B" candidate={{ x: 20, sigma: 2, name: 'candidate' }} />);
    const name = screen.getByRole('application').getAttribute('aria-label')!;
    expect(name).toMatch(/changes from sextet A one g to doublet T two g at 10Dq\/B 25.0/);
    expect(name).toMatch(/candidate at 20.0: sextet A one g at 0, doublet T two g at 4.00/);
  });

  it('hides and shows spin multiplicities, but never all', () => {
    render(<LevelDiagram lines={lines} axes="over-B" />);
    const drawn = () =>
      document.querySelectorAll('.plot-stage path[class^="level-"]:not(.level-leader)').length;
    expect(drawn()).toBe(3);
    for (const name of ['doublets', 'quartets']) fireEvent.click(screen.getByRole('button', { name }));
    expect(drawn()).toBe(1);
    fireEvent.click(screen.getByRole('button', { name: 'sextets' }));
    expect(drawn()).toBe(1);
    fireEvent.click(screen.getByRole('button', { name: 'doublets' }));
    expect(drawn()).toBe(2);
  });

  it('draws the uncertainty of the candidate as an extent', () => {
    render(<LevelDiagram lines={lines} axes="over-B" candidate={{ x: 20, sigma: 2, name: 'candidate' }} />);
    const extent = document.querySelector('.plot-stage .plot-extent')!;
    const [left, width] = [Number(extent.getAttribute('x')), Number(extent.getAttribute('width'))];
    const line = Number(document.querySelector('.level-candidate line')!.getAttribute('x1'));
    expect(left + width / 2).toBeCloseTo(line, 6);
  });

  it('converts both axes, but never into wavelengths', () => {
    const inEv = render(
      <UnitProvider initial="eV">
        <LevelDiagram lines={lines} axes="absolute" />
      </UnitProvider>,
    );
    expect(screen.getByText('10Dq / eV')).toBeTruthy();
    inEv.unmount();
    render(
      <UnitProvider initial="nm">
        <LevelDiagram lines={lines} axes="absolute" />
      </UnitProvider>,
    );
    expect(screen.getByText('10Dq / cm⁻¹')).toBeTruthy();
  });

  it('reads a level by keyboard', () => {
    render(<LevelDiagram lines={lines} axes="over-B" />);
    const stage = screen.getByRole('application');
    for (const key of ['ArrowRight', 'ArrowUp', 'ArrowRight']) fireEvent.keyDown(stage, { key });
    expect(screen.getByText('doublet T two g: 12.0 at 10Dq/B 10.0')).toBeTruthy();
  });

  it('says when no field was estimated', () => {
    render(<LevelDiagram lines={[]} axes="absolute" />);
    expect(screen.getByText(/field of this complex is not estimated/)).toBeTruthy();
  });
});
