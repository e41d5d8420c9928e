import { defineConfig } from 'vitest/config';

export default defineConfig({
  test: {
    projects: [
      {
        test: {
          name: 'unit',
          include: ['tests/shared/**/*.test.ts', 'tests/reference/**/*.test.ts', 'tests/web/**/*.test.ts', 'tests/scenario/**/*.test.ts'],
          environment: 'node',
        },
      },
      {
        test: { name: 'api', include: ['tests/server/**/*.test.ts'], environment: 'node', globalSetup: ['tests/support/build-server.mjs'], testTimeout: 20_000 },
      },
      {
        test: {
          name: 'browser',
          include: ['tests/browser/**/*.test.ts'],
          environment: 'node',
          globalSetup: ['tests/support/browser-setup.ts'],
          testTimeout: 60_000,
          hookTimeout: 120_000,
          fileParallelism: false,
        },
      },
    ],
  },
});
