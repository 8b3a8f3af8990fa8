import { defineConfig } from '@playwright/test';

export default defineConfig({
  testDir: 'e2e',
  testMatch: '**/*.spec.ts',
  timeout: 60_000,
  fullyParallel: false,
  workers: 1,
  reporter: [['list'], ['json', { outputFile: '.reports/e2e.json' }]],
  use: { locale: 'en-GB', timezoneId: 'UTC', trace: 'retain-on-failure' },
});
