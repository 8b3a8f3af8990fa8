import { spawnSync } from 'node:child_process';
import { existsSync, readdirSync, statSync, utimesSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

const sources = ['core', 'renderer', 'main', 'assets', 'vite.config.ts', 'package-lock.json'];
const stamp = 'dist/built';

function newest(path: string): number {
  const stats = statSync(path);
  if (!stats.isDirectory()) return stats.mtimeMs;
  // A folder's own time tells of files that were removed.
  return Math.max(
    stats.mtimeMs,
    ...readdirSync(path, { withFileTypes: true })
      .filter(({ name }) => !/\.test\.tsx?$/.test(name))
      .map(({ name }) => newest(join(path, name))),
  );
}

/** Whether the built program is missing or older than a source. */
export function isStale(root: string): boolean {
  const marker = join(root, stamp);
  const parts = ['dist/renderer/index.html', 'dist/main/main.js', 'dist/preload/preload.cjs'];
  if (!existsSync(marker) || parts.some((part) => !existsSync(join(root, part)))) return true;
  const built = statSync(marker).mtimeMs;
  return sources.some((path) => existsSync(join(root, path)) && newest(join(root, path)) > built);
}

/** Builds everything; the output is shown only where it fails. */
export function build(root: string): boolean {
  const began = new Date();
  const { status, stdout, stderr } = spawnSync('npm', ['run', '-s', 'build'], {
    cwd: root,
    encoding: 'utf8',
    shell: process.platform === 'win32',
  });
  if (status !== 0) {
    process.stderr.write(`${stdout}${stderr}`);
    return false;
  }
  writeFileSync(join(root, stamp), '');
  // What was edited during the build counts as newer.
  utimesSync(join(root, stamp), began, began);
  return true;
}
