import { join } from 'node:path';
import { type App, dialog, shell } from 'electron';
import type { MirrorStatus } from '../../renderer/host/bridge';
import { MirrorFolder, tryFolder } from '../files/mirror/mirrorFolder';
import type { SettingsFile } from '../files/settings';
import type { Handlers } from './answerCalls';
import { mirrorHandlers, type MirrorHandlers } from './mirrorHandlers';

type MirrorCalls = MirrorHandlers & Pick<Handlers, 'mirrorChooseFolder' | 'mirrorRevealFolder'>;

/** The folder of copies: in the documents folder until the user chooses another one. */
export function mirrorCalls(
  app: App,
  settings: SettingsFile,
  onStatus: (status: MirrorStatus) => void,
): { readonly calls: MirrorCalls; readonly idle: () => Promise<void> } {
  const open = (): MirrorFolder => {
    const chosen = settings.values.mirrorFolder;
    return new MirrorFolder({
      folder: chosen ?? join(app.getPath('documents'), 'Spinhue'),
      create: chosen === null,
      stateFile: join(app.getPath('userData'), 'written-copies.json'),
      onStatus,
    });
  };
  let mirror = open();
  return {
    idle: () => mirror.idle(),
    calls: {
      async mirrorChooseFolder(_, window) {
        const { canceled, filePaths } = await dialog.showOpenDialog(window, {
          title: 'Folder for copies of the projects',
          defaultPath: mirror.folder,
          properties: ['openDirectory', 'createDirectory'],
        });
        const folder = filePaths[0];
        if (canceled || folder === undefined) return mirror.status();
        await tryFolder(folder);
        await mirror.idle();
        await settings.change({ mirrorFolder: folder });
        mirror = open();
        onStatus(mirror.status());
        return mirror.status();
      },
      async mirrorRevealFolder() {
        await shell.openPath(mirror.folder);
        return null;
      },
      ...mirrorHandlers(() => mirror),
    },
  };
}
