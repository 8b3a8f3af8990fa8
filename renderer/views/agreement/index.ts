import { lazy } from 'react';
import { defineView } from '../../app/view';

export const agreementView = defineView({
  id: 'agreement',
  title: 'Agreement',
  place: 'project',
  order: 4,
  command: 'show-agreement',
  keys: 'g a',
  hint: 'How good the predictions have been; parameters that learn from the record',
  component: lazy(() => import('./AgreementView')),
});
