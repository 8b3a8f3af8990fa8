import { type App, type BrowserWindow, dialog } from 'electron';

/** A crash of the page is answered in plain words; everything stored, and the draft, are there after loading again. */
export function answerCrashes(app: App, window: BrowserWindow, log: (line: string) => void): void {
  let open = false;
  const ask = async (message: string, buttons: [string, string]): Promise<boolean> => {
    if (open) return false;
    open = true;
    try {
      const { response } = await dialog.showMessageBox(window, {
        type: 'error',
        title: 'Spinhue',
        message,
        detail:
          'Everything that was confirmed as saved is in the database and in the folder of copies. ' +
          'What you were typing comes back as a draft.',
        buttons,
        defaultId: 0,
        cancelId: 0,
        noLink: true,
      });
      return response === 1;
    } finally {
      open = false;
    }
  };
  window.webContents.on('render-process-gone', (_event, { reason, exitCode }) => {
    if (reason === 'clean-exit') return;
    log(`the page stopped: ${reason}, code ${exitCode}`);
    const why = reason === 'oom' ? 'it ran out of memory' : reason;
    void ask(`The window stopped working (${why}).`, ['Load it again', 'Quit']).then((quit) => {
      if (quit) app.exit(1);
      else if (!window.isDestroyed()) window.webContents.reload();
    });
  });
  window.on('unresponsive', () => {
    log('the page does not respond');
    void ask('The window does not respond.', ['Wait', 'Load it again']).then((again) => {
      if (again && !window.isDestroyed()) window.webContents.reload();
    });
  });
}
