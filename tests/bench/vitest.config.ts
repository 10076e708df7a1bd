import { defineConfig } from 'vitest/config';

/** Benches measure and report; they never fail on a slow machine, so that they say what is. */
export default defineConfig({
  test: {
    environment: 'node',
    include: ['tests/bench/**/*.bench.ts'],
    fileParallelism: false,
    testTimeout: 120_000,
  },
});
