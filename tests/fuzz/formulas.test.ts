import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, expect, test } from 'vitest';
import type { Chance } from '../support/chance.ts';
import { edges, otherBytes, otherValues } from './formula-cases.ts';
import { attempt, chanceOf, IS_LONG, runCases } from './run.ts';

const folder = mkdtempSync(join(tmpdir(), 'fuzz-'));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

const SEEDS = IS_LONG ? [1, 2, 3, 4, 5, 6, 7, 8] : [1];
const CASES = IS_LONG ? 1400 : 70;

test.each(SEEDS)(
  'a formula with other values is refused with a place, or sound (seed %i)',
  (seed) => runCases(seed, CASES, otherValues),
);

test.each(SEEDS)('a formula at the edges is refused with a place, or sound (seed %i)', (seed) =>
  runCases(seed + 2000, CASES, edges),
);

test.each(SEEDS)('a damaged formula file is refused with a place, or sound (seed %i)', (seed) =>
  runCases(seed + 1000, CASES, (random) => otherBytes(random, join(folder, `${seed}.md`))),
);

// Cases that failed once: many contributions and a small difference in the working, and a file that ends with its
// frontmatter.
test.each([
  [2005, 1333, edges],
  [2007, 565, edges],
  [1004, 31, (random: Chance) => otherBytes(random, join(folder, 'again.md'))],
  [1007, 1219, (random: Chance) => otherBytes(random, join(folder, 'again.md'))],
] as const)('seed %i, case %i is sound', (seed, index, run) => {
  expect(attempt(() => run(chanceOf(seed, index))).faults).toEqual([]);
});
