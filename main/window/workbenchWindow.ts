import { BrowserWindow, nativeTheme, screen } from 'electron';
import { eventChannel, type EventName, type Events } from '../../renderer/host/contract';
import type { SettingsFile } from '../files/settings';
import { startUrl } from '../guard/origin';
import { windowOptions } from './options';
import { windowPlace } from './place';

export interface WindowPaths {
  readonly preload: string;
  readonly icon: string;
}

/** The one window of the program. */
export class WorkbenchWindow {
  #window: BrowserWindow | null = null;
  #ready = false;
  /** What happened before the page listened. */
  #waiting: { channel: string; value: unknown }[] = [];

  get browserWindow(): BrowserWindow | null {
    return this.#window !== null && !this.#window.isDestroyed() ? this.#window : null;
  }

  open(paths: WindowPaths, settings: SettingsFile, packaged: boolean): BrowserWindow {
    const screens = [screen.getPrimaryDisplay(), ...screen.getAllDisplays()].map(({ workArea }) => workArea);
    const place = windowPlace(settings.values.window, screens);
    const window = new BrowserWindow(
      windowOptions({ ...paths, place, dark: nativeTheme.shouldUseDarkColors, packaged }),
    );
    if (place.maximised) window.maximize();
    window.once('ready-to-show', () => window.show());
    const keepPlace = (): void => {
      if (window.isDestroyed() || window.isMinimized() || window.isFullScreen()) return;
      void settings.change({ window: { ...window.getNormalBounds(), maximised: window.isMaximized() } });
    };
    let timer: NodeJS.Timeout | undefined;
    const soon = (): void => {
      clearTimeout(timer);
      timer = setTimeout(keepPlace, 500);
    };
    window.on('resize', soon);
    window.on('move', soon);
    window.on('closed', () => {
      clearTimeout(timer);
      this.#window = null;
      this.#ready = false;
    });
    window.webContents.on('did-start-loading', () => {
      this.#ready = false;
    });
    this.#window = window;
    void window.loadURL(startUrl);
    return window;
  }

  /** Tells the page, at once or, where it must not be lost, as soon as it listens. Whether it was sent now. */
  send<E extends EventName>(name: E, value: Events[E], keep = false): boolean {
    const window = this.#ready ? this.browserWindow : null;
    window?.webContents.send(eventChannel(name), value);
    if (window === null && keep) this.#waiting.push({ channel: eventChannel(name), value });
    return window !== null;
  }

  pageReady(): void {
    this.#ready = true;
    for (const { channel, value } of this.#waiting.splice(0)) {
      this.browserWindow?.webContents.send(channel, value);
    }
  }

  focus(): void {
    const window = this.browserWindow;
    if (window === null) return;
    if (window.isMinimized()) window.restore();
    window.focus();
  }
}
