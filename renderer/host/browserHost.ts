import { version } from '../../package.json';
import type { FlushAnswer, Host, HostInfo, Mirror, MirrorStatus } from './bridge';
import { download, upload } from './browserFiles';
import { browserTheme } from './browserTheme';
import { HostError } from './hostError';
import { leaveField } from './leaveField';
import { externalLinks } from './links';
import { callLoopback, hasLoopback, toWire } from './loopback';

const never = () => () => undefined;

function unavailable(what: string, remedy: string): Promise<never> {
  return Promise.reject(
    new HostError({ code: 'unavailable', message: `${what} is not possible in a plain browser.`, remedy }),
  );
}

const noMirror: MirrorStatus = {
  state: 'off',
  folder: null,
  lastWrittenAt: null,
  problem: {
    message: 'This window cannot write copies of the projects to a folder.',
    remedy: 'Open the program with `npm start`, or export each project from time to time.',
  },
};

function loopbackMirror(present: boolean): Mirror {
  const listeners = new Set<(status: MirrorStatus) => void>();
  const tell = async (): Promise<void> => {
    const status = await callLoopback('mirrorStatus', null);
    listeners.forEach((listener) => listener(status));
  };
  /** After a write the status changed, for better or worse. */
  const telling = async <T>(call: Promise<T>): Promise<T> => {
    try {
      return await call;
    } finally {
      void tell().catch(() => undefined);
    }
  };
  const off = (): Promise<never> => unavailable('Writing copies', noMirror.problem!.remedy);
  return {
    status: async () => (present ? callLoopback('mirrorStatus', null) : noMirror),
    chooseFolder: () =>
      unavailable('Choosing the folder', 'Start the program with `npm start -- --mirror FOLDER`.'),
    revealFolder: () => unavailable('Showing the folder', 'Open it in the file manager.'),
    write: (copy) => (present ? telling(callLoopback('mirrorWrite', toWire(copy))) : off()),
    projects: async () => (present ? callLoopback('mirrorProjects', null) : []),
    read: (projectId) => (present ? callLoopback('mirrorRead', { projectId }) : off()),
    snapshots: async (projectId) => (present ? callLoopback('mirrorSnapshots', { projectId }) : []),
    readSnapshot: (projectId, snapshotId) =>
      present ? callLoopback('mirrorReadSnapshot', { projectId, snapshotId }) : off(),
    takeSnapshot: (copy, reason) =>
      present ? telling(callLoopback('mirrorTakeSnapshot', { copy: toWire(copy), reason })) : off(),
    onStatus(listener) {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
  };
}

function platform(): HostInfo['platform'] {
  const agent = navigator.userAgent;
  if (agent.includes('Mac')) return 'mac';
  if (agent.includes('Windows')) return 'windows';
  return agent.includes('Linux') ? 'linux' : 'other';
}

/** The host in an ordinary Chromium: downloads, uploads, the browser's print dialog, copies through the local server. */
export function browserHost(): Host {
  const mirror = hasLoopback();
  const theme = browserTheme();
  let unsaved: string | null = null;
  let flush: (() => Promise<FlushAnswer>) | null = null;

  // Leaving cannot wait for a promise: what is pending is saved as soon as the page is hidden, and asked about here.
  document.addEventListener('visibilitychange', () => {
    if (document.visibilityState !== 'hidden') return;
    void leaveField(() => unsaved)
      .then(() => flush?.())
      .catch(() => undefined);
  });
  addEventListener('beforeunload', (event) => {
    void flush?.().catch(() => undefined);
    if (unsaved !== null) event.preventDefault();
  });

  return {
    info: {
      kind: 'browser',
      version,
      platform: platform(),
      engine: /Chrom(?:e|ium)\/\d+/.exec(navigator.userAgent)?.[0].replace('/', ' ') ?? 'Browser',
      abilities: {
        nativeMenu: false,
        pdf: false,
        mirror,
        chooseMirrorFolder: false,
        dragOut: false,
        saveAgain: false,
      },
    },
    saveFile: async (request) => download(request),
    saveAgain: () => unavailable('Saving to the same place', 'Save the file again under the same name.'),
    openFiles: ({ kind, many = false }) => upload(kind, many),
    dragOut: () => unavailable('Dragging a file out', 'Use the export command.'),
    onFileOpened: never,
    print: async () => print(),
    printToPdf: () => unavailable('Writing a PDF', 'Print, and choose "Save as PDF" as the printer.'),
    onCommand: never,
    setMenuState: async () => undefined,
    theme: async () => theme.theme(),
    setTheme: async (choice) => theme.setTheme(choice),
    onTheme: theme.onTheme,
    mirror: loopbackMirror(mirror),
    async openExternal(link) {
      if (mirror) await callLoopback('openExternal', { link });
      else open(externalLinks[link].url, '_blank', 'noopener,noreferrer');
    },
    reload: async () => location.reload(),
    setUnsaved(what) {
      unsaved = what;
    },
    onFlush(listener) {
      flush = listener;
      return () => {
        if (flush === listener) flush = null;
      };
    },
  };
}
