import { lazy } from 'react';
import { defineView } from '../../app/view';

export const binView = defineView({
  id: 'bin',
  title: 'Bin',
  place: 'workbench',
  order: 80,
  command: 'show-bin',
  hint: 'What was deleted in the last thirty days, to bring back',
  component: lazy(() => import('./BinView')),
});
