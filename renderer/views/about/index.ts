import { lazy } from 'react';
import { defineView } from '../../app/view';

export const aboutView = defineView({
  id: 'about',
  title: 'About',
  place: 'workbench',
  order: null,
  under: 'methods',
  command: 'show-about',
  hint: 'Version, parameters, licence, what goes out: nothing',
  component: lazy(() => import('./AboutView')),
});
