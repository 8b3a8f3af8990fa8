import type { Theme, ThemeChoice, Unsubscribe } from './bridge';

const key = 'spinhue-theme';

/** The choice is kept in this browser; `system` follows the system while the window is open. */
export function browserTheme() {
  const query = matchMedia('(prefers-color-scheme: dark)');
  const listeners = new Set<(theme: Theme) => void>();
  const choice = (): ThemeChoice => {
    const kept = localStorage.getItem(key);
    return kept === 'light' || kept === 'dark' ? kept : 'system';
  };
  const theme = (): Theme => {
    const chosen = choice();
    return { choice: chosen, dark: chosen === 'system' ? query.matches : chosen === 'dark' };
  };
  const tell = (): void => listeners.forEach((listener) => listener(theme()));
  query.addEventListener('change', tell);
  return {
    theme,
    setTheme(chosen: ThemeChoice): Theme {
      localStorage.setItem(key, chosen);
      tell();
      return theme();
    },
    onTheme(listener: (theme: Theme) => void): Unsubscribe {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
  };
}
