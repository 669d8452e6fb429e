import { expect, test } from 'vitest';
import type { FormulaChange } from '../../src/edition/changes.ts';
import { changeLines } from '../../src/handbook/changes.ts';
import { packagedReference } from '../support/packaged-reference.ts';

const change: FormulaChange = {
  code: 'TB-001',
  name: 'Test',
  revision: 2,
  revisionBefore: 1,
  weights: [
    { part: 'alkali', id: 'sodium-hydroxide', at: null, before: 140.1, after: 141.25 },
    { part: 'water', id: 'water', at: null, before: 300, after: 300 },
    { part: 'additives', id: 'kaolin', at: 'trace', before: null, after: 10 },
    { part: 'fats', id: 'whale', at: null, before: 50, after: null },
  ],
  shares: [{ id: 'olive', before: 45, after: 50 }],
  superfat: { written: [5, 5], lowestExpanded: [2.1, 1.8], lowestWorstCase: [0.4, -0.3] },
  profile: [{ id: 'iodineValue', before: 57.1, after: 60.2 }],
};

test('old and new stand side by side, and what stayed is not marked', () => {
  const lines = changeLines(change, packagedReference());
  expect(lines.map(({ what, before, after, moved }) => [what, before, after, moved])).toEqual([
    ['Sodium hydroxide', '140.1 g', '141.25 g', true],
    ['Water', '300 g', '300 g', false],
    ['Kaolin (white clay), at trace', '–', '10 g', true],
    ['whale', '50 g', '–', true],
    ['Olive oil, share', '45 %', '50 %', true],
    ['Superfat, as written', '5 %', '5 %', false],
    ['Lowest superfat, expanded', '2.1 %', '1.8 %', true],
    ['Lowest superfat, worst case', '0.4 %', '−0.3 %', true],
    ['Iodine value of the fats', '57.1 g I₂/100 g', '60.2 g I₂/100 g', true],
  ]);
});
