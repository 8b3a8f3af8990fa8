import { lazy } from 'react';
import { defineView } from '../../app/view';

export const libraryView = defineView({
  id: 'library',
  title: 'Library',
  place: 'workbench',
  order: 10,
  command: 'show-library',
  keys: 'g l',
  hint: 'Ligands, metal ions and geometries, each value with its source',
  component: lazy(() => import('./LibraryView')),
});
