import { createContext, use, useCallback, useMemo, useSyncExternalStore, type ReactNode } from 'react';
import { type Address, formatAddress, parseAddress, startAddress } from './address';

interface Router {
  readonly address: Address;
  readonly go: (to: Partial<Address> & Pick<Address, 'view'>) => void;
}

const RouterContext = createContext<Router>({ address: startAddress, go: () => undefined });

const subscribe = (listener: () => void): (() => void) => {
  window.addEventListener('hashchange', listener);
  return () => window.removeEventListener('hashchange', listener);
};

const complete = (to: Partial<Address> & Pick<Address, 'view'>): Address => ({
  project: null,
  item: null,
  ...to,
});

/** The address bar is the only record of where one is: back, forward and reload work by themselves. */
export function RouterProvider({ children }: { readonly children: ReactNode }) {
  const hash = useSyncExternalStore(subscribe, () => window.location.hash);
  const go = useCallback<Router['go']>((to) => {
    window.location.hash = formatAddress(complete(to));
  }, []);
  const router = useMemo(() => ({ address: parseAddress(hash), go }), [hash, go]);
  return <RouterContext value={router}>{children}</RouterContext>;
}

export const useRouter = (): Router => use(RouterContext);

/** `href` of a link to a place. */
export const linkTo = (to: Partial<Address> & Pick<Address, 'view'>): string => formatAddress(complete(to));
