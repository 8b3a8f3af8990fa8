/** Data for looking at the plots: invented, of plausible size. */
import { type MomentSeries, type Pair, type ParetoPoint } from '../../plots';
import { grid, normal, stream } from './samples';

const random = stream(11);

export const pairs: readonly Pair[] = Array.from({ length: 26 }, (_, index) => {
  const predicted = 8_000 + 1_000 * index * 0.9;
  const sigma = predicted * 0.07;
  const far = index === 19 ? 3.1 : normal(random) * 0.9;
  return {
    id: String(index),
    name: index === 19 ? '[Fe(CN)6]4-' : `complex ${index + 1}`,
    predicted,
    sigma: index === 4 ? null : sigma,
    measured: predicted + far * sigma,
    u: predicted * 0.015,
    group: ['Cr', 'Co', 'Fe', 'Ni'][index % 4]!,
  };
});

export const paretoPoints: readonly ParetoPoint[] = Array.from({ length: 60 }, (_, index) => {
  const cost = index % 5;
  return {
    id: String(index),
    name: `candidate ${index + 1}`,
    cost,
    probability: Math.max(0.01, Math.min(0.97, 0.15 + 0.14 * cost + 0.16 * normal(random))),
  };
});

/** Gradual spin crossover: van 't Hoff with 20 kJ/mol and 250 K between χT of 0.1 and 3.4. */
const crossover = (T: number): number =>
  0.1 + 3.3 / (1 + Math.exp((20_000 / 8.314462618) * (1 / T - 1 / 250)));
const temperatures = Array.from({ length: 100 }, (_, index) => 4 + 4 * index);

export const moments: readonly MomentSeries[] = [
  {
    name: 'batch 7, solid',
    kind: 'measured',
    points: temperatures
      .filter((_, index) => index % 4 === 0)
      .map((T) => ({ temperature_K: T, chiT: crossover(T) + 0.04 * normal(random), u: 0.08 })),
  },
  {
    name: 'van ’t Hoff',
    kind: 'model',
    points: temperatures.map((T) => ({ temperature_K: T, chiT: crossover(T) })),
  },
  {
    name: 'high spin only',
    kind: 'model',
    points: temperatures.map((T) => ({ temperature_K: T, chiT: 3.4 })),
  },
];

const window = grid.filter((at) => at >= 12_000 && at <= 30_000);
const shape = (centre: number, width: number, height: number): Float64Array =>
  window.map((at) => height * Math.exp(-4 * Math.LN2 * ((at - centre) / width) ** 2));
const [first, second] = [shape(17_400, 3_600, 0.65), shape(24_600, 4_200, 0.75)];
const baseline = window.map((at) => 0.02 + (at - 12_000) * 1e-6);
const sum = window.map((_, index) => first[index]! + second[index]! + baseline[index]!);

export const fit = {
  measured: { wavenumber_cm1: window, value: sum.map((value) => value + 0.004 * normal(random)) },
  fit: sum,
  baseline,
  bands: [
    { name: 'band 1', centre_cm1: 17_400, centreError_cm1: 22, value: first },
    { name: 'band 2', centre_cm1: 24_600, centreError_cm1: 31, value: second },
  ],
};
