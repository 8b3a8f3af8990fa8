import { lazy } from 'react';
import { defineView } from '../../app/view';

export const mergeView = defineView({
  id: 'merge',
  title: 'Merge another copy',
  place: 'project',
  order: null,
  command: 'merge-project',
  under: 'candidates',
  hint: 'Bring the changes of a colleague’s copy of this project into yours, record by record',
  component: lazy(() => import('./MergeView')),
});
