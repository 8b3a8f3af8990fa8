import { randomUUID } from 'node:crypto';
import type { FileHandle } from '../../renderer/host/bridge';
import { HostError } from '../../renderer/host/hostError';

/** Places on disk that the user chose in a dialog; the page holds a random name for each and no path. */
export class FileHandles {
  readonly #paths = new Map<string, string>();

  issue(path: string): FileHandle {
    const handle = randomUUID() as string as FileHandle;
    this.#paths.set(handle, path);
    return handle;
  }

  /** @throws {HostError} `refused` where no dialog issued this handle */
  pathOf(handle: string): string {
    const path = this.#paths.get(handle);
    if (path === undefined) {
      throw new HostError({
        code: 'refused',
        message: 'This file was not chosen in a dialog since the program started.',
        remedy: 'Choose the file again.',
      });
    }
    return path;
  }
}
