import { lazy } from 'react';
import { defineView } from '../../app/view';

export { diagramItem, type DiagramSettings } from './diagramSettings';

export const diagramView = defineView({
  id: 'diagram',
  title: 'Level diagrams',
  place: 'workbench',
  order: 20,
  keys: 'g d',
  hint: 'Levels of any dⁿ ion against the field, octahedral or tetrahedral; crossovers; terms of configurations',
  component: lazy(() => import('./DiagramView')),
});
