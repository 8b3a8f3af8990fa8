import { type LevelProblem } from '../../core/dshell';
import { engineRun, fieldWithoutSymmetry } from './engineLevels';
import { noLapack, timeLapack } from './lapack';
import { measure } from './measure';
import { mlMatrixRun, spinComponentBlocks } from './plainMatrices';
import { atLeast, figure, type Bench } from './report';

const problem: LevelProblem = { dElectrons: 5, B: 800, C: 3400, field: fieldWithoutSymmetry };

export const lowSymmetryLevels: Bench = {
  name: 'low-symmetry-levels',
  group: 'engine',
  run({ quick }) {
    const blocks = spinComponentBlocks(problem);
    const [engine, ml] = measure(
      [
        { what: 'this engine', run: engineRun(problem), batch: 10 },
        { what: 'ml-matrix on the M_S blocks', run: mlMatrixRun(blocks) },
      ],
      quick ? 3 : 15,
    );
    const nonNegative = blocks.slice(0, Math.ceil(blocks.length / 2));
    const lapack = timeLapack(
      [
        { what: 'LAPACK on the M_S blocks', complex: false, matrices: blocks },
        { what: 'LAPACK on the blocks of one sign of M_S', complex: false, matrices: nonNegative },
      ],
      quick ? 10 : 60,
    );
    const over = (other: { milliseconds: number }): number => other.milliseconds / engine!.milliseconds;
    return {
      title: '(b) all levels of one d5 complex without symmetry, no spin-orbit coupling',
      timings: [engine!, ml!, ...(lapack ?? [])],
      figures: [
        figure('faster than ml-matrix', over(ml!), 'times', atLeast(5)),
        ...(lapack === null
          ? []
          : [
              figure('faster than LAPACK', over(lapack[0]!), 'times', atLeast(1)),
              figure('faster than LAPACK on one sign of M_S', over(lapack[1]!), 'times', atLeast(1)),
            ]),
      ],
      skipped: lapack === null ? [noLapack] : [],
    };
  },
};
