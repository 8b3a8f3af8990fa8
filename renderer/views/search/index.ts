import { lazy } from 'react';
import { defineView } from '../../app/view';

export const searchView = defineView({
  id: 'search',
  title: 'Find ligands',
  place: 'project',
  order: 2,
  keys: 'g f',
  hint: 'Say what is wanted; every metal and ligand set that the choice allows is ranked by how likely it meets it',
  component: lazy(() => import('./SearchView')),
});
