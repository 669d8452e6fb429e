import type { FormulaDocument } from '../../src/formulary/document.ts';
import type { superfatCautions } from '../../src/words/en/cautions-superfat.ts';
import type { Cases } from './cases.ts';

const lowest = (formula: number, batch: number) => (document: FormulaDocument) => ({
  ...document,
  superfat: { ...document.superfat, expanded: [formula, 9] as const },
  batches: document.batches.map((size) => ({
    ...size,
    superfat: { weighed: 6, expanded: [batch, 9] as const, worstCase: [batch, 9] as const },
  })),
});
const concession = { reason: 'Tried in a test.', by: 'Head of the bench', on: '2026-10-30' };
const release = (met: boolean) => (document: FormulaDocument) => ({
  ...document,
  release: { ...document.release, floor: 1, lowest: 0.7, met, concession: met ? null : concession },
});

export const SUPERFAT_CASES: Cases<keyof typeof superfatCautions> = {
  'free-alkali-possible': {
    fires: { document: lowest(0.3, -0.01) },
    numbers: { lowest: -0.01, batch: 'One kilogram' },
    says: ['−0.01 %', 'One kilogram'],
    silent: { document: lowest(0.3, 0) },
  },
  'superfat-margin-thin': {
    fires: { document: lowest(0.99, 1.2) },
    numbers: { lowest: 0.99, limit: 1, batch: '' },
    says: ['0.99 %', '1 %'],
    silent: { document: lowest(1, 1.2) },
  },
  'acid-forgotten': {
    // 1 % of citric acid monohydrate is 0.143 mol per kg of fats, about 3.8 % of their 3.7 mol
    fires: {
      formula: {
        superfat: 3,
        additives: [{ additive: 'citric-acid-monohydrate', percentOfFats: 1, at: 'lye' }],
      },
    },
    numbers: {},
    says: ['acid', '−0.'],
    silent: {
      formula: {
        superfat: 5,
        additives: [{ additive: 'citric-acid-monohydrate', percentOfFats: 1, at: 'lye' }],
      },
    },
  },
  'concession-in-force': {
    fires: { document: release(false) },
    numbers: { floor: 1, lowest: 0.7 },
    says: ['0.70 %', 'limit 1 %', 'Head of the bench', '30 Oct 2026'],
    silent: { document: release(true) },
  },
  'after-cook-fats': {
    fires: { formula: { process: 'hot', afterCookFats: [{ fat: 'shea', percentOfFats: 4 }] } },
    numbers: { percent: 4 },
    says: ['Shea butter', '4 %', 'Test the cooked soap for free alkali first'],
    silent: { formula: { process: 'hot' } },
  },
  'wax-in-cold-process': {
    fires: {
      formula: {
        fats: [
          { fat: 'olive', share: 98 },
          { fat: 'beeswax', share: 2 },
        ],
      },
    },
    numbers: { share: 2 },
    says: ['Beeswax', '2 %'],
    silent: {
      formula: {
        process: 'hot',
        fats: [
          { fat: 'olive', share: 98 },
          { fat: 'beeswax', share: 2 },
        ],
      },
    },
  },
  'superfat-high': {
    fires: { formula: { superfat: 10.5 } },
    numbers: { limit: 10 },
    says: ['10.5 %'],
    silent: { formula: { superfat: 10 } },
  },
};
