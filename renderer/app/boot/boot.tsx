import { createRoot, type Root } from 'react-dom/client';
import { getHost, type Host } from '../../host';
import { asStoreError, askForLastingStorage, openStore, type Store } from '../../store';
import { madeWithName } from '../../workers/madeWith';
import { EstimatePool } from '../../workers/pool';
import { bulkWorkers, startEstimateWorker } from '../../workers/startWorker';
import { App } from '../App';
import { followTheme } from '../services';
import type { ViewDefinition } from '../view';
import { bringBackLost, broughtBackWords } from './bringBackLost';
import { warmUpSamples } from './warmUpSamples';
import { loadDemoOnce } from './demo';
import { StartFailure } from './StartFailure';

/** Opens the database and draws the workbench, or says why it cannot. */
export async function boot(views: readonly ViewDefinition[]): Promise<void> {
  const root = createRoot(document.getElementById('root')!);
  const host = await getHost();
  await followTheme(host);
  await start(root, host, views);
}

async function start(root: Root, host: Host, views: readonly ViewDefinition[]): Promise<void> {
  try {
    const store = await openStore({ onTakenOver: () => void host.reload() });
    void askForLastingStorage();
    void tidy(store);
    const broughtBack = await bringBackLost(store, host);
    await loadDemoOnce(store);
    const settings = await store.settings.read();
    const pool = new EstimatePool(startEstimateWorker, bulkWorkers());
    root.render(
      <App
        services={{ store, host, pool }}
        settings={settings}
        views={views}
        notice={broughtBack && broughtBackWords(broughtBack)}
      />,
    );
    requestIdleCallback(() => {
      void pool.warmUp(warmUpSamples);
      for (const { preload } of views) void preload?.().catch(() => undefined);
    });
  } catch (error) {
    const { message, remedy = '' } = asStoreError(error);
    root.render(
      <StartFailure
        error={{ message, remedy }}
        onRetry={() => void start(root, host, views)}
        onShowCopies={host.info.abilities.mirror ? () => void host.mirror.revealFolder() : undefined}
      />,
    );
  }
}

/** Housekeeping that may fail without anybody missing it. */
async function tidy(store: Store): Promise<void> {
  try {
    await store.bin.purgeExpired(store.clock.now());
    const sets = await store.db.parameterSets.toArray();
    await store.estimates.keepOnly([null, ...sets].map(madeWithName));
  } catch {
    // Tried again at the next start.
  }
}
