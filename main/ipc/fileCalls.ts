import { mkdtemp, rm } from 'node:fs/promises';
import { basename, dirname, extname, join } from 'node:path';
import { type App, type BrowserWindow, dialog, type FileFilter } from 'electron';
import type { FileKind, SaveAnswer } from '../../renderer/host/bridge';
import { fileKinds } from '../../renderer/host/fileKinds';
import { writeAtomically } from '../files/atomicWrite';
import type { FileHandles } from '../files/fileHandles';
import { readWhole } from '../files/readWhole';
import type { SettingsFile } from '../files/settings';
import type { Handlers } from './answerCalls';

type FileCalls = Pick<Handlers, 'saveFile' | 'saveAgain' | 'openFiles' | 'dragOut' | 'printToPdf'>;

function filters(kind: FileKind): FileFilter[] {
  const { title, endings } = fileKinds[kind];
  const any = { name: 'All files', extensions: ['*'] };
  return endings.length === 0 ? [any] : [{ name: title, extensions: [...endings] }, any];
}

/** Saving, opening, dragging out and PDF: every path comes from a dialog of the system. */
export function fileCalls(
  app: App,
  handles: FileHandles,
  settings: SettingsFile,
  dragIcon: string,
): FileCalls {
  const startFolder = (): string => settings.values.lastFolder ?? app.getPath('documents');
  const remember = (path: string): void => void settings.change({ lastFolder: dirname(path) });

  async function chooseTarget(window: BrowserWindow, kind: FileKind, name: string): Promise<string | null> {
    const { canceled, filePath } = await dialog.showSaveDialog(window, {
      defaultPath: join(startFolder(), name),
      filters: filters(kind),
      properties: ['createDirectory', 'showOverwriteConfirmation'],
    });
    if (canceled || !filePath) return null;
    remember(filePath);
    return filePath;
  }

  async function save(
    window: BrowserWindow,
    kind: FileKind,
    name: string,
    data: string | Uint8Array,
  ): Promise<SaveAnswer> {
    const ending = fileKinds[kind].endings[0];
    const suggested = extname(name) === '' && ending !== undefined ? `${name}.${ending}` : name;
    const path = await chooseTarget(window, kind, suggested);
    if (path === null) return { saved: false };
    await writeAtomically(path, data);
    return { saved: true, name: basename(path), handle: handles.issue(path) };
  }

  return {
    saveFile: ({ kind, suggestedName, data }, window) => save(window, kind, suggestedName, data),
    async saveAgain({ handle, data }) {
      const path = handles.pathOf(handle);
      await writeAtomically(path, data);
      return { saved: true, name: basename(path), handle };
    },
    async openFiles({ kind, many }, window) {
      const { canceled, filePaths } = await dialog.showOpenDialog(window, {
        defaultPath: startFolder(),
        filters: filters(kind),
        properties: many ? ['openFile', 'multiSelections'] : ['openFile'],
      });
      if (canceled || filePaths.length === 0) return [];
      remember(filePaths[0]!);
      const files = [];
      for (const path of filePaths) files.push(await readWhole(path, handles.issue(path)));
      return files;
    },
    async dragOut({ name, data }, window) {
      const folder = await mkdtemp(join(app.getPath('temp'), 'spinhue-drag-'));
      app.once('will-quit', () => void rm(folder, { recursive: true, force: true }));
      const file = join(folder, name);
      await writeAtomically(file, data);
      window.webContents.startDrag({ file, icon: dragIcon });
      return null;
    },
    async printToPdf({ suggestedName, pageSize, landscape }, window) {
      const pdf = await window.webContents.printToPDF({
        pageSize,
        landscape,
        printBackground: true,
        preferCSSPageSize: false,
      });
      return save(window, 'pdf', suggestedName, new Uint8Array(pdf));
    },
  };
}
