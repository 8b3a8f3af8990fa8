import { mkdirSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { parseArgs } from 'node:util';
import { seeded } from '../../core/testing/seeded';
import { soak } from '../../core/testing/mutateSpectra';

const { values } = parseArgs({
  options: {
    count: { type: 'string', default: '1000000' },
    seed: { type: 'string', default: '1' },
    minutes: { type: 'string', default: '60' },
    keep: { type: 'string' },
  },
});
const folder = join(import.meta.dirname, '../../core/testing/spectra');
const files = ['jcamp', 'csv'].flatMap((kind) =>
  readdirSync(join(folder, kind))
    .filter((name) => name !== 'expected.json')
    .map((name) => new Uint8Array(readFileSync(join(folder, kind, name)))),
);

const count = Number(values.count);
const stopAt = Date.now() + Number(values.minutes) * 60_000;
const outcomes: Record<string, number> = {};
let done = 0;
let slowest = 0;
let found = 0;
while (done < count && Date.now() < stopAt) {
  const batch = Math.min(2000, count - done);
  const result = soak(files, batch, Number(values.seed) + done, seeded);
  for (const [outcome, n] of Object.entries(result.outcomes))
    outcomes[outcome] = (outcomes[outcome] ?? 0) + n;
  slowest = Math.max(slowest, result.slowest_ms);
  for (const finding of result.findings) {
    found++;
    process.stdout.write(`seed ${finding.seed}: ${finding.what}\n`);
    if (values.keep !== undefined) {
      mkdirSync(values.keep, { recursive: true });
      writeFileSync(join(values.keep, String(finding.seed)), finding.bytes);
    }
  }
  done += batch;
}
process.stdout.write(
  `${done} mutations, ${found} findings, slowest ${slowest.toFixed(0)} ms, outcomes ${JSON.stringify(outcomes)}\n`,
);
process.exitCode = found > 0 ? 1 : 0;
