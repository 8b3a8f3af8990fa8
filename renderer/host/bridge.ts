import type { Command } from './commands';
import type { LinkId } from './links';

/** What runs the page, known before the first view is drawn. */
export interface HostInfo {
  readonly kind: 'desktop' | 'browser';
  readonly version: string;
  readonly platform: 'linux' | 'mac' | 'windows' | 'other';
  /** For the about box: `Electron 45.5.0, Chromium 150`. */
  readonly engine: string;
  /** What this host can do; a command that needs more is hidden or says why it is off. */
  readonly abilities: {
    /** The menu is outside the page; the page then draws none of its own. */
    readonly nativeMenu: boolean;
    /** `printToPdf` writes a file; otherwise the print dialog must do. */
    readonly pdf: boolean;
    /** Projects are mirrored to a folder of open files. */
    readonly mirror: boolean;
    readonly chooseMirrorFolder: boolean;
    /** A file can be dragged out of the window. */
    readonly dragOut: boolean;
    /** `saveAgain` writes to the place chosen before; otherwise it asks or downloads. */
    readonly saveAgain: boolean;
  };
}

/** What a dialog offers; each is a list of endings kept by the host. */
export type FileKind =
  'bundle' | 'spectrum' | 'json' | 'csv' | 'text' | 'html' | 'svg' | 'png' | 'pdf' | 'any';

/** Stands for a place on disk that the user chose in a dialog; the page never sees or sends a path. */
export type FileHandle = string & { readonly handle: unique symbol };

export type FileData = string | Uint8Array;

export interface SaveRequest {
  readonly kind: FileKind;
  /** A file name without folders. */
  readonly suggestedName: string;
  /** Text is written as UTF-8. */
  readonly data: FileData;
}

/** `saved: false` means that the user closed the dialog. */
export type SaveAnswer =
  | { readonly saved: true; readonly name: string; readonly handle: FileHandle | null }
  | { readonly saved: false };

export interface OpenedFile {
  readonly name: string;
  readonly bytes: Uint8Array;
  /** ISO 8601, UTC. */
  readonly modifiedAt: string | null;
  readonly handle: FileHandle | null;
}

export interface PdfRequest {
  readonly suggestedName: string;
  readonly pageSize: 'A4' | 'Letter';
  readonly landscape: boolean;
}

export type ThemeChoice = 'system' | 'light' | 'dark';
export interface Theme {
  readonly choice: ThemeChoice;
  readonly dark: boolean;
}

export const snapshotReasons = [
  'continuous',
  'by-hand',
  'before-import',
  'before-restore',
  'before-upgrade',
  'before-recalibration',
  'changed-elsewhere',
] as const;
export type SnapshotReason = (typeof snapshotReasons)[number];

/** A project as it shall lie in the mirror folder. */
export interface ProjectCopy {
  readonly projectId: string;
  readonly projectName: string;
  /** Text of the whole project bundle (`writeBundle`). */
  readonly bundle: string;
  /** Further open files for people and spreadsheets, written beside the bundle: plain file names, text or bytes. */
  readonly extras?: readonly { readonly name: string; readonly data: FileData }[];
}

export interface MirrorStatus {
  readonly state: 'off' | 'ready' | 'failing';
  /** Shown to the user; null where there is none. */
  readonly folder: string | null;
  readonly lastWrittenAt: string | null;
  /** Why it is off or failing, and what to do. */
  readonly problem: { readonly message: string; readonly remedy: string } | null;
}

export interface MirrorReceipt {
  readonly writtenAt: string;
  /**
   * Set where the file in the folder was changed by somebody else since the last write: that version was put aside as
   * this snapshot before ours replaced it. Offer to merge it.
   */
  readonly putAside: string | null;
}

export interface Snapshot {
  readonly id: string;
  readonly takenAt: string;
  readonly reason: SnapshotReason;
  readonly bytes: number;
}

export interface MirroredProject {
  readonly projectId: string;
  readonly name: string;
  readonly writtenAt: string;
  readonly bytes: number;
  readonly snapshots: number;
}

export interface Mirror {
  status(): Promise<MirrorStatus>;
  /** Asks for a folder; unchanged where the user closes the dialog. */
  chooseFolder(): Promise<MirrorStatus>;
  /** Shows the folder in the file manager. */
  revealFolder(): Promise<void>;
  /** Temporary file, flush, rename; a snapshot of what was there before, when one is due. */
  write(copy: ProjectCopy): Promise<MirrorReceipt>;
  projects(): Promise<readonly MirroredProject[]>;
  /** Text of the mirrored bundle, for opening a copy when the database is lost. */
  read(projectId: string): Promise<string>;
  snapshots(projectId: string): Promise<readonly Snapshot[]>;
  readSnapshot(projectId: string, snapshotId: string): Promise<string>;
  /** Mirrors this state of the project and keeps it as a snapshot of its own. */
  takeSnapshot(copy: ProjectCopy, reason: SnapshotReason): Promise<Snapshot>;
  onStatus(listener: (status: MirrorStatus) => void): Unsubscribe;
}

/** What the page answers when the window is about to close. */
export type FlushAnswer =
  | { readonly state: 'saved' }
  /** Something on screen cannot be saved; `what` completes "Close and lose ...?". */
  | { readonly state: 'unsaved'; readonly what: string };

export interface RecentProject {
  readonly projectId: string;
  readonly name: string;
}

export type Unsubscribe = () => void;

/**
 * Everything the page may ask of the program around it. Two implementations: the desktop program (through the preload
 * script) and a plain browser. Whatever fails rejects with a `HostError`; a closed dialog is no failure.
 */
export interface Host {
  readonly info: HostInfo;

  saveFile(request: SaveRequest): Promise<SaveAnswer>;
  /** Writes to a place chosen before, without asking. */
  saveAgain(handle: FileHandle, data: FileData): Promise<SaveAnswer>;
  /** Asks for files; an empty list where the user closes the dialog. */
  openFiles(request: { readonly kind: FileKind; readonly many?: boolean }): Promise<readonly OpenedFile[]>;
  /** Call within `dragstart`, after `preventDefault()`. */
  dragOut(file: { readonly name: string; readonly data: FileData }): Promise<void>;
  /** A project bundle was opened from outside: double click, command line, second start. */
  onFileOpened(listener: (file: OpenedFile) => void): Unsubscribe;

  print(): Promise<void>;
  printToPdf(request: PdfRequest): Promise<SaveAnswer>;

  /**
   * Commands from the native menu. Where `abilities.nativeMenu` is set the menu also owns the keys of the table, and the
   * page leaves those keys alone; elsewhere the page handles them itself.
   */
  onCommand(listener: (command: Command) => void): Unsubscribe;
  /** What the native menu shows; to be called when it changes. */
  setMenuState(state: MenuState): Promise<void>;

  theme(): Promise<Theme>;
  setTheme(choice: ThemeChoice): Promise<Theme>;
  onTheme(listener: (theme: Theme) => void): Unsubscribe;

  readonly mirror: Mirror;

  openExternal(link: LinkId): Promise<void>;

  /** Loads the page afresh; nothing else can navigate the window. */
  reload(): Promise<void>;
  /** Something on screen is not stored yet (`what` completes "Close and lose ...?"); null once everything is. */
  setUnsaved(what: string | null): void;
  /** The listener saves what is pending and says how it went; the window waits for it. One listener at a time. */
  onFlush(listener: () => Promise<FlushAnswer>): Unsubscribe;
}

export interface MenuState {
  readonly projectOpen: boolean;
  /** What undo and redo would do (`delete 3 candidates`); null where there is nothing. */
  readonly undo: string | null;
  readonly redo: string | null;
  readonly recent: readonly RecentProject[];
}
