export { ServicesProvider, useServices, useStore, type Services } from './Services';
export { SettingsProvider, useSettings } from './SettingsContext';
export { inWords, useAction } from './useAction';
export { useHistory, type History } from './useHistory';
export { useStored, type Stored } from './useStored';
export { followTheme, useTheme } from './useTheme';
export { dayOf, minuteOf } from './dates';
