export { CommandProvider, useAllCommands, useCommandRegistry, useCommands } from './CommandContext';
export { type Command, type CommandRegistry } from './command';
export { isSingleKey, shownCombo } from './keyCombo';
export { menuCommand } from './menuCommand';
