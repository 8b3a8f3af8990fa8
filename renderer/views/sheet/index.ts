import { lazy } from 'react';
import { defineView } from '../../app/view';

const load = () => import('./SheetView');

export const sheetView = defineView({
  id: 'sheet',
  title: 'Complex',
  place: 'project',
  order: null,
  under: 'candidates',
  hint: 'Everything about one candidate',
  component: lazy(load),
  preload: load,
});
