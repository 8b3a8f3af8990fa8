import type { BrowserWindowConstructorOptions } from 'electron';
import type { WindowPlace } from './place';

export interface OptionsInput {
  readonly preload: string;
  readonly icon: string;
  readonly place: WindowPlace;
  readonly dark: boolean;
  /** Developer tools exist only while the program is not packaged. */
  readonly packaged: boolean;
}

/** Everything that keeps the page apart from the system is stated, also where Electron's default is the same. */
export function windowOptions({
  preload,
  icon,
  place,
  dark,
  packaged,
}: OptionsInput): BrowserWindowConstructorOptions {
  const { maximised: _, ...bounds } = place;
  return {
    ...bounds,
    minWidth: 720,
    minHeight: 480,
    title: 'Spinhue',
    icon,
    show: false,
    // The page's own surfaces (tokens `--paper`), so that opening does not flash.
    backgroundColor: dark ? '#16191a' : '#f3f4f4',
    webPreferences: {
      preload,
      sandbox: true,
      contextIsolation: true,
      nodeIntegration: false,
      nodeIntegrationInWorker: false,
      nodeIntegrationInSubFrames: false,
      webSecurity: true,
      allowRunningInsecureContent: false,
      experimentalFeatures: false,
      webviewTag: false,
      navigateOnDragDrop: false,
      // Its dictionaries would be fetched from the network.
      spellcheck: false,
      devTools: !packaged,
    },
  };
}
