import { lazy } from 'react';
import { defineView } from '../../app/view';

export const reportsView = defineView({
  id: 'reports',
  title: 'Reports',
  place: 'project',
  order: 5,
  command: 'show-reports',
  keys: 'g h',
  hint: 'One page to hand over: candidate card, comparison, record page, agreement, order list',
  component: lazy(() => import('./ReportsView')),
});
