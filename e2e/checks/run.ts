import { spawn } from 'node:child_process';
import { resolve } from 'node:path';

const root = resolve(import.meta.dirname, '../..');

export interface Outcome {
  readonly ok: boolean;
  readonly output: string;
  readonly seconds: number;
}

/** Runs one tool of the project, keeping what it says. */
export function run(
  tool: string,
  words: readonly string[],
  env: Record<string, string> = {},
): Promise<Outcome> {
  const began = Date.now();
  return new Promise((done) => {
    const child = spawn(tool, words, {
      cwd: root,
      env: { ...process.env, ...env, FORCE_COLOR: '0', NO_COLOR: '1' },
      stdio: ['ignore', 'pipe', 'pipe'],
      shell: process.platform === 'win32',
    });
    let output = '';
    const keep = (chunk: Buffer): void => {
      output = (output + chunk.toString('utf8')).slice(-200_000);
    };
    child.stdout.on('data', keep);
    child.stderr.on('data', keep);
    const finish = (ok: boolean): void => done({ ok, output, seconds: (Date.now() - began) / 1000 });
    child.on('error', (error) => {
      output += error.message;
      finish(false);
    });
    child.on('close', (code) => finish(code === 0));
  });
}

/** Program of a package in node_modules, run by this Node. */
export const runBin = (
  name: string,
  words: readonly string[],
  env?: Record<string, string>,
): Promise<Outcome> =>
  run(process.platform === 'win32' ? `${name}.cmd` : name, words, {
    PATH: `${resolve(root, 'node_modules/.bin')}${process.platform === 'win32' ? ';' : ':'}${process.env.PATH ?? ''}`,
    ...env,
  });
