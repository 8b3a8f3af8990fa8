import { cpus, loadavg } from 'node:os';
import { parseArgs } from 'node:util';
import { benches } from './benches';
import { describe, isMet, type BenchResult } from './report';

const usage = `usage: bench [NAME ...] [--json] [--quick] [--search] [--ui] [--list]
  NAME      only these benches (${benches.map(({ name }) => name).join(', ')})
  --json    results as JSON on standard output
  --quick   fewer repeats and smaller sizes
  --search  the benches of the search instead of those of the engine
  --ui      the benches of the interface instead of those of the engine`;

function options() {
  try {
    return parseArgs({
      allowPositionals: true,
      options: {
        json: { type: 'boolean', default: false },
        quick: { type: 'boolean', default: false },
        search: { type: 'boolean', default: false },
        ui: { type: 'boolean', default: false },
        list: { type: 'boolean', default: false },
      },
    });
  } catch (cause) {
    process.stderr.write(`bench: ${(cause as Error).message}\n${usage}\n`);
    process.exit(2);
  }
}

const { values, positionals } = options();
const unknown = positionals.filter((name) => !benches.some((bench) => bench.name === name));
if (unknown.length > 0) {
  process.stderr.write(`bench: no bench ${unknown.join(', ')}\n${usage}\n`);
  process.exit(2);
}
const groups = [...(values.search ? ['search'] : []), ...(values.ui ? ['ui'] : [])];
const chosen = benches.filter(({ name, group }) =>
  positionals.length > 0
    ? positionals.includes(name)
    : groups.length > 0
      ? groups.includes(group)
      : group === 'engine',
);
if (values.list) {
  process.stdout.write(`${benches.map(({ name, group }) => `${name} (${group})`).join('\n')}\n`);
} else if (chosen.length === 0) {
  process.stderr.write(`bench: there is no bench of that group yet\n`);
} else {
  const machine = {
    node: process.version,
    processor: cpus()[0]?.model ?? 'unknown',
    cores: cpus().length,
    load: loadavg()[0]!,
  };
  if (!values.json) {
    process.stdout.write(
      `Node ${machine.node}, ${machine.processor}, ${machine.cores} cores, load ${machine.load.toFixed(1)}; times are processor time\n\n`,
    );
  }
  const results: (BenchResult & { name: string })[] = [];
  for (const bench of chosen) {
    const result = await bench.run({ quick: values.quick });
    results.push({ name: bench.name, ...result });
    if (!values.json) process.stdout.write(`${describe(result)}\n\n`);
  }
  if (values.json) {
    const withVerdicts = results.map((result) => ({
      ...result,
      figures: result.figures.map((each) => ({ ...each, met: isMet(each) })),
    }));
    process.stdout.write(`${JSON.stringify({ machine, benches: withVerdicts }, null, 1)}\n`);
  }
}
