import { type LevelProblem } from '../../core/dshell';
import { engineRun, fieldWithoutSymmetry } from './engineLevels';
import { noLapack, timeLapack } from './lapack';
import { measure } from './measure';
import { completeMatrices, mlMatrixRun } from './plainMatrices';
import { atLeast, atMost, figure, type Bench } from './report';

const coupled = { dElectrons: 5, B: 800, C: 3400, zeta: 320 } as const;
const low: LevelProblem = { ...coupled, field: fieldWithoutSymmetry };
const octahedral: LevelProblem = { ...coupled, field: { type: 'oct', tenDq: 12_500 } };

export const spinOrbitLevels: Bench = {
  name: 'spin-orbit-levels',
  group: 'engine',
  run({ quick }) {
    const { complex, real } = completeMatrices(low);
    const [engine, cubic] = measure(
      [
        { what: 'this engine, no symmetry', run: engineRun(low) },
        { what: 'this engine, octahedron', run: engineRun(octahedral), batch: 20 },
      ],
      quick ? 5 : 40,
    );
    const [ml] = measure([{ what: 'ml-matrix, real 504 x 504', run: mlMatrixRun([real]) }], 1);
    const lapack = timeLapack(
      [{ what: 'LAPACK, complex Hermitian 252 x 252', complex: true, matrices: [complex] }],
      quick ? 5 : 40,
    );
    return {
      title: '(c) all 252 states of a d5 complex with spin-orbit coupling',
      timings: [engine!, cubic!, ml!, ...(lapack ?? [])],
      figures: [
        figure('faster than ml-matrix', ml!.milliseconds / engine!.milliseconds, 'times', atLeast(10)),
        ...(lapack === null
          ? []
          : [
              figure(
                'time over LAPACK, no symmetry',
                engine!.milliseconds / lapack[0]!.milliseconds,
                'times',
                atMost(2),
              ),
              figure(
                'time over LAPACK, octahedron',
                cubic!.milliseconds / lapack[0]!.milliseconds,
                'times',
                atMost(2),
              ),
            ]),
      ],
      skipped: lapack === null ? [noLapack] : [],
    };
  },
};
