import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { vi } from 'vitest';
import { type Answer, callChannel, type CallName } from '../../renderer/host/contract';
import type * as StandIn from './fakeElectron';

export interface Program {
  readonly electron: typeof StandIn;
  readonly fake: (typeof StandIn)['fake'];
  readonly folder: string;
  readonly window: StandIn.BrowserWindow;
  /** A call as the page makes it. */
  call<N extends CallName>(name: N, payload?: unknown): Promise<Answer<N>>;
  remove(): Promise<void>;
}

export const settled = async (): Promise<void> => {
  for (let i = 0; i < 5; i++) await new Promise((resolve) => setTimeout(resolve, 0));
};

/** Runs the real `main.ts` against the stand-in, in a folder of its own. */
export async function startProgram(
  prepare: (electron: typeof StandIn, folder: string) => void | Promise<void> = () => undefined,
): Promise<Program> {
  vi.resetModules();
  const electron = await import('./fakeElectron');
  const folder = await mkdtemp(join(tmpdir(), 'spinhue-main-'));
  const { fake } = electron;
  fake.reset(folder);
  await prepare(electron, folder);
  await import('../main');
  fake.becomeReady();
  await settled();
  return {
    electron,
    fake,
    folder,
    get window() {
      return fake.windows.at(-1)!;
    },
    call: async <N extends CallName>(name: N, payload: unknown = null) =>
      (await fake.call(callChannel(name), [payload])) as Answer<N>,
    // The program may still be writing its settings: the removal is tried again.
    remove: () => rm(folder, { recursive: true, force: true, maxRetries: 5, retryDelay: 50 }),
  };
}
