import type { Command } from '../command';
import { agreement } from './agreement';
import { estimate } from './estimate';
import { checkProject } from './checkProject';
import { colour } from './colour';
import { fitBands } from './fitBands';
import { fitField } from './fitField';
import { levels } from './levels';
import { magnetism } from './magnetism';
import { readSpectrum } from './readSpectrum';
import { recalibrate } from './recalibrate';
import { search } from './search';
import { terms } from './terms';

/** One file per command in this folder; the order here is the order of the help text. */
export const commands: readonly Command[] = [
  estimate,
  search,
  agreement,
  readSpectrum,
  fitBands,
  fitField,
  recalibrate,
  levels,
  magnetism,
  terms,
  colour,
  checkProject,
];
