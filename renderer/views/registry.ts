import type { ViewDefinition } from '../app/view';
import { aboutView } from './about';
import { agreementView } from './agreement';
import { analysisView } from './analysis';
import { backupsView } from './backups';
import { binView } from './bin';
import { candidatesView } from './candidates';
import { compareView } from './compare';
import { diagramView } from './diagram';
import { entryView } from './entry';
import { libraryView } from './library';
import { mergeView } from './merge';
import { methodsView } from './methods';
import { recordView } from './record';
import { reportsView } from './reports';
import { searchView } from './search';
import { settingsView } from './settings';
import { sheetView } from './sheet';
import { startView } from './start';

/** All views of the workbench. A new one is a folder beside these and one line here. */
export const views: readonly ViewDefinition[] = [
  startView,
  candidatesView,
  entryView,
  searchView,
  compareView,
  recordView,
  agreementView,
  reportsView,
  analysisView,
  sheetView,
  libraryView,
  diagramView,
  mergeView,
  backupsView,
  binView,
  methodsView,
  aboutView,
  settingsView,
];
