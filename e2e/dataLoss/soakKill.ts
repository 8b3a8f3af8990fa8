import { resolve } from 'node:path';
import { parseArgs } from 'node:util';
import { build, isStale } from '../../main/start/buildIfStale';
import { killTest } from './killTest';

/** `npm run soak:kill -- --count 300`: the kill test at length; exit code 1 where anything was lost. */
const { values } = parseArgs({
  options: { count: { type: 'string', default: '300' }, seed: { type: 'string', default: '1' } },
});
const root = resolve(import.meta.dirname, '../..');
if (isStale(root) && !build(root)) throw new Error('the build failed');

const quantile = (values: readonly number[], share: number): number =>
  [...values].sort((a, b) => a - b)[Math.min(values.length - 1, Math.floor(share * values.length))] ?? 0;
const spread = (values: readonly number[]): string =>
  `median ${quantile(values, 0.5)} ms, 99 % ${quantile(values, 0.99)} ms, largest ${Math.max(0, ...values)} ms`;

let told = 0;
const report = await killTest(
  Number(values.count),
  Number(values.seed),
  (done, faults) => {
    // Told at once: what comes after a loss may stop the run before its end.
    for (; told < faults.length; told++) process.stdout.write(`${faults[told]}\n`);
    if (done % 10 === 0) process.stderr.write(`${done} kills, ${faults.length} faults\n`);
  },
  true,
);
report.faults.slice(told).forEach((fault) => process.stdout.write(`${fault}\n`));
process.stdout.write(
  `${report.kills} kills during ${report.confirmed} confirmed edits, ${report.faults.length} faults; ` +
    `${report.rescues} times the engine threw its store away and it was filled from the copies, ` +
    `${report.lostInRescues} confirmed edits younger than the copy; ` +
    `copy behind the screen: ${spread(report.lags_ms)}; caught up after a start: ${spread(report.catchUps_ms)}\n`,
);
process.exitCode = report.faults.length === 0 ? 0 : 1;
