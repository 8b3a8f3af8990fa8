import { readdir, readFile } from 'node:fs/promises';
import { join, relative, sep } from 'node:path';

const root = join(import.meta.dirname, '../..');

/** The program's own source files, tests and test helpers left out, for rules that a search can check. */
export async function sourceFiles(folders: readonly string[]): Promise<{ path: string; text: string }[]> {
  const found: { path: string; text: string }[] = [];
  for (const folder of folders) {
    for (const entry of await readdir(join(root, folder), { recursive: true, withFileTypes: true })) {
      if (!entry.isFile() || !/\.tsx?$/.test(entry.name) || /\.test\.tsx?$/.test(entry.name)) continue;
      const path = relative(root, join(entry.parentPath, entry.name)).split(sep).join('/');
      if (/^(main|core)\/(testing|bench|safety)\//.test(path)) continue;
      found.push({ path, text: await readFile(join(root, path), 'utf8') });
    }
  }
  return found;
}
