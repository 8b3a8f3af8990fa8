import { parseArgs } from 'node:util';
import { coverage, trueSpectra } from '../../core/testing/bands/coverage';

const { values } = parseArgs({
  options: { draws: { type: 'string', default: '1000' }, seed: { type: 'string', default: '1' } },
});
let failed = false;
for (const [name, truth] of Object.entries(trueSpectra)) {
  const result = coverage(truth, Number(values.draws), Number(values.seed));
  const ok = result.centresWithin3 >= 0.99 && result.within1 >= 0.63 && result.within1 <= 0.73;
  failed ||= !ok;
  process.stdout.write(
    `${name}: ${result.draws} draws, ${result.failed} not converged, centres within 3 se ${(100 * result.centresWithin3).toFixed(2)} %, ` +
      `all parameters within 1 se ${(100 * result.within1).toFixed(1)} %, slowest fit ${result.worst_ms.toFixed(0)} ms\n`,
  );
}
process.exitCode = failed ? 1 : 0;
