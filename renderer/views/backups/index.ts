import { lazy } from 'react';
import { defineView } from '../../app/view';

export const backupsView = defineView({
  id: 'backups',
  title: 'Copies and snapshots',
  place: 'workbench',
  order: 70,
  command: 'show-backups',
  keys: 'g o',
  hint: 'Where the open files of each project lie, and earlier states to go back to',
  component: lazy(() => import('./BackupsView')),
});
