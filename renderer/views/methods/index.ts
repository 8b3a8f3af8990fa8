import { lazy } from 'react';
import { defineView } from '../../app/view';

export const methodsView = defineView({
  id: 'methods',
  title: 'Methods',
  place: 'workbench',
  order: 60,
  command: 'show-methods',
  keys: 'g m',
  hint: 'What each quantity is, how it is computed, after whom, and when it fails',
  component: lazy(() => import('./MethodsView')),
});
