import { lazy } from 'react';
import { defineView } from '../../app/view';

export const startView = defineView({
  id: 'start',
  title: 'Projects',
  place: 'workbench',
  order: 0,
  command: 'show-projects',
  keys: 'g p',
  hint: 'All projects: open, create, import, export',
  component: lazy(() => import('./StartView')),
});
