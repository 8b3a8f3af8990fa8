import { commandTable, type CommandId, type CommandRow } from '../../host';
import type { Command } from './command';

const groupNames: Record<CommandRow['group'], string> = {
  file: 'Projects and files',
  edit: 'Edit',
  view: 'Go to',
  project: 'Project',
  help: 'Help',
};

const rows: ReadonlyMap<string, CommandRow> = new Map(commandTable.map((row) => [row.id, row]));

/** A command that the menu of the window knows, with the title and keys it has there. */
export function menuCommand(id: CommandId, run: () => void, more: Partial<Command> = {}): Command {
  const row = rows.get(id)!;
  const keys = row.keys === undefined ? [] : [row.keys.replace('CmdOrCtrl', 'Mod')];
  return {
    id,
    label: row.title.replace(/…$/, ''),
    group: groupNames[row.group],
    run,
    ...more,
    keys: [...keys, ...(more.keys ?? [])],
  };
}
