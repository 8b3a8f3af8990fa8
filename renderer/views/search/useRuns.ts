import { useEffect, useState } from 'react';
import { useServices } from '../../app/services';
import { useVersion } from '../../app/session/observable';
import type { SearchRun } from './run/searchRun';
import { type OpenSearch, searchRuns } from './run/searchRuns';

export interface Runs {
  readonly all: readonly SearchRun[];
  readonly shown: SearchRun | undefined;
  readonly show: (run: SearchRun) => void;
  readonly leftOver: readonly OpenSearch[];
}

/** The searches of a project in this window, and those that an earlier window left. */
export function useRuns(projectId: string): Runs {
  const { store } = useServices();
  useVersion(searchRuns);
  const [id, setId] = useState<string | null>(null);
  useEffect(() => {
    searchRuns
      .open({
        read: async () => (await store.settings.read()).openSearches,
        write: (open) => store.settings.set('openSearches', open),
      })
      .catch(() => undefined);
  }, [store]);
  const all = searchRuns.of(projectId);
  return {
    all,
    shown: all.find(({ setup }) => setup.id === id) ?? all.at(-1),
    show: (run) => setId(run.setup.id),
    leftOver: searchRuns.leftOver(projectId),
  };
}
