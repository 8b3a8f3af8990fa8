import type { ViewDefinition } from '../app/view';
import { binView } from './bin';
import { candidatesView } from './candidates';
import { libraryView } from './library';
import { settingsView } from './settings';
import { startView } from './start';

/** All views of the workbench. A new one is a folder beside these and one line here. */
export const views: readonly ViewDefinition[] = [
  startView,
  candidatesView,
  libraryView,
  binView,
  settingsView,
];
