import { resolve } from 'node:path';
import { defineConfig } from 'vitest/config';

const root = import.meta.dirname;

export default defineConfig({
  test: {
    testTimeout: 30_000,
    projects: [
      {
        extends: true,
        test: { name: 'core', environment: 'node', include: ['core/**/*.test.ts'] },
      },
      {
        extends: true,
        test: { name: 'renderer', environment: 'happy-dom', include: ['renderer/**/*.test.{ts,tsx}'] },
      },
      {
        extends: true,
        // The real `electron` package would try to download a binary as soon as it is loaded.
        resolve: { alias: { electron: resolve(root, 'main/testing/fakeElectron.ts') } },
        test: { name: 'main', environment: 'node', include: ['main/**/*.test.ts', 'e2e/**/*.test.ts'] },
      },
    ],
  },
});
