import type { BatchDocument, FormulaDocument } from '../../src/formulary/document.ts';
import type { Reference } from '../../src/reference/reference.ts';

/** Only the names that pages look up. All numbers in this file are invented. */
export const REFERENCE = {
  fats: new Map([
    ['olive', { name: 'Olive oil' }],
    ['shea', { name: 'Shea butter' }],
  ]),
  alkalis: new Map([['sodium-hydroxide', { id: 'sodium-hydroxide', name: 'Sodium hydroxide' }]]),
  additives: new Map([
    ['citric-acid', { name: 'Citric acid' }],
    ['kaolin', { name: 'Kaolin' }],
  ]),
  blends: new Map(),
  liquids: new Map(),
  acids: new Map(
    [
      ['C12:0', 'lauric acid', 12, 0, 0],
      ['C18:1', 'oleic acid', 18, 1, 0],
      ['C18:1-OH', 'ricinoleic acid', 18, 1, 1],
      ['C18:2', 'linoleic acid', 18, 2, 0],
    ].map(([id, name, carbons, doubleBonds, hydroxyls]) => [
      id,
      { name, acid: { id, carbons, doubleBonds, hydroxyls } },
    ]),
  ),
  sources: new Map(),
  shop: { batches: [{ id: 'pilot', label: 'Pilot', size: { by: 'fats', mass: 1000 } }] },
} as unknown as Reference;

export const BATCH: BatchDocument = {
  id: 'pilot',
  label: 'Pilot',
  digest: null,
  fats: [{ id: 'olive', weighedMass: 1000, step: 1 }],
  afterCookFats: [{ id: 'shea', weighedMass: 20, step: 0.1 }],
  alkali: [{ id: 'sodium-hydroxide', weighedMass: 139.7, step: 0.1 }],
  weighedWater: 330.4,
  waterStep: 1,
  weighedHeldBack: 30.4,
  heldBackStep: 0.1,
  liquids: [],
  additives: [
    { id: 'kaolin', weighedMass: 10, step: 0.1, at: 'trace' },
    { id: 'citric-acid', weighedMass: 12, step: 0.1, at: 'lye' },
  ],
  massOfFats: 1000,
  total: 1512.1,
  superfat: { weighed: 5.04, expanded: [2.8, 7.2], worstCase: [-0.4, 9] },
  bars: null,
  yield: { poured: 1466.7, releasedMass: 1240, soap: 1000 },
  refused: null,
};

export const REFUSED: BatchDocument = {
  ...BATCH,
  fats: [],
  afterCookFats: [],
  alkali: [],
  weighedWater: null,
  weighedHeldBack: null,
  additives: [],
  massOfFats: null,
  total: null,
  superfat: null,
  yield: null,
  refused: { rule: 'weight-below-scale-step', numbers: {} },
};

export const DOCUMENT = {
  code: 'TT-001',
  name: 'Test Bar',
  kind: 'bar',
  process: 'hot',
  revision: 2,
  fats: [{ id: 'olive', share: 100, mass: 1000, saponificationValue: { lot: 'OL-1' } }],
  alkali: [{ id: 'sodium-hydroxide', form: 'solid', assay: { lot: 'NA-1' } }],
  superfat: { written: 5, expanded: [2.8, 7.2], worstCase: [-0.4, 9], budget: [] },
  profile: {
    acids: { 'C18:2': 10, 'C12:0': 24, 'C18:1': 61.97, 'C18:1-OH': 4 },
  },
  batches: [BATCH],
  breaches: [],
} as unknown as FormulaDocument;
