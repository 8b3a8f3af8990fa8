import { type App, Menu, nativeTheme, shell } from 'electron';
import type { HostInfo, MenuState, Theme } from '../../renderer/host/bridge';
import type { SettingsFile } from '../files/settings';
import { addressOf } from '../guard/externalLinks';
import type { Leaving } from '../window/leaving';
import { menuTemplate } from '../window/menu';
import type { WorkbenchWindow } from '../window/workbenchWindow';
import type { Handlers } from './answerCalls';

type WindowCalls = Pick<
  Handlers,
  | 'hostInfo'
  | 'print'
  | 'setMenuState'
  | 'theme'
  | 'setTheme'
  | 'openExternal'
  | 'reload'
  | 'setUnsaved'
  | 'pageReady'
  | 'flushed'
>;

const platforms: Partial<Record<NodeJS.Platform, HostInfo['platform']>> = {
  linux: 'linux',
  darwin: 'mac',
  win32: 'windows',
};

export function hostInfo(app: App): HostInfo {
  return {
    kind: 'desktop',
    version: app.getVersion(),
    platform: platforms[process.platform] ?? 'other',
    engine: `Electron ${process.versions.electron ?? '?'}, Chromium ${process.versions.chrome ?? '?'}`,
    abilities: {
      nativeMenu: true,
      pdf: true,
      mirror: true,
      chooseMirrorFolder: true,
      dragOut: true,
      saveAgain: true,
    },
  };
}

export function showMenu(state: MenuState, window: WorkbenchWindow): void {
  Menu.setApplicationMenu(
    Menu.buildFromTemplate(
      menuTemplate(state, process.platform, (command) => window.send('command', command)),
    ),
  );
}

export function windowCalls(
  app: App,
  settings: SettingsFile,
  ours: WorkbenchWindow,
  leaving: Leaving,
): WindowCalls {
  const theme = (): Theme => ({ choice: settings.values.theme, dark: nativeTheme.shouldUseDarkColors });
  nativeTheme.themeSource = settings.values.theme;
  nativeTheme.on('updated', () => ours.send('theme', theme()));
  return {
    hostInfo: () => hostInfo(app),
    print: (_, window) =>
      new Promise((resolve) => {
        // A closed dialog is no failure, and a failed printer has told the user itself.
        window.webContents.print({ printBackground: true }, () => resolve(null));
      }),
    setMenuState(state) {
      showMenu(state, ours);
      return null;
    },
    theme,
    setTheme({ choice }) {
      void settings.change({ theme: choice });
      nativeTheme.themeSource = choice;
      return theme();
    },
    async openExternal({ link }) {
      await shell.openExternal(addressOf(link));
      return null;
    },
    reload(_, window) {
      window.webContents.reload();
      return null;
    },
    setUnsaved({ what }, window) {
      window.setDocumentEdited(what !== null);
      return null;
    },
    pageReady() {
      ours.pageReady();
      return null;
    },
    flushed({ request, answer }) {
      leaving.answered(request, answer);
      return null;
    },
  };
}
