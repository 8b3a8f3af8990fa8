import type { FlushAnswer, Host, OpenedFile } from './bridge';
import type { Answer, CallName, Calls, DesktopApi } from './contract';
import { HostError } from './hostError';
import { leaveField } from './leaveField';

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
  /** Files that came before anybody listened are handed over once somebody does. */
  const early: OpenedFile[] = [];
  let fileListener: ((file: OpenedFile) => void) | null = null;
  api.onFileOpened((file) => (fileListener ? fileListener(file) : early.push(file)));

  let unsaved: string | null = null;
  let flush: (() => Promise<FlushAnswer>) | null = null;
  async function answerFlush(): Promise<FlushAnswer> {
    const what = await leaveField(() => unsaved);
    const answer = (await flush?.()) ?? { state: 'saved' };
    return answer.state === 'saved' && what !== null ? { state: 'unsaved', what } : answer;
  }
  api.onFlush(({ request }) => {
    void answerFlush()
      .catch((error: unknown): FlushAnswer => ({
        state: 'unsaved',
        what: error instanceof Error ? error.message.slice(0, 300) : 'the last change',
      }))
      .then((answer) => call('flushed', { request, answer }));
  });
  await call('pageReady', null);

  return {
    info,
    saveFile: (request) => call('saveFile', request),
    saveAgain: (handle, data) => call('saveAgain', { handle, data }),
    openFiles: ({ kind, many = false }) => call('openFiles', { kind, many }),
    dragOut: (file) => done(call('dragOut', file)),
    onFileOpened(listener) {
      fileListener = listener;
      early.splice(0).forEach(listener);
      return () => {
        if (fileListener === listener) fileListener = null;
      };
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
    setUnsaved(what) {
      unsaved = what?.slice(0, 300) ?? null;
      void call('setUnsaved', { what: unsaved });
    },
    openExternal: (link) => done(call('openExternal', { link })),
    onFlush(listener) {
      flush = listener;
      return () => {
        if (flush === listener) flush = null;
      };
    },
  };
}
