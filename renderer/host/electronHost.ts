import type { Host } from './bridge';
import type { Answer, CallName, Calls, DesktopApi } from './contract';
import { HostError } from './hostError';

/** The host inside the desktop program: each call goes through the preload script to the main process. */
export async function electronHost(api: DesktopApi): Promise<Host> {
  async function call<N extends CallName>(
    name: N,
    payload: Calls[N]['payload'],
  ): Promise<Calls[N]['answer']> {
    const send = api[name] as (payload: Calls[N]['payload']) => Promise<Answer<N>>;
    const answer = await send(payload);
    if (!answer.ok) throw new HostError(answer.problem);
    return answer.value;
  }
  const done = async (call: Promise<null>): Promise<void> => void (await call);

  const info = await call('hostInfo', null);
  let ready = false;
  /** Files and commands that came before anybody listened are handed over once. */
  const listening = (): void => {
    if (ready) return;
    ready = true;
    queueMicrotask(() => void call('pageReady', null));
  };

  return {
    info,
    saveFile: (request) => call('saveFile', request),
    saveAgain: (handle, data) => call('saveAgain', { handle, data }),
    openFiles: ({ kind, many = false }) => call('openFiles', { kind, many }),
    dragOut: (file) => done(call('dragOut', file)),
    onFileOpened(listener) {
      const stop = api.onFileOpened(listener);
      listening();
      return stop;
    },
    print: () => done(call('print', null)),
    printToPdf: (request) => call('printToPdf', request),
    onCommand: (listener) => api.onCommand(listener),
    setMenuState: (state) => done(call('setMenuState', state)),
    theme: () => call('theme', null),
    setTheme: (choice) => call('setTheme', { choice }),
    onTheme: (listener) => api.onTheme(listener),
    mirror: {
      status: () => call('mirrorStatus', null),
      chooseFolder: () => call('mirrorChooseFolder', null),
      revealFolder: () => done(call('mirrorRevealFolder', null)),
      write: (copy) => call('mirrorWrite', copy),
      projects: () => call('mirrorProjects', null),
      read: (projectId) => call('mirrorRead', { projectId }),
      snapshots: (projectId) => call('mirrorSnapshots', { projectId }),
      readSnapshot: (projectId, snapshotId) => call('mirrorReadSnapshot', { projectId, snapshotId }),
      takeSnapshot: (copy, reason) => call('mirrorTakeSnapshot', { copy, reason }),
      onStatus: (listener) => api.onMirrorStatus(listener),
    },
    reload: () => done(call('reload', null)),
    setUnsaved: (what) => void call('setUnsaved', { what: what?.slice(0, 300) ?? null }),
    openExternal: (link) => done(call('openExternal', { link })),
    onFlush(listener) {
      return api.onFlush(({ request }) => {
        void listener()
          .catch((error: unknown) => ({
            state: 'unsaved' as const,
            what: error instanceof Error ? error.message.slice(0, 300) : 'the last change',
          }))
          .then((answer) => call('flushed', { request, answer }));
      });
    },
  };
}
