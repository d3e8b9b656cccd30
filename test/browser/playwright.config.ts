import { defineConfig } from '@playwright/test';
import { chromiumFlags, chromiumPath } from './chromium';

// uPlot reads the browser's language when it is loaded.
process.env['LANG'] = 'en_US.UTF-8';
const cache = '../../.cache';

export default defineConfig({
  testDir: '.',
  outputDir: `${cache}/browser`,
  workers: 2,
  fullyParallel: false,
  timeout: 60_000,
  // A neighbour's work on a shared machine may hold a browser up; what fails twice is ours.
  retries: process.env['CI'] ? 1 : 0,
  projects: [
    { name: 'app', testIgnore: /speed\.spec/ },
    // What is timed runs when nothing else does.
    { name: 'speed', testMatch: /speed\.spec/, workers: 1, dependencies: ['app'] },
  ],
  reporter: [
    ['line'],
    ['json', { outputFile: process.env['PLAYWRIGHT_JSON_OUTPUT_FILE'] ?? `${cache}/reports/browser.json` }],
  ],
  use: {
    locale: 'en-US',
    viewport: { width: 1180, height: 820 },
    launchOptions: { executablePath: chromiumPath, args: chromiumFlags },
  },
});
