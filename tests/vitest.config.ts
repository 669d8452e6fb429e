import { defineConfig } from 'vitest/config';

/** Tests that look at the built site, in a browser or as files, share one build of the demo. */
const SITE = ['tests/browser/**/*.test.ts', 'tests/built/**/*.test.ts'];
/** The site of another invented shop, in Spanish and in pounds and ounces. */
const NEWCOMER = ['tests/newcomer/**/*.test.ts'];

export default defineConfig({
  test: {
    // one worker less than cores is the runner's choice; on two cores that leaves one idle
    maxWorkers: '100%',
    testTimeout: 30_000,
    hookTimeout: 180_000,
    reporters: ['default', ['json', { outputFile: '.cache/test-results.json' }]],
    projects: [
      {
        extends: true,
        test: { name: 'unit', include: ['tests/**/*.test.ts'], exclude: [...SITE, ...NEWCOMER] },
      },
      {
        extends: true,
        test: { name: 'site', include: SITE, globalSetup: ['tests/support/build-once.ts'] },
      },
      {
        extends: true,
        test: {
          name: 'newcomer',
          include: NEWCOMER,
          globalSetup: ['tests/newcomer/build-once.ts'],
        },
      },
    ],
  },
});
