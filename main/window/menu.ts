import type { MenuItemConstructorOptions } from 'electron';
import type { MenuState } from '../../renderer/host/bridge';
import { type Command, type CommandRow, commandTable, type MenuGroup } from '../../renderer/host/commands';

const titles: Readonly<Record<MenuGroup, string>> = {
  file: '&File',
  edit: '&Edit',
  view: '&View',
  project: '&Project',
  help: '&Help',
};
const separator: MenuItemConstructorOptions = { type: 'separator' };

export const emptyMenuState: MenuState = { projectOpen: false, undo: null, redo: null, recent: [] };

/** The native menu, from the table of commands and what the page says can be done now. */
export function menuTemplate(
  state: MenuState,
  platform: NodeJS.Platform,
  send: (command: Command) => void,
): MenuItemConstructorOptions[] {
  const item = (row: CommandRow & { readonly id: Command['id'] }): MenuItemConstructorOptions[] => {
    const what = row.id === 'undo' ? state.undo : row.id === 'redo' ? state.redo : null;
    return [
      ...(row.apart ? [separator] : []),
      {
        id: row.id,
        label: what === null ? row.title : `${row.title}: ${what}`,
        ...(row.keys === undefined ? {} : { accelerator: row.keys }),
        // Undo stays on without a step: in a text field it takes back typing.
        enabled: row.needsProject ? state.projectOpen : true,
        click: () => send({ id: row.id } as Command),
      },
    ];
  };
  const group = (name: MenuGroup): MenuItemConstructorOptions[] =>
    commandTable.filter((row) => row.group === name).flatMap(item);

  const mac = platform === 'darwin';
  const recent: MenuItemConstructorOptions = {
    id: 'recent',
    label: 'Recent projects',
    enabled: state.recent.length > 0,
    submenu: state.recent.map(({ projectId, name }) => ({
      label: name.replace(/&/g, '&&') || 'Unnamed project',
      click: () => send({ id: 'open-project', projectId }),
    })),
  };
  const file = group('file');
  file.splice(2, 0, recent);
  const clipboard: MenuItemConstructorOptions[] = [
    separator,
    { role: 'cut' },
    { role: 'copy' },
    { role: 'paste' },
    { role: 'selectAll' },
  ];
  const [undo, redo, ...edit] = group('edit');
  return [
    ...(mac ? [{ role: 'appMenu' } as MenuItemConstructorOptions] : []),
    {
      label: titles.file,
      submenu: [...file, separator, mac ? { role: 'close' } : { role: 'quit' }],
    },
    { label: titles.edit, submenu: [undo!, redo!, ...clipboard, ...edit] },
    {
      label: titles.view,
      submenu: [
        ...group('view'),
        separator,
        { role: 'resetZoom' },
        { role: 'zoomIn' },
        { role: 'zoomOut' },
        { role: 'togglefullscreen' },
      ],
    },
    { label: titles.project, submenu: group('project') },
    ...(mac ? [{ role: 'windowMenu' } as MenuItemConstructorOptions] : []),
    { label: titles.help, submenu: group('help') },
  ];
}
