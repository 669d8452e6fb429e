import { test } from 'vitest';
import { damagedData, otherData } from './data-cases.ts';
import { IS_LONG, runCases } from './run.ts';

const SEEDS = IS_LONG ? [1, 2, 3, 4] : [1];
const CASES = IS_LONG ? 500 : 7;

test.each(SEEDS)('data with other values are refused with a place, or sound (seed %i)', (seed) =>
  runCases(seed + 3000, CASES, otherData),
);

test.each(SEEDS)('damaged data are refused with a place, or sound (seed %i)', (seed) =>
  runCases(seed + 4000, CASES, damagedData),
);
