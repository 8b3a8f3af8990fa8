// @vitest-environment node
import { describe, expect, it } from 'vitest';
import { testStore } from '../testing/testStore';
import { defaultSettings } from './settings';

describe('settings', () => {
  it('come back after a restart', async () => {
    const { store, reopen } = await testStore();
    await store.settings.set('initials', 'MK');
    await store.settings.set('path_cm', 0.5);
    const later = await reopen();
    expect(await later.settings.read()).toEqual({ ...defaultSettings, initials: 'MK', path_cm: 0.5 });
  });

  it('fall back one by one where a stored value makes no sense', async () => {
    const { store } = await testStore();
    await store.settings.set('initials', 'MK');
    await store.db.settings.bulkPut([
      { key: 'path_cm', value: -3 },
      { key: 'energyUnit', value: { nm: true } },
      { key: 'sort', value: null },
    ]);
    expect(await store.settings.read()).toEqual({ ...defaultSettings, initials: 'MK' });
  });
});
