import { defineConfig } from 'vitest/config';

const root = import.meta.dirname;

/**
 * Three projects, one runner: `unit` needs nothing, `integration` needs the test database, `journeys` needs the built
 * application and a browser. `scripts/test.mjs` provides what the last two need.
 */
export default defineConfig({
  resolve: { alias: { '@': root } },
  test: {
    alias: { '@': root },
    env: { TZ: 'UTC' },
    projects: [
      {
        extends: true,
        test: {
          name: 'unit',
          include: [
            'tests/{checker,templates,statistics,domain,components,policies,presenters,mail,uploads,scripts,lib}/**/*.test.{ts,tsx}',
          ],
          setupFiles: ['tests/setup/block-network.ts'],
        },
      },
      {
        extends: true,
        test: {
          name: 'integration',
          include: ['tests/{db,migrations,services,queries,jobs,routes,auth,queue}/**/*.test.ts'],
          setupFiles: ['tests/setup/block-network.ts', 'tests/setup/database.ts'],
          fileParallelism: false,
          testTimeout: 60_000,
          hookTimeout: 60_000,
        },
      },
      {
        extends: true,
        test: {
          name: 'journeys',
          include: ['tests/journeys/**/*.test.ts'],
          fileParallelism: false,
          testTimeout: 300_000,
          hookTimeout: 180_000,
        },
      },
    ],
  },
});
