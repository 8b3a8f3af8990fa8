import { appendFileSync, mkdirSync, renameSync, statSync } from 'node:fs';
import { join } from 'node:path';

const largest_bytes = 1_000_000;

/** A small log beside the settings, for what a user may be asked to send along. It holds no project data. */
export function openLog(folder: string): (line: string) => void {
  const path = join(folder, 'spinhue.log');
  return (line) => {
    try {
      mkdirSync(folder, { recursive: true });
      if ((statSync(path, { throwIfNoEntry: false })?.size ?? 0) > largest_bytes) {
        renameSync(path, `${path}.old`);
      }
      appendFileSync(path, `${new Date().toISOString()} ${line.replace(/[\r\n]+/g, ' | ').slice(0, 2000)}\n`);
    } catch {
      // A program that cannot log still runs.
    }
  };
}
