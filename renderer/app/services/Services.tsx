import { createContext, use } from 'react';
import type { Host } from '../../host';
import type { Store } from '../../store';
import type { EstimatePool } from '../../workers/pool';

/** What views work with. Made once at the start, replaced by stand-ins in tests. */
export interface Services {
  readonly store: Store;
  readonly host: Host;
  readonly pool: EstimatePool;
}

const ServicesContext = createContext<Services | null>(null);
export const ServicesProvider = ServicesContext.Provider;

export function useServices(): Services {
  const services = use(ServicesContext);
  if (!services) throw new Error('no services around this component');
  return services;
}

export const useStore = (): Store => useServices().store;
