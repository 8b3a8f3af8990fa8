import { bulkBands, bulkRoom, levelSurface, type LevelSurface } from '../../core/dshell/surfaces';
import { processorTime } from './measure';
import { seededFractions } from './seededFractions';
import { atLeast, figure, type Bench } from './report';

const ions = [3, 5, 6, 7, 8];
const chunk = 4096;

/** Runs `count` candidates through one surface in chunks that reuse their memory; milliseconds of processor time. */
function bulkTime(surface: LevelSurface, count: number): number {
  const next = seededFractions(7);
  const room = bulkRoom(surface, chunk);
  const tenDq = new Float64Array(chunk);
  const B = new Float64Array(chunk);
  let total = 0;
  for (let done = 0; done < count; done += chunk) {
    const now = Math.min(chunk, count - done);
    for (let i = 0; i < now; i++) {
      tenDq[i] = 6000 + 24_000 * next();
      B[i] = 450 + 600 * next();
    }
    const start = processorTime();
    bulkBands(surface, tenDq, B, room, now);
    total += processorTime() - start;
  }
  return total;
}

/** Memory that lives after a collection, MB; the collector is only there under `--expose-gc`. */
function livingMegabytes(): number {
  (globalThis as { gc?: () => void }).gc?.();
  const { heapUsed, arrayBuffers } = process.memoryUsage();
  return (heapUsed + arrayBuffers) / 1e6;
}

export const bulkCandidates: Bench = {
  name: 'bulk-candidates',
  group: 'engine',
  run({ quick }) {
    const surfaces = ions.map((electrons) => levelSurface(electrons, 'octahedral', 4.5));
    const count = quick ? 20_000 : 200_000;
    surfaces.forEach((surface) => bulkTime(surface, 20_000));
    const times = surfaces.map((surface) => Math.min(...[1, 2, 3].map(() => bulkTime(surface, count))));
    const rates = times.map((time) => (1000 * count) / time);
    const before = livingMegabytes();
    bulkTime(surfaces[2]!, quick ? 100_000 : 1_000_000);
    const growth = livingMegabytes() - before;
    return {
      title: '(d) ground state, spin energies and three bands of cubic candidates through the level surfaces',
      timings: times.map((milliseconds, i) => ({
        what: `d${ions[i]}, ${count.toLocaleString('en')} candidates`,
        milliseconds,
        repeats: 3,
      })),
      figures: [
        figure('slowest ion', Math.min(...rates), 'candidates a second on one core', atLeast(100_000)),
        figure('fastest ion', Math.max(...rates), 'candidates a second on one core'),
        figure(
          'largest interpolation error, rigorous, at B = 1000 cm-1',
          1000 * Math.max(...surfaces.map(({ largestBound }) => largestBound)),
          'cm-1',
        ),
        figure('memory grown over the longest run', Math.max(0, growth), 'MB'),
      ],
      skipped: [],
    };
  },
};

export { bulkTime };
