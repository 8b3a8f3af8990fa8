import type { App } from 'electron';

/**
 * Two programs on one database folder would damage it: the second start hands its files to the first and ends.
 * False where this process is the second.
 */
export function becomeOnlyInstance(
  app: App,
  onSecondStart: (words: readonly string[], folder: string) => void,
): boolean {
  if (!app.requestSingleInstanceLock()) {
    app.quit();
    return false;
  }
  app.on('second-instance', (_event, words, folder) => onSecondStart(words, folder));
  return true;
}
