import { lazy } from 'react';
import { defineView } from '../../app/view';

export const sheetView = defineView({
  id: 'sheet',
  title: 'Complex',
  place: 'project',
  order: null,
  under: 'candidates',
  hint: 'Everything about one candidate',
  component: lazy(() => import('./SheetView')),
});
