import { type LevelProblem } from '../../core/dshell';
import { engineRun } from './engineLevels';
import { noLapack, timeLapack } from './lapack';
import { measure } from './measure';
import { mlMatrixRun, spinComponentBlocks } from './plainMatrices';
import { atLeast, figure, type BenchOptions, type BenchResult } from './report';

/** What the engine should be ahead of others by, and how many calls make a sample. */
export interface Aims {
  readonly overMlMatrix: number;
  readonly overLapack: number;
  readonly batch: number;
}

/** All levels without spin-orbit coupling, against eigenvalues of the same Hamiltonian blocked by M_S alone. */
export function againstSpinBlocks(
  title: string,
  problem: LevelProblem,
  { overMlMatrix, overLapack, batch }: Aims,
  { quick }: BenchOptions,
): BenchResult {
  const blocks = spinComponentBlocks(problem);
  const [engine, ml] = measure(
    [
      { what: 'this engine', run: engineRun(problem), batch },
      { what: 'ml-matrix on the M_S blocks', run: mlMatrixRun(blocks) },
    ],
    quick ? 3 : 15,
  );
  // Half of the blocks repeat the other half; one who knows that needs only these.
  const oneSign = blocks.slice(0, Math.ceil(blocks.length / 2));
  const lapack = timeLapack(
    [
      { what: 'LAPACK on the M_S blocks', complex: false, matrices: blocks },
      { what: 'LAPACK on the blocks of one sign of M_S', complex: false, matrices: oneSign },
    ],
    quick ? 10 : 60,
  );
  const over = (other: { milliseconds: number }): number => other.milliseconds / engine!.milliseconds;
  return {
    title,
    timings: [engine!, ml!, ...(lapack ?? [])],
    figures: [
      figure('faster than ml-matrix', over(ml!), 'times', atLeast(overMlMatrix)),
      ...(lapack === null
        ? []
        : [
            figure('faster than LAPACK', over(lapack[0]!), 'times', atLeast(overLapack)),
            figure('faster than LAPACK on one sign of M_S', over(lapack[1]!), 'times'),
          ]),
    ],
    skipped: lapack === null ? [noLapack] : [],
  };
}
