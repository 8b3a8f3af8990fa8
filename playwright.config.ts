import { defineConfig } from '@playwright/test';
import { findChromium } from './main/start/chromium';

const executablePath = findChromium();

export default defineConfig({
  testDir: 'e2e',
  testMatch: '**/*.spec.ts',
  outputDir: 'test-results',
  timeout: 60_000,
  fullyParallel: false,
  workers: 1,
  reporter: [['list'], ['json', { outputFile: '.reports/e2e.json' }]],
  use: {
    locale: 'en-GB',
    timezoneId: 'UTC',
    viewport: { width: 1280, height: 800 },
    trace: 'retain-on-failure',
    launchOptions: {
      ...(executablePath === null ? {} : { executablePath }),
      args: [
        ...['--disable-gpu', '--disable-quic', '--no-first-run', '--disable-background-networking'],
        ...['--disable-component-update', '--disable-sync'],
        // Chromium's own sandbox refuses to run as root.
        ...(process.getuid?.() === 0 ? ['--no-sandbox'] : []),
      ],
    },
  },
});
