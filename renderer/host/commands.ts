/**
 * Commands that the native menu and the page share. One row each: the menu is built from this table, the page answers
 * `onCommand` by id, and the list of shortcuts shows the same keys. `CmdOrCtrl` is Command on a Mac, Ctrl elsewhere.
 */
export const menuGroups = ['file', 'edit', 'view', 'project', 'help'] as const;
export type MenuGroup = (typeof menuGroups)[number];

export interface CommandRow {
  readonly id: string;
  readonly group: MenuGroup;
  /** As the menu says it; an ellipsis where a dialog follows. */
  readonly title: string;
  readonly keys?: string;
  /** A separator stands above it. */
  readonly apart?: true;
  /** Can be used only while a project is open. */
  readonly needsProject?: true;
}

export const commandTable = [
  { id: 'new-project', group: 'file', title: 'New project…', keys: 'CmdOrCtrl+N' },
  { id: 'show-projects', group: 'file', title: 'All projects', keys: 'CmdOrCtrl+Shift+P' },
  { id: 'import-project', group: 'file', title: 'Import project…', keys: 'CmdOrCtrl+O', apart: true },
  { id: 'merge-project', group: 'file', title: 'Merge another copy…', needsProject: true },
  {
    id: 'export-project',
    group: 'file',
    title: 'Export project…',
    keys: 'CmdOrCtrl+Shift+E',
    needsProject: true,
  },
  { id: 'show-backups', group: 'file', title: 'Copies and snapshots…', apart: true },
  { id: 'choose-mirror-folder', group: 'file', title: 'Folder for copies…' },
  { id: 'print', group: 'file', title: 'Print…', keys: 'CmdOrCtrl+P', apart: true },
  { id: 'print-to-pdf', group: 'file', title: 'Save page as PDF…', keys: 'CmdOrCtrl+Shift+S' },
  { id: 'undo', group: 'edit', title: 'Undo', keys: 'CmdOrCtrl+Z' },
  { id: 'redo', group: 'edit', title: 'Redo', keys: 'CmdOrCtrl+Shift+Z' },
  { id: 'show-bin', group: 'edit', title: 'Bin', apart: true },
  { id: 'show-settings', group: 'edit', title: 'Settings…', keys: 'CmdOrCtrl+,' },
  { id: 'find', group: 'view', title: 'Find commands and records…', keys: 'CmdOrCtrl+K' },
  { id: 'show-candidates', group: 'view', title: 'Candidates', keys: 'CmdOrCtrl+1', apart: true },
  { id: 'show-search', group: 'view', title: 'Search', keys: 'CmdOrCtrl+2' },
  { id: 'show-record', group: 'view', title: 'Lab record', keys: 'CmdOrCtrl+3' },
  { id: 'show-agreement', group: 'view', title: 'Agreement', keys: 'CmdOrCtrl+4' },
  { id: 'show-library', group: 'view', title: 'Library', keys: 'CmdOrCtrl+5' },
  { id: 'theme-system', group: 'view', title: 'Appearance: as the system', apart: true },
  { id: 'theme-light', group: 'view', title: 'Appearance: light' },
  { id: 'theme-dark', group: 'view', title: 'Appearance: dark' },
  {
    id: 'new-candidate',
    group: 'project',
    title: 'New candidate…',
    keys: 'CmdOrCtrl+Shift+N',
    needsProject: true,
  },
  {
    id: 'add-measurement',
    group: 'project',
    title: 'Add measurement…',
    keys: 'CmdOrCtrl+Shift+M',
    needsProject: true,
  },
  { id: 'show-reports', group: 'project', title: 'Reports…', keys: 'CmdOrCtrl+R', needsProject: true },
  { id: 'show-shortcuts', group: 'help', title: 'Keyboard shortcuts', keys: 'CmdOrCtrl+/' },
  { id: 'show-tour', group: 'help', title: 'Tour of the demo project' },
  { id: 'show-methods', group: 'help', title: 'Methods and sources' },
  { id: 'show-about', group: 'help', title: 'About this program', apart: true },
] as const satisfies readonly CommandRow[];

export type CommandId = (typeof commandTable)[number]['id'];

/** Ids in the order of the table. */
export const commandIds: readonly CommandId[] = commandTable.map((row) => row.id);

/** What the menu (or a file opened from outside) asks the page to do. */
export type Command =
  { readonly id: CommandId } | { readonly id: 'open-project'; readonly projectId: string };
