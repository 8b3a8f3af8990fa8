import type {
  FileData,
  FileHandle,
  FileKind,
  FlushAnswer,
  HostInfo,
  MenuState,
  MirroredProject,
  MirrorReceipt,
  MirrorStatus,
  OpenedFile,
  PdfRequest,
  ProjectCopy,
  SaveAnswer,
  SaveRequest,
  Snapshot,
  SnapshotReason,
  Theme,
  ThemeChoice,
} from './bridge';
import type { Command } from './commands';
import type { HostProblem } from './hostError';
import type { LinkId } from './links';

/** Calls from the page to the program: one payload, one answer. The page's object has one function for each. */
export interface Calls {
  hostInfo: { payload: null; answer: HostInfo };
  saveFile: { payload: SaveRequest; answer: SaveAnswer };
  saveAgain: { payload: { handle: FileHandle; data: FileData }; answer: SaveAnswer };
  openFiles: { payload: { kind: FileKind; many: boolean }; answer: readonly OpenedFile[] };
  dragOut: { payload: { name: string; data: FileData }; answer: null };
  print: { payload: null; answer: null };
  printToPdf: { payload: PdfRequest; answer: SaveAnswer };
  setMenuState: { payload: MenuState; answer: null };
  reload: { payload: null; answer: null };
  setUnsaved: { payload: { what: string | null }; answer: null };
  theme: { payload: null; answer: Theme };
  setTheme: { payload: { choice: ThemeChoice }; answer: Theme };
  openExternal: { payload: { link: LinkId }; answer: null };
  mirrorStatus: { payload: null; answer: MirrorStatus };
  mirrorChooseFolder: { payload: null; answer: MirrorStatus };
  mirrorRevealFolder: { payload: null; answer: null };
  mirrorWrite: { payload: ProjectCopy; answer: MirrorReceipt };
  mirrorProjects: { payload: null; answer: readonly MirroredProject[] };
  mirrorRead: { payload: { projectId: string }; answer: string };
  mirrorSnapshots: { payload: { projectId: string }; answer: readonly Snapshot[] };
  mirrorReadSnapshot: { payload: { projectId: string; snapshotId: string }; answer: string };
  mirrorTakeSnapshot: { payload: { copy: ProjectCopy; reason: SnapshotReason }; answer: Snapshot };
  /** The page listens from now on: what came before that is handed over. */
  pageReady: { payload: null; answer: null };
  flushed: { payload: { request: number; answer: FlushAnswer }; answer: null };
}
export type CallName = keyof Calls;

/** Messages from the program to the page. */
export interface Events {
  command: Command;
  theme: Theme;
  fileOpened: OpenedFile;
  mirrorStatus: MirrorStatus;
  flush: { request: number };
}
export type EventName = keyof Events;

const allCalls: Readonly<Record<CallName, true>> = {
  hostInfo: true,
  saveFile: true,
  saveAgain: true,
  openFiles: true,
  dragOut: true,
  print: true,
  printToPdf: true,
  setMenuState: true,
  reload: true,
  setUnsaved: true,
  theme: true,
  setTheme: true,
  openExternal: true,
  mirrorStatus: true,
  mirrorChooseFolder: true,
  mirrorRevealFolder: true,
  mirrorWrite: true,
  mirrorProjects: true,
  mirrorRead: true,
  mirrorSnapshots: true,
  mirrorReadSnapshot: true,
  mirrorTakeSnapshot: true,
  pageReady: true,
  flushed: true,
};
export const callNames = Object.keys(allCalls) as readonly CallName[];

/** Name of the page's function for an event: `onCommand`. */
export const eventFunctions = {
  command: 'onCommand',
  theme: 'onTheme',
  fileOpened: 'onFileOpened',
  mirrorStatus: 'onMirrorStatus',
  flush: 'onFlush',
} as const satisfies Readonly<Record<EventName, string>>;
export const eventNames = Object.keys(eventFunctions) as readonly EventName[];

/** Channel names on the wire. */
export const callChannel = (name: CallName): string => `spinhue:${name}`;
export const eventChannel = (name: EventName): string => `spinhue:on:${name}`;

/** Failures travel as data: an exception would lose everything but its message on the way. */
export type Answer<N extends CallName> =
  | { readonly ok: true; readonly value: Calls[N]['answer'] }
  | { readonly ok: false; readonly problem: HostProblem };

/** What the preload script puts on `window.spinhue`: these names and no others. */
export type DesktopApi = {
  readonly [N in CallName]: (payload: Calls[N]['payload']) => Promise<Answer<N>>;
} & {
  readonly [E in EventName as (typeof eventFunctions)[E]]: (
    listener: (value: Events[E]) => void,
  ) => () => void;
};

declare global {
  interface Window {
    readonly spinhue?: DesktopApi;
  }
}
