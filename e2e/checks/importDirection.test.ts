import { resolve } from 'node:path';
import { ESLint } from 'eslint';
import { describe, expect, it } from 'vitest';

const root = resolve(import.meta.dirname, '../..');
const eslint = new ESLint({ cwd: root });

/** What the project's own linter says about a file with this content at this place. */
async function complaints(filePath: string, code: string): Promise<string[]> {
  const [result] = await eslint.lintText(code, { filePath: resolve(root, filePath) });
  return result!.messages.map(({ ruleId, message }) => `${ruleId}: ${message}`);
}

const direction = (found: readonly string[]): string[] =>
  found.filter((each) => each.startsWith('spinhue/import-direction'));

describe('the import rule bites', () => {
  it.each([
    [
      'core/units/x.ts',
      `import { a } from '../../renderer/host/bridge'; a();`,
      'core imports neither main nor renderer',
    ],
    ['core/units/x.ts', `import { a } from '../../main/log'; a();`, 'core imports neither main nor renderer'],
    ['core/units/x.ts', `import { readFile } from 'node:fs'; readFile;`, 'may not import "node:fs"'],
    ['core/units/x.ts', `import { useState } from 'react'; useState;`, 'may not import "react"'],
    ['core/units/x.ts', `import Dexie from 'dexie'; Dexie;`, 'may not import "dexie"'],
    ['core/units/x.ts', `import { app } from 'electron'; app;`, 'may not import "electron"'],
    ['core/units/x.ts', `import { a } from '../dshell/types'; a();`, 'not core/dshell'],
    ['core/units/x.ts', `export * from '../dshell/types';`, 'not core/dshell'],
    ['core/units/x.ts', `export { a } from '../search/x';`, 'not core/search'],
    ['core/dshell/x.ts', `export const f = () => import('../estimation/x');`, 'not core/estimation'],
    ['core/brandNew/x.ts', `import '../units';`, 'no row in the table of layers'],
    ['renderer/views/x.ts', `import { a } from '../../main/log'; a();`, 'renderer never imports main'],
    ['renderer/views/x.ts', `import { readFile } from 'node:fs'; readFile;`, 'no Node and no Electron'],
    [
      'renderer/views/x.ts',
      `import { ipcRenderer } from 'electron'; ipcRenderer;`,
      'no Node and no Electron',
    ],
    [
      'renderer/views/x.ts',
      `import { Line } from 'recharts'; Line;`,
      'only renderer/plots imports "recharts"',
    ],
    ['renderer/views/x.ts', `import Dexie from 'dexie'; Dexie;`, 'only renderer/store imports "dexie"'],
    [
      'main/ipc/x.ts',
      `import { a } from '../../renderer/store/store'; a();`,
      'only the bridge types in renderer/host',
    ],
  ])('%s may not hold %s', async (path, code, why) => {
    const found = direction(await complaints(path, code));
    expect(found).toHaveLength(1);
    expect(found[0]).toContain(why);
  });

  it.each([
    ['core/dshell/x.ts', `import { a } from '../units'; a();`],
    ['core/dshell/x.ts', `import { a } from './types'; a();`],
    ['renderer/plots/x.ts', `import { Line } from 'recharts'; Line;`],
    ['renderer/store/x.ts', `import Dexie from 'dexie'; Dexie;`],
    ['renderer/views/x.ts', `import { a } from '../../core/units'; a();`],
    ['main/ipc/x.ts', `import { a } from '../../renderer/host/contract'; a();`],
    ['main/ipc/x.ts', `import { a } from '../../core/units'; a();`],
  ])('%s may hold %s', async (path, code) => {
    expect(direction(await complaints(path, code))).toEqual([]);
  });

  it('core knows no screen, no clock of its own and no process', async () => {
    const code = 'console.log(window.document, process.env, fetch, setTimeout);';
    const globals = (await complaints('core/units/x.ts', code)).filter((each) =>
      each.startsWith('no-restricted-globals'),
    );
    expect(globals).toHaveLength(5);
  });

  it('markup set from a string is refused in the page', async () => {
    const code = 'export const a = <p dangerouslySetInnerHTML={{ __html: "x" }} />;';
    expect(await complaints('renderer/views/x.tsx', code)).toContain(
      'no-restricted-syntax: Rendered text is text.',
    );
  });

  it('the table of layers itself has no cycle', async () => {
    // A name that the compiler cannot follow: the linter's configuration is plain JavaScript.
    const configuration = '../../eslint.config.js';
    const { coreLayers: layers } = (await import(configuration)) as {
      coreLayers: Readonly<Record<string, readonly string[]>>;
    };
    const done = new Set<string>();
    const visit = (name: string, path: readonly string[]): void => {
      expect(path, `${path.join(' -> ')} -> ${name}`).not.toContain(name);
      if (done.has(name)) return;
      for (const next of layers[name] ?? []) visit(next, [...path, name]);
      done.add(name);
    };
    Object.keys(layers).forEach((name) => visit(name, []));
  });
});
