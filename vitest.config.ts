import { defineConfig } from 'vitest/config';

export default defineConfig({
  test: {
    environment: 'node',
    projects: [
      { extends: true, test: { name: 'shared', include: ['shared/**/*.spec.ts'] } },
      {
        extends: true,
        test: {
          name: 'server',
          include: ['server/**/*.spec.ts', 'seeds/**/*.spec.ts'],
          testTimeout: 30_000,
        },
      },
      {
        extends: true,
        test: {
          name: 'tests',
          include: ['tests/**/*.spec.ts'],
          exclude: ['tests/e2e/**', 'tests/bench/**'],
          testTimeout: 30_000,
        },
      },
    ],
    coverage: { include: ['shared/**/*.ts', 'server/**/*.ts'], reportsDirectory: 'coverage' },
  },
});
