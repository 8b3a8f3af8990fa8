import { readdir, readFile, writeFile } from 'node:fs/promises';
import { join, resolve } from 'node:path';
import { pathToFileURL } from 'node:url';

interface LockedPackage {
  readonly version?: string;
  readonly license?: string;
  readonly dev?: boolean;
  readonly devOptional?: boolean;
  readonly optional?: boolean;
}
export interface Licence {
  readonly name: string;
  readonly version: string;
  readonly licence: string;
  /** Folder of the package, from the root of the project. */
  readonly folder: string;
}

/** Packages whose code is part of the built program, from the lock file. */
export function shippedPackages(lock: {
  readonly packages: Readonly<Record<string, LockedPackage>>;
}): Licence[] {
  return Object.entries(lock.packages)
    .filter(([path, entry]) => path !== '' && !entry.dev && !entry.devOptional && !entry.optional)
    .map(([path, { version = '?', license = 'not stated' }]) => ({
      name: path.slice(path.lastIndexOf('node_modules/') + 'node_modules/'.length),
      version,
      licence: license,
      folder: path,
    }))
    .sort((a, b) => (a.name < b.name ? -1 : 1));
}

async function licenceText(folder: string): Promise<string> {
  const names = await readdir(folder).catch(() => [] as string[]);
  const file = names.find((name) => /^(licen[cs]e|copying)(\.(md|txt))?$/i.test(name));
  return file === undefined
    ? '(no text in the package)'
    : (await readFile(join(folder, file), 'utf8')).trim();
}

/** Names, versions, licences and licence texts of everything that is shipped, as one text. */
export async function collectLicences(root: string): Promise<string> {
  const lock = JSON.parse(await readFile(join(root, 'package-lock.json'), 'utf8')) as Parameters<
    typeof shippedPackages
  >[0];
  const parts = ['Spinhue contains the following packages.\n'];
  for (const { name, version, licence, folder } of shippedPackages(lock)) {
    const text = await licenceText(join(root, folder));
    parts.push(`${'='.repeat(72)}\n${name} ${version} (${licence})\n${'='.repeat(72)}\n${text}\n`);
  }
  return parts.join('\n').replace(/\r\n?/g, '\n');
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? '').href) {
  const root = resolve(import.meta.dirname, '../..');
  await writeFile(join(root, 'assets/public/licences.txt'), await collectLicences(root));
}
