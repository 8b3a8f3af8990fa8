import { parseArgs } from 'node:util';
import { testStore } from '../../renderer/store/testing/testStore';
import { soakBundles } from './bundleSoak';

/** `npm run soak:bundles -- --count 100000`: mutated bundles and wishes at length; exit code 1 on any fault. */
const { values } = parseArgs({
  options: { count: { type: 'string', default: '100000' }, seed: { type: 'string', default: '1' } },
});
const { store } = await testStore();
await store.projects.create('Here already');
const report = await soakBundles(Number(values.count), Number(values.seed), store, (done, faults) => {
  if (done % 10_000 === 0) process.stderr.write(`${done}, ${faults} faults\n`);
});
report.faults.slice(0, 50).forEach((fault) => process.stdout.write(`${fault}\n`));
process.stdout.write(
  `${report.bundles} mutated bundles and ${report.wishes} mutated wishes: ${report.accepted} accepted, ` +
    `${report.refused} refused, ${report.faults.length} faults, slowest ${Math.round(report.slowest.ms)} ms (seed ${report.slowest.seed})\n`,
);
process.exitCode = report.faults.length === 0 ? 0 : 1;
store.close();
