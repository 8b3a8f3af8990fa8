import { lazy } from 'react';
import { defineView } from '../../app/view';

const load = () => import('./CandidatesView');

export const candidatesView = defineView({
  id: 'candidates',
  title: 'Candidates',
  place: 'project',
  order: 0,
  command: 'show-candidates',
  keys: 'g c',
  hint: 'All complexes of the project: rank, filter, tag, compare',
  component: lazy(load),
  preload: load,
});
