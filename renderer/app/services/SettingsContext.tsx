import { createContext, use, useCallback, useEffect, useMemo, useState, type ReactNode } from 'react';
import { useToast } from '../../parts';
import { asStoreError, defaultSettings, type Settings } from '../../store';
import { useServices } from './Services';

type Set = <K extends keyof Settings>(key: K, value: Settings[K]) => void;

const SettingsContext = createContext<{ readonly settings: Settings; readonly set: Set }>({
  settings: defaultSettings,
  set: () => undefined,
});

interface SettingsProviderProps {
  readonly initial: Settings;
  readonly children: ReactNode;
}

/** Settings are shown as chosen at once and written behind; a failure to write is said and the choice kept on screen. */
export function SettingsProvider({ initial, children }: SettingsProviderProps) {
  const { store } = useServices();
  const toast = useToast();
  const [settings, setSettings] = useState(initial);
  const set = useCallback<Set>(
    (key, value) => {
      setSettings((before) => ({ ...before, [key]: value }));
      store.settings.set(key, value).catch((error: unknown) => {
        toast({
          tone: 'danger',
          message: `The setting holds until you close: ${asStoreError(error).message}`,
        });
      });
    },
    [store, toast],
  );
  useEffect(() => {
    store.journal.signAs(settings.initials);
  }, [store, settings.initials]);
  const value = useMemo(() => ({ settings, set }), [settings, set]);
  return <SettingsContext value={value}>{children}</SettingsContext>;
}

export const useSettings = () => use(SettingsContext);
