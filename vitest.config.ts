import { defineConfig } from 'vitest/config';

/** `unit` and `external` need only sources; `built` reads `dist/` and runs after the build. */
export default defineConfig({
  define: { __DRIFTBOOK_VERSION__: JSON.stringify('0.0.0+test') },
  test: {
    environment: 'node',
    coverage: { provider: 'v8', include: ['core/**', 'web/**/*.ts'], exclude: ['web/build/**'] },
    projects: [
      {
        extends: true,
        test: {
          name: 'unit',
          // Property tests by the thousand, on a machine that others share.
          testTimeout: 60_000,
          include: ['test/{core,web}/**/*.test.{ts,tsx}'],
          exclude: ['test/web/budgets.test.ts'],
        },
      },
      { extends: true, test: { name: 'external', include: ['test/external/**/*.test.ts'], testTimeout: 60_000 } },
      { extends: true, test: { name: 'built', include: ['test/web/budgets.test.ts'] } },
    ],
  },
});
