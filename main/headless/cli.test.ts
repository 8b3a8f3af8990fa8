import { spawnSync } from 'node:child_process';
import { mkdtemp, readdir, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { commands } from './commands';
import { runHeadless } from './runHeadless';

const root = resolve(import.meta.dirname, '../..');
let folder: string;
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'spinhue-cli-'));
});
afterAll(() => rm(folder, { recursive: true, force: true }));

interface Result {
  readonly code: number;
  readonly out: string;
  readonly err: string;
}
async function headless(words: readonly string[], input = ''): Promise<Result> {
  let out = '';
  let err = '';
  const code = await runHeadless(words, {
    input: (async function* () {
      yield new TextEncoder().encode(input);
    })(),
    out: (text) => (out += text),
    err: (text) => (err += text),
  });
  return { code, out, err };
}

const candidate = {
  id: 'a',
  metal: 'Cr',
  oxidationState: 3,
  geometry: 'octahedral',
  ligands: { h2o: 6 },
};

describe('headless runner', () => {
  it(
    'is a program: reads standard input, writes standard output, sets the exit code',
    { timeout: 120_000 },
    () => {
      const run = (words: readonly string[], input: string) =>
        spawnSync(process.execPath, ['--import', 'tsx', 'main/headless/cli.ts', ...words], {
          cwd: root,
          input,
          encoding: 'utf8',
        });
      const good = run(['estimate', '-'], JSON.stringify([candidate]));
      expect(good.status).toBe(0);
      expect(JSON.parse(good.stdout)).toMatchObject([{ id: 'a' }]);
      expect(run(['nonsense'], '').status).toBe(2);
    },
  );

  it('lists every command in its help', async () => {
    const { code, out } = await headless(['--help']);
    expect(code).toBe(0);
    for (const { name, usage } of commands) expect(out).toContain(`${name} ${usage}`);
  });

  it.each([
    [[], 'no command given'],
    [['estimat', 'x.json'], 'unknown command estimat'],
    [['estimate'], 'usage: estimate FILE.json'],
    [['estimate', 'a.json', 'b.json'], 'usage: estimate FILE.json'],
    [['estimate', 'a.json', '--fast'], 'unknown option --fast'],
    [['estimate', 'a.json', '--out'], '--out needs a value'],
    [['estimate', 'a.json', '--__proto__', 'x'], 'unknown option --__proto__'],
  ])('wrong usage %j ends with exit code 2 and one line that says what is wrong', async (words, why) => {
    const { code, out, err } = await headless(words);
    expect(code).toBe(2);
    expect(out).toBe('');
    expect(err).toContain(why);
    expect(err.trim().split('\n')).toHaveLength(1);
  });

  it('reads standard input for `-` and writes JSON to standard output', async () => {
    const { code, out } = await headless(['estimate', '-'], `\uFEFF${JSON.stringify([candidate])}`);
    expect(code).toBe(0);
    expect(JSON.parse(out)).toMatchObject([{ id: 'a', spin: { state: 'only' } }]);
  });

  it('names the file that cannot be read, the line of broken JSON, and an empty file; exit code 1', async () => {
    const missing = await headless(['estimate', join(folder, 'none.json')]);
    expect(missing).toMatchObject({ code: 1, out: '' });
    expect(missing.err).toContain('none.json');
    const broken = await headless(['estimate', '-'], '[\n {"id": "a",}\n]');
    expect(broken.code).toBe(1);
    expect(broken.err).toMatch(/line 2, column \d+/);
    const empty = await headless(['estimate', '-'], '');
    expect(empty).toMatchObject({ code: 1 });
    expect(empty.err).toContain('is empty');
  });

  it('--out writes the whole answer or leaves the old file, and prints nothing', async () => {
    const target = join(folder, 'out.json');
    await writeFile(target, 'old');
    const good = await headless(['estimate', '-', '--out', target], JSON.stringify([candidate]));
    expect(good).toMatchObject({ code: 0, out: '' });
    expect(JSON.parse(await readFile(target, 'utf8'))).toHaveLength(1);
    await writeFile(target, 'old');
    const bad = await headless(['estimate', '-', `--out=${target}`], '{');
    expect(bad.code).toBe(1);
    expect(await readFile(target, 'utf8')).toBe('old');
    expect((await readdir(folder)).filter((name) => name.endsWith('.part'))).toEqual([]);
    const nowhere = await headless(
      ['estimate', '-', '--out', join(folder, 'no/x.json')],
      JSON.stringify([candidate]),
    );
    expect(nowhere.code).toBe(1);
    expect(nowhere.err).toContain(join(folder, 'no/x.json'));
  });
});
