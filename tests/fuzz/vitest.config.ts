import { defineConfig } from 'vitest/config';

/** The long mode of the tests in this folder, by `npm run fuzz`: minutes, more than 20,000 cases. */
export default defineConfig({
  test: {
    include: ['tests/fuzz/**/*.{test,long}.ts'],
    env: { FUZZ: 'long' },
    maxWorkers: '100%',
    testTimeout: 30 * 60_000,
  },
});
