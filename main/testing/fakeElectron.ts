import { EventEmitter } from 'node:events';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

/**
 * A stand-in for the `electron` module, made by hand: records what the program sets up, refuses what Electron refuses
 * (wrong order, a second handler, values that cannot be cloned), and lets a test play the page and the user. It proves
 * the program's own logic; that Electron does what it is told is shown by the tests with the real binary only.
 */

function early(what: string): void {
  if (fake.ready) throw new Error(`${what} must be called before the program is ready`);
}
function late(what: string): void {
  if (!fake.ready) throw new Error(`${what} cannot be used before the program is ready`);
}

export class FakeFrame {
  url: string;
  constructor(url: string) {
    this.url = url;
  }
}

export class FakeContents extends EventEmitter {
  readonly mainFrame = new FakeFrame('about:blank');
  windowOpenHandler: ((details: { url: string }) => { action: string }) | null = null;
  webRtcPolicy = 'default';
  crashed = false;
  reloads = 0;
  readonly sent: { channel: string; value: unknown }[] = [];
  readonly drags: { file: string; icon: string }[] = [];
  setWindowOpenHandler(handler: (details: { url: string }) => { action: string }): void {
    this.windowOpenHandler = handler;
  }
  setWebRTCIPHandlingPolicy(policy: string): void {
    this.webRtcPolicy = policy;
  }
  isCrashed(): boolean {
    return this.crashed;
  }
  reload(): void {
    this.reloads++;
    this.emit('did-start-loading');
  }
  send(channel: string, value: unknown): void {
    const copy: unknown = structuredClone(value);
    this.sent.push({ channel, value: copy });
    fake.onSend?.(channel, copy);
    ipcRenderer.emit(channel, {}, copy);
  }
  startDrag(item: { file: string; icon: string }): void {
    this.drags.push(item);
  }
  print(_options: unknown, done: () => void): void {
    fake.prints++;
    done();
  }
  async printToPDF(options: Record<string, unknown>): Promise<Buffer> {
    fake.pdfs.push(options);
    return Buffer.from('%PDF-1.7 stand-in');
  }
}

export class BrowserWindow extends EventEmitter {
  readonly webContents = new FakeContents();
  readonly options: Record<string, unknown> & { webPreferences: Record<string, unknown> };
  destroyed = false;
  minimised = false;
  focused = 0;
  edited = false;
  constructor(options: Record<string, unknown> & { webPreferences: Record<string, unknown> }) {
    super();
    late('BrowserWindow');
    this.options = options;
    fake.windows.push(this);
    app.emit('web-contents-created', {}, this.webContents);
  }
  async loadURL(url: string): Promise<void> {
    this.webContents.emit('did-start-loading');
    this.webContents.mainFrame.url = url;
    this.emit('ready-to-show');
  }
  /** What the user does: ask the window to go. */
  close(): void {
    let prevented = false;
    this.emit('close', { preventDefault: () => (prevented = true) });
    if (!prevented) this.destroy();
  }
  destroy(): void {
    if (this.destroyed) return;
    this.destroyed = true;
    this.emit('closed');
    if (fake.windows.every((each) => each.destroyed)) app.emit('window-all-closed');
  }
  isDestroyed(): boolean {
    return this.destroyed;
  }
  isMinimized(): boolean {
    return this.minimised;
  }
  isFullScreen(): boolean {
    return false;
  }
  isMaximized(): boolean {
    return false;
  }
  getNormalBounds(): { x: number; y: number; width: number; height: number } {
    return { x: 10, y: 20, width: 1000, height: 700 };
  }
  setDocumentEdited(edited: boolean): void {
    this.edited = edited;
  }
  maximize(): void {}
  show(): void {}
  restore(): void {
    this.minimised = false;
  }
  focus(): void {
    this.focused++;
  }
}

export class FakeSession extends EventEmitter {
  permissionRequest:
    ((contents: unknown, permission: string, answer: (granted: boolean) => void) => void) | null = null;
  permissionCheck: ((contents: unknown, permission: string) => boolean) | null = null;
  devicePermission: (() => boolean) | null = null;
  displayMedia: ((request: unknown, answer: (streams: object) => void) => void) | null = null;
  beforeRequest: ((details: { url: string }, answer: (verdict: { cancel: boolean }) => void) => void) | null =
    null;
  proxy: unknown = null;
  readonly webRequest = {
    onBeforeRequest: (handler: NonNullable<FakeSession['beforeRequest']>): void => {
      this.beforeRequest = handler;
    },
  };
  setPermissionRequestHandler(handler: FakeSession['permissionRequest']): void {
    this.permissionRequest = handler;
  }
  setPermissionCheckHandler(handler: FakeSession['permissionCheck']): void {
    this.permissionCheck = handler;
  }
  setDevicePermissionHandler(handler: FakeSession['devicePermission']): void {
    this.devicePermission = handler;
  }
  setDisplayMediaRequestHandler(handler: FakeSession['displayMedia']): void {
    this.displayMedia = handler;
  }
  async setProxy(config: unknown): Promise<void> {
    this.proxy = config;
  }
}

class FakeApp extends EventEmitter {
  isPackaged = false;
  sandboxed = false;
  quits = 0;
  exits: number[] = [];
  name = 'electron';
  paths: Record<string, string> = {};
  lock = true;
  readonly switches = new Map<string, string>();
  readonly commandLine = {
    appendSwitch: (name: string, value = ''): void => {
      early('appendSwitch');
      this.switches.set(name, value);
    },
    hasSwitch: (name: string): boolean => this.switches.has(name),
  };
  requestSingleInstanceLock(): boolean {
    return this.lock;
  }
  enableSandbox(): void {
    early('enableSandbox');
    this.sandboxed = true;
  }
  async whenReady(): Promise<void> {
    await fake.readiness;
  }
  getPath(name: string): string {
    return this.paths[name] ?? join(fake.folder, name);
  }
  setPath(name: string, path: string): void {
    early('setPath');
    this.paths[name] = path;
  }
  setName(name: string): void {
    this.name = name;
  }
  getVersion(): string {
    return '0.0.0-stand-in';
  }
  quit(): void {
    this.quits++;
  }
  exit(code: number): void {
    this.exits.push(code);
  }
}

type SchemeHandler = (request: Request) => Promise<Response>;
type CallHandler = (event: unknown, ...words: unknown[]) => unknown;

/** What tests look at and steer. */
export const fake = {
  ready: false,
  readiness: Promise.resolve(),
  becomeReady: (): void => undefined,
  folder: join(tmpdir(), 'spinhue-stand-in'),
  windows: [] as BrowserWindow[],
  schemes: [] as { scheme: string; privileges: Record<string, boolean> }[],
  schemeHandlers: new Map<string, SchemeHandler>(),
  callHandlers: new Map<string, CallHandler>(),
  exposed: {} as Record<string, Record<string, (...words: never[]) => unknown>>,
  menu: [] as Record<string, unknown>[],
  dialogs: [] as { kind: string; options: Record<string, unknown> }[],
  /** Answers of the user to the dialogs that follow; none left means "closed". */
  answers: [] as Record<string, unknown>[],
  opened: [] as string[],
  prints: 0,
  pdfs: [] as Record<string, unknown>[],
  onSend: null as ((channel: string, value: unknown) => void) | null,

  /** A message from a frame, through the structured clone that real messages go through. */
  async call(
    channel: string,
    words: unknown[],
    from?: { frame?: FakeFrame | null; contents?: FakeContents },
  ) {
    const handler = this.callHandlers.get(channel);
    if (!handler) throw new Error(`No handler registered for '${channel}'`);
    const contents = from?.contents ?? this.windows.at(-1)!.webContents;
    const frame = from && 'frame' in from ? from.frame : contents.mainFrame;
    const answer = await handler({ sender: contents, senderFrame: frame }, ...structuredClone(words));
    return structuredClone(answer);
  },
  reset(folder: string): void {
    let become = (): void => undefined;
    const readiness = new Promise<void>((resolve) => {
      become = resolve;
    });
    Object.assign(this, {
      ...{ ready: false, readiness, folder, onSend: null, prints: 0, exposed: {} },
      ...{ windows: [], schemes: [], menu: [], dialogs: [], answers: [], opened: [], pdfs: [] },
    });
    this.becomeReady = () => {
      this.ready = true;
      become();
    };
    this.schemeHandlers.clear();
    this.callHandlers.clear();
    app.removeAllListeners();
    ipcRenderer.removeAllListeners();
    nativeTheme.removeAllListeners();
    app.switches.clear();
    Object.assign(app, { sandboxed: false, isPackaged: false, quits: 0, exits: [], lock: true, paths: {} });
    session.defaultSession = new FakeSession();
    nativeTheme.themeSource = 'system';
  },
};

export const app = new FakeApp();
export const session = { defaultSession: new FakeSession() };

export const protocol = {
  registerSchemesAsPrivileged(schemes: typeof fake.schemes): void {
    early('registerSchemesAsPrivileged');
    if (fake.schemes.length > 0) throw new Error('registerSchemesAsPrivileged may be called once');
    fake.schemes = schemes;
  },
  handle(scheme: string, handler: SchemeHandler): void {
    late('protocol.handle');
    if (fake.schemeHandlers.has(scheme)) throw new Error(`the scheme ${scheme} is handled already`);
    fake.schemeHandlers.set(scheme, handler);
  },
};

export const ipcMain = {
  handle(channel: string, handler: CallHandler): void {
    if (fake.callHandlers.has(channel))
      throw new Error(`Attempted to register a second handler for '${channel}'`);
    fake.callHandlers.set(channel, handler);
  },
};

class FakeIpcRenderer extends EventEmitter {
  invoke(channel: string, ...words: unknown[]): Promise<unknown> {
    return fake.call(channel, words);
  }
}
export const ipcRenderer = new FakeIpcRenderer();

export const contextBridge = {
  exposeInMainWorld(name: string, api: (typeof fake.exposed)[string]): void {
    fake.exposed[name] = api;
  },
};

export const Menu = {
  buildFromTemplate: (template: typeof fake.menu): typeof fake.menu => template,
  setApplicationMenu(menu: typeof fake.menu): void {
    fake.menu = menu;
  },
};

function asked(kind: string, words: unknown[]): Record<string, unknown> | undefined {
  late(`dialog.${kind}`);
  fake.dialogs.push({ kind, options: words.at(-1) as Record<string, unknown> });
  return fake.answers.shift();
}
export const dialog = {
  showSaveDialog: async (...words: unknown[]) => asked('save', words) ?? { canceled: true, filePath: '' },
  showOpenDialog: async (...words: unknown[]) => asked('open', words) ?? { canceled: true, filePaths: [] },
  showMessageBox: async (...words: unknown[]) => asked('message', words) ?? { response: 0 },
};

export const shell = {
  async openExternal(url: string): Promise<void> {
    fake.opened.push(url);
  },
  async openPath(path: string): Promise<string> {
    fake.opened.push(path);
    return '';
  },
};

class FakeTheme extends EventEmitter {
  themeSource = 'system';
  get shouldUseDarkColors(): boolean {
    return this.themeSource === 'dark';
  }
}
export const nativeTheme = new FakeTheme();

const display = { workArea: { x: 0, y: 0, width: 1920, height: 1040 } };
export const screen = { getPrimaryDisplay: () => display, getAllDisplays: () => [display] };
