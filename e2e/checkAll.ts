import { mkdirSync, readFileSync, rmSync } from 'node:fs';
import { resolve } from 'node:path';
import { findChromium } from '../main/start/chromium';
import { build } from '../main/start/buildIfStale';
import { add, type Counts, countBrowser, countUnit, none, summary } from './checks/counts';
import { type Outcome, run, runBin } from './checks/run';

/** All checks, one after the other; a failure stops none of the others. The last line is the count. */

const root = resolve(import.meta.dirname, '..');
const reports = resolve(root, '.reports');
const say = (line: string): void => void process.stdout.write(`${line}\n`);

const tail = (text: string, lines = 40): string => text.trimEnd().split('\n').slice(-lines).join('\n');

function report(name: string, seconds: number, counts: Counts, output = ''): Counts {
  say(
    `${counts.failed === 0 ? 'ok    ' : 'FAILED'} ${name.padEnd(14)} ${summary(counts)}  (${Math.round(seconds)} s)`,
  );
  counts.failures.slice(0, 60).forEach((failure) => say(`       ${failure}`));
  if (counts.failed > 0 && output !== '') say(tail(output));
  counts.skips.forEach((skip) => say(`       skipped: ${skip}`));
  return counts;
}

/** A tool that passes or fails as a whole counts as one check. */
const single = (name: string, { ok, output, seconds }: Outcome): Counts =>
  report(name, seconds, { ...none(), passed: ok ? 1 : 0, failed: ok ? 0 : 1 }, output);

/** A runner with a report of its own; without one it failed as a whole. */
function counted(
  name: string,
  { ok, output, seconds }: Outcome,
  file: string,
  count: (text: never) => Counts,
): Counts {
  let counts: Counts;
  try {
    counts = count(JSON.parse(readFileSync(resolve(reports, file), 'utf8')) as never);
  } catch {
    return report(name, seconds, { ...none(), failed: 1, failures: ['the runner left no report'] }, output);
  }
  if (!ok && counts.failed === 0) {
    counts = { ...counts, failed: 1, failures: ['the runner failed outside its tests'] };
  }
  return report(name, seconds, counts, counts.failures.length === 0 ? output : '');
}

async function typecheck(): Promise<Outcome> {
  const projects = ['core', 'renderer', 'main', 'e2e', 'tsconfig.tests.json'];
  const outcomes: Outcome[] = [];
  for (const project of projects) outcomes.push(await runBin('tsc', ['-p', project]));
  return {
    ok: outcomes.every(({ ok }) => ok),
    output: outcomes.map(({ output }) => output).join(''),
    seconds: outcomes.reduce((sum, { seconds }) => sum + seconds, 0),
  };
}

/** On a bare Debian machine the browser can be installed; elsewhere its tests are counted as skipped. */
async function browserReason(): Promise<string | null> {
  if (findChromium() !== null) return null;
  if (process.getuid?.() !== 0 || !(await run('apt-get', ['--version'])).ok) {
    return 'no Chromium on this machine; install one or name it in CHROMIUM';
  }
  say('       installing Chromium with apt-get …');
  await run('apt-get', ['update', '-qq']);
  const packages = ['chromium', 'fonts-dejavu-core'];
  const installed = await run('apt-get', ['install', '-y', '-qq', '--no-install-recommends', ...packages], {
    DEBIAN_FRONTEND: 'noninteractive',
  });
  return installed.ok && findChromium() !== null
    ? null
    : `Chromium could not be installed: ${tail(installed.output, 1)}`;
}

async function browserTests(built: boolean): Promise<Counts> {
  const reason = built ? await browserReason() : 'the build failed';
  const e2eReport = resolve(reports, 'e2e.json');
  rmSync(e2eReport, { force: true });
  if (reason === null)
    return counted('browser tests', await runBin('playwright', ['test']), 'e2e.json', countBrowser);
  const listed = await runBin('playwright', ['test', '--list']);
  const number = Number(/Total: (\d+) test/.exec(listed.output)?.[1] ?? 1);
  return report('browser tests', 0, {
    ...none(),
    skipped: number,
    skips: [`all ${number} browser tests (${reason})`],
  });
}

mkdirSync(reports, { recursive: true });
const unitReport = resolve(reports, 'unit.json');
rmSync(unitReport, { force: true });

const [format, lint, types] = await Promise.all([
  runBin('prettier', ['--check', '--log-level=warn', '.']),
  runBin('eslint', ['.', '--max-warnings=0']),
  typecheck(),
]);
let total = add(single('format', format), single('lint', lint));
total = add(total, single('types', types));
const unit = await runBin('vitest', ['run', '--reporter=json', `--outputFile=${unitReport}`]);
total = add(total, counted('unit tests', unit, 'unit.json', countUnit));
const began = Date.now();
const built = build(root);
total = add(total, single('build', { ok: built, output: '', seconds: (Date.now() - began) / 1000 }));
total = add(total, await browserTests(built));

say(summary(total));
process.exitCode = total.failed === 0 ? 0 : 1;
