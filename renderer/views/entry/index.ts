import { lazy } from 'react';
import { defineView } from '../../app/view';

const load = () => import('./EntryView');

export const entryView = defineView({
  id: 'entry',
  title: 'New candidate',
  place: 'project',
  order: 1,
  under: 'candidates',
  command: 'new-candidate',
  keys: 'g n',
  hint: 'Choose metal, oxidation state, geometry and ligands, with the estimate alongside',
  component: lazy(load),
  preload: load,
});
