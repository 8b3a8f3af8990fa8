import { useCallback, useEffect, useState } from 'react';
import type { Host, Theme, ThemeChoice } from '../../host';
import { useServices } from './Services';

/** The choice is kept by the program around the page; the page only follows it. */
export function useTheme(): { readonly choice: ThemeChoice; readonly choose: (choice: ThemeChoice) => void } {
  const { host } = useServices();
  const [theme, setTheme] = useState<Theme>({ choice: 'system', dark: false });
  useEffect(() => {
    let current = true;
    const take = (next: Theme): void => {
      if (current) setTheme(next);
    };
    host.theme().then(take, () => undefined);
    const unsubscribe = host.onTheme(take);
    return () => {
      current = false;
      unsubscribe();
    };
  }, [host]);
  const choose = useCallback((choice: ThemeChoice) => void host.setTheme(choice).then(setTheme), [host]);
  return { choice: theme.choice, choose };
}

/** Sets the colours of the page before the first view is drawn and whenever they change. */
export async function followTheme(host: Pick<Host, 'theme' | 'onTheme'>): Promise<void> {
  const apply = ({ dark }: Theme): void => {
    document.documentElement.dataset.theme = dark ? 'dark' : 'light';
  };
  host.onTheme(apply);
  apply(await host.theme());
}
