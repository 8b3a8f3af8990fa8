import { lazy } from 'react';
import { defineView } from '../../app/view';

export const compareView = defineView({
  id: 'compare',
  title: 'Compare',
  place: 'project',
  order: null,
  under: 'candidates',
  hint: 'Two to six complexes side by side, their spectra in one picture, and what to order for them',
  component: lazy(() => import('./CompareView')),
});
