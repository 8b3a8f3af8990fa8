import { join } from 'node:path';
import { app, nativeTheme, session } from 'electron';
import { FileHandles } from './files/fileHandles';
import { readWhole } from './files/readWhole';
import { SettingsFile } from './files/settings';
import { refuseDownloads } from './guard/downloads';
import { forbidNavigation } from './guard/navigation';
import { blockRequests, silenceNetwork } from './guard/network';
import { denyPermissions } from './guard/permissions';
import { answerCalls } from './ipc/answerCalls';
import { fileCalls } from './ipc/fileCalls';
import { mirrorCalls } from './ipc/mirrorCalls';
import { showMenu, windowCalls } from './ipc/windowCalls';
import { openLog } from './log';
import { registerScheme, serveScheme } from './serving/scheme';
import { answerCrashes } from './window/crash';
import { Leaving } from './window/leaving';
import { emptyMenuState } from './window/menu';
import { becomeOnlyInstance } from './window/oneInstance';
import { bundlesAmong } from './window/openedFiles';
import { WorkbenchWindow } from './window/workbenchWindow';

/** Built files: this one lies in `dist/main` with the icons, the page and the preload script in folders beside it. */
const icons = import.meta.dirname;
const built = join(icons, '..');

// Frozen like the origin: the database lies in this folder, packaged or not.
app.setName('Spinhue');
if (!app.commandLine.hasSwitch('user-data-dir')) {
  app.setPath('userData', join(app.getPath('appData'), 'Spinhue'));
}

const log = openLog(app.getPath('userData'));
const window = new WorkbenchWindow();
const handles = new FileHandles();
const leaving = new Leaving();

async function openFromOutside(path: string): Promise<void> {
  try {
    window.send('fileOpened', await readWhole(path, handles.issue(path)), true);
  } catch (error) {
    log(`a file given to the program was not opened: ${String(error)}`);
  }
  window.focus();
}

function start(): void {
  const settings = new SettingsFile(app.getPath('userData'), log);
  nativeTheme.themeSource = settings.values.theme;

  denyPermissions(session.defaultSession);
  blockRequests(session.defaultSession, app.isPackaged, log);
  refuseDownloads(session.defaultSession);
  serveScheme(join(built, 'renderer'));

  const mirror = mirrorCalls(app, settings, (status) => window.send('mirrorStatus', status));
  // Every call is answered before the page that makes them exists.
  answerCalls(
    {
      ...fileCalls(app, handles, settings, join(icons, 'drag.png')),
      ...mirror.calls,
      ...windowCalls(app, settings, window, leaving),
    },
    () => window.browserWindow,
    log,
  );

  const openWindow = (): void => {
    const opened = window.open(
      { preload: join(built, 'preload/preload.cjs'), icon: join(icons, 'icon.png') },
      settings,
      app.isPackaged,
    );
    answerCrashes(app, opened, log);
    leaving.guard(opened, (request) => window.send('flush', { request }), mirror.idle);
  };
  showMenu(emptyMenuState, window);
  openWindow();
  for (const path of bundlesAmong(process.argv, process.cwd())) void openFromOutside(path);

  app.on('activate', () => {
    if (window.browserWindow === null) openWindow();
  });
}

if (
  becomeOnlyInstance(app, (words, folder) => {
    window.focus();
    for (const path of bundlesAmong(words, folder)) void openFromOutside(path);
  })
) {
  app.enableSandbox();
  registerScheme();
  silenceNetwork(app);
  forbidNavigation(app);
  app.on('session-created', (made) => {
    denyPermissions(made);
    blockRequests(made, app.isPackaged, log);
    refuseDownloads(made);
  });
  app.on('open-file', (event, path) => {
    event.preventDefault();
    void openFromOutside(path);
  });
  app.on('window-all-closed', () => app.quit());
  void app.whenReady().then(start);
}
