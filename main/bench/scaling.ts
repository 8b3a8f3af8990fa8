import { levelSurface } from '../../core/dshell/surfaces';
import { bulkTime } from './bulkCandidates';
import { engineRun, fieldWithoutSymmetry } from './engineLevels';
import { measure } from './measure';
import { figure, type Bench } from './report';

export const scaling: Bench = {
  name: 'scaling',
  group: 'engine',
  run({ quick }) {
    const surface = levelSurface(6, 'octahedral', 4.5);
    const counts = quick ? [1e3, 1e4, 1e5] : [1e3, 1e4, 1e5, 1e6];
    bulkTime(surface, 2e4);
    const candidates = counts.map((count) => ({
      what: `${count.toLocaleString('en')} d6 candidates`,
      milliseconds: bulkTime(surface, count),
      repeats: 1,
    }));
    const electrons = [1, 2, 3, 4, 5, 6, 7, 8, 9];
    const states = (zeta: number) =>
      measure(
        electrons.map((dElectrons) => ({
          what: `d${dElectrons} without symmetry, ${zeta === 0 ? 'no' : 'with'} spin-orbit coupling`,
          run: engineRun({ dElectrons, B: 800, C: 3400, zeta, field: fieldWithoutSymmetry }),
          batch: 5,
        })),
        quick ? 2 : 8,
      );
    const [free, coupled] = [states(0), states(320)];
    const perCandidate = candidates.map(({ milliseconds }, i) => (1000 * milliseconds) / counts[i]!);
    return {
      title: '(e) time against the number of candidates and against N',
      timings: [...candidates, ...free, ...coupled],
      figures: [
        figure('per candidate, fewest', perCandidate[0]!, 'microseconds'),
        figure('per candidate, most', perCandidate.at(-1)!, 'microseconds'),
      ],
      skipped: [],
    };
  },
};
