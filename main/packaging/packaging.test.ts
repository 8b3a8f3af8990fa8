import { readFile } from 'node:fs/promises';
import { createRequire } from 'node:module';
import { join, resolve } from 'node:path';
import { FuseV1Options } from '@electron/fuses';
import { describe, expect, it } from 'vitest';
import { wantedFuses } from './fuses';
import { collectLicences, shippedPackages } from './licences';

const root = resolve(import.meta.dirname, '../..');
const load = createRequire(import.meta.url);

interface BuilderConfig {
  readonly files: unknown;
  readonly electronFuses: Record<string, boolean>;
  readonly fileAssociations: { readonly ext: string }[];
  readonly publish: null;
}
// Inner modules of the pinned electron-builder: the same check that it runs itself, without its network.
const { getConfig, validateConfiguration } = load('app-builder-lib/out/util/config/config.js') as {
  getConfig(folder: string, file: string, given: null): Promise<BuilderConfig>;
  validateConfiguration(config: object, log: object): Promise<void>;
};
const { DebugLogger } = load('builder-util') as { DebugLogger: new (enabled: boolean) => object };
const builder = await getConfig(root, 'electron-builder.yml', null);

describe('packaging', () => {
  it('the configuration fits electron-builder’s own schema, and the check refuses a wrong one', async () => {
    await validateConfiguration(builder, new DebugLogger(false));
    const wrong = validateConfiguration({ ...builder, asarr: true }, new DebugLogger(false));
    await expect(wrong).rejects.toThrow(/asarr/);
  });

  it('the fuses of the package are those of the table', () => {
    const wire = (name: string): string => `${name[0]!.toUpperCase()}${name.slice(1)}`;
    const configured = Object.fromEntries(
      Object.entries(builder.electronFuses).map(([name, on]) => [
        FuseV1Options[wire(name) as keyof typeof FuseV1Options],
        on,
      ]),
    );
    expect(configured).toEqual(wantedFuses);
  });

  it('what is risky is off and integrity is on (Electron’s guide to fuses)', () => {
    expect(wantedFuses).toMatchObject({
      [FuseV1Options.RunAsNode]: false,
      [FuseV1Options.EnableNodeOptionsEnvironmentVariable]: false,
      [FuseV1Options.EnableNodeCliInspectArguments]: false,
      [FuseV1Options.OnlyLoadAppFromAsar]: true,
      [FuseV1Options.EnableEmbeddedAsarIntegrityValidation]: true,
      [FuseV1Options.GrantFileProtocolExtraPrivileges]: false,
    });
  });

  it('packs built files only, updates nothing by itself, and is asked to open project bundles', () => {
    expect(JSON.stringify(builder.files)).toContain('!node_modules/**/*');
    expect(builder.publish).toBeNull();
    expect(builder.fileAssociations[0]!.ext).toBe('spinhue');
  });

  it('the collected licences are those of the locked packages, none of them unknown or restrictive', async () => {
    const lock = JSON.parse(await readFile(join(root, 'package-lock.json'), 'utf8')) as Parameters<
      typeof shippedPackages
    >[0];
    const permissive = new Set([
      'MIT',
      'ISC',
      'BSD-3-Clause',
      'BSD-2-Clause',
      'Apache-2.0',
      'CC0-1.0',
      '0BSD',
    ]);
    const restrictive = shippedPackages(lock).filter(
      ({ licence }) =>
        !licence
          .replace(/[()]/g, '')
          .split(/ AND | OR /)
          .every((each) => permissive.has(each)),
    );
    expect(restrictive).toEqual([]);
    const collected = await readFile(join(root, 'assets/public/licences.txt'), 'utf8');
    expect(collected === (await collectLicences(root)) || 'run npm run licences').toBe(true);
    expect(collected).not.toContain('no text in the package');
  });

  it('the lock file names no download addresses', async () => {
    expect(await readFile(join(root, 'package-lock.json'), 'utf8')).not.toContain('"resolved"');
  });
});
