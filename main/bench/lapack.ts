import { spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { type Timing } from './report';

/** Real symmetric or complex Hermitian matrices, full and row-major (complex: real and imaginary part side by side). */
export interface MatrixSet {
  readonly what: string;
  readonly complex: boolean;
  readonly matrices: readonly { readonly size: number; readonly entries: Float64Array }[];
}

const script = `
import sys, json, time
import numpy as np
job = json.load(open(sys.argv[1]))
for s in job:
    raw = np.fromfile(s['file'], dtype=np.complex128 if s['complex'] else np.float64)
    mats, at = [], 0
    for n in s['sizes']:
        mats.append(raw[at:at + n * n].reshape(n, n).copy()); at += n * n
    best = 1e99
    t = time.process_time()
    for m in mats: np.linalg.eigvalsh(m)
    batch = max(1, int(0.005 / max(1e-6, time.process_time() - t)))
    for _ in range(s['rounds']):
        t = time.process_time()
        for _ in range(batch):
            for m in mats: np.linalg.eigvalsh(m)
        best = min(best, (time.process_time() - t) / batch)
    print(best * 1000)
`;

/**
 * Eigenvalues of the same matrices by LAPACK through numpy (\`eigvalsh\`: values only), on one thread, in a process of its own,
 * processor time.
 * Null where python3 or numpy is missing.
 */
export function timeLapack(sets: readonly MatrixSet[], rounds: number): Timing[] | null {
  const folder = mkdtempSync(join(tmpdir(), 'bench-'));
  try {
    const job = sets.map(({ complex, matrices }, i) => {
      const file = join(folder, `${i}.bin`);
      writeFileSync(file, Buffer.concat(matrices.map(({ entries }) => Buffer.from(entries.buffer))));
      return { file, complex, rounds, sizes: matrices.map(({ size }) => size) };
    });
    writeFileSync(join(folder, 'job.json'), JSON.stringify(job));
    const one = { OPENBLAS_NUM_THREADS: '1', MKL_NUM_THREADS: '1', OMP_NUM_THREADS: '1' };
    const { status, stdout } = spawnSync('python3', ['-c', script, join(folder, 'job.json')], {
      env: { ...process.env, ...one },
      encoding: 'utf8',
    });
    if (status !== 0) return null;
    const times = stdout.trim().split('\n').map(Number);
    return sets.map(({ what }, i) => ({ what, milliseconds: times[i]!, repeats: rounds }));
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

export const noLapack = 'LAPACK: python3 with numpy was not found';
