import { lazy } from 'react';
import { defineView } from '../../app/view';

export const analysisView = defineView({
  id: 'analysis',
  title: 'Measured bands',
  place: 'project',
  order: null,
  under: 'record',
  hint: 'Treat one spectrum, fit and assign its bands, fit its field',
  component: lazy(() => import('./AnalysisView')),
});
