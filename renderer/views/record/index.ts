import { lazy } from 'react';
import { defineView } from '../../app/view';

export const recordView = defineView({
  id: 'record',
  title: 'Lab record',
  place: 'project',
  order: 3,
  command: 'show-record',
  keys: 'g r',
  hint: 'Measurements of each candidate beside what was predicted before them',
  component: lazy(() => import('./RecordView')),
});
