import { lazy } from 'react';
import { defineView } from '../../app/view';

export const settingsView = defineView({
  id: 'settings',
  title: 'Settings',
  place: 'workbench',
  order: 90,
  command: 'show-settings',
  keys: 'g s',
  hint: 'Appearance, units, usual concentration and path, initials, where the data lie',
  component: lazy(() => import('./SettingsView')),
});
