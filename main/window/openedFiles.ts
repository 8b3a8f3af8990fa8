import { isAbsolute, resolve } from 'node:path';
import { fileKinds } from '../../renderer/host/fileKinds';

/** Project bundles among the words of a command line; options and everything else are left alone. */
export function bundlesAmong(words: readonly string[], folder: string): string[] {
  const endings = fileKinds.bundle.endings.map((ending) => `.${ending}`);
  return words
    .slice(1)
    .filter((word) => !word.startsWith('-') && endings.some((ending) => word.toLowerCase().endsWith(ending)))
    .map((word) => (isAbsolute(word) ? word : resolve(folder, word)));
}
