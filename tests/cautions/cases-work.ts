import { grams } from '../../src/chemistry/quantity.ts';
import type { BatchDocument, FormulaDocument } from '../../src/formulary/document.ts';
import type { Formula } from '../../src/formulary/formula.ts';
import type { Reference } from '../../src/reference/reference.ts';
import type { workCautions } from '../../src/words/en/cautions-work.ts';
import type { Cases } from './cases.ts';
import { batchSize } from './context.ts';

const fats = (...shares: readonly (readonly [string, number])[]): Partial<Formula> => ({
  fats: shares.map(([fat, share]) => ({ fat, share })),
});
const additive = (
  additive: string,
  percentOfFats: number,
  at: Formula['additives'][number]['at'] = 'trace',
): Partial<Formula> => ({ additives: [{ additive, percentOfFats, at }] });
const refused = (rule: string) => (document: FormulaDocument) => ({
  ...document,
  batches: document.batches.map(
    (size): BatchDocument => ({
      ...size,
      refused: { rule, numbers: {} },
    }),
  ),
});
const vessel = (millilitres: number) => (reference: Reference) => ({
  ...reference,
  shop: { ...reference.shop, batches: [batchSize({ vessel: millilitres })] },
});
const heatLimit = (mass: number) => (reference: Reference) => ({
  ...reference,
  shop: { ...reference.shop, batches: [batchSize({ heatLimit: grams(mass) })] },
});
const fatsPoured = (massOfFats: number) => (document: FormulaDocument) => ({
  ...document,
  batches: document.batches.map((size) => ({ ...size, massOfFats })),
});
const reworkCap = (percent: number) => (reference: Reference) => ({
  ...reference,
  shop: { ...reference.shop, reworkCap: percent },
});
const batter = (total: number) => (document: FormulaDocument) => ({
  ...document,
  batches: document.batches.map((size) => ({ ...size, total })),
});
const unsaturated = (mono: number, poly: number) => (document: FormulaDocument) => ({
  ...document,
  profile: document.profile && {
    ...document.profile,
    monounsaturated: mono,
    polyunsaturated: poly,
  },
});
/** What a supplier could state of lavender oil, invented for a test. */
const stated = (name: string, max: number, unit: string) =>
  ({
    name,
    value: null,
    min: null,
    max,
    unit,
    source: 'ingredient-practice',
    at: 'invented for a test',
    how: 'supplier',
    statistic: 'range',
    samples: null,
    temperature: null,
    note: null,
  }) as const;
const lavenderWith =
  (...values: readonly ReturnType<typeof stated>[]) =>
  (reference: Reference): Reference => {
    const id = 'essential-oil-lavender';
    const lavender = reference.additives.get(id);
    if (!lavender) throw new Error('no lavender oil in the data');
    const additives = new Map(reference.additives).set(id, {
      ...lavender,
      values: [...lavender.values, ...values],
    });
    return { ...reference, additives };
  };
const withMaximum = lavenderWith(stated('maximum-in-product', 2, 'g/100 g'));
const withFlashPoint = lavenderWith(stated('flash-point', 70, 'degC'));
const lavenderAt = (max: number): Partial<Formula> => ({
  ...additive('essential-oil-lavender', 2),
  targets: { cure: { min: 40, max: 90, unit: 'd' }, combine: { min: 35, max, unit: 'C' } },
});
const dose = (mass: number) => (document: FormulaDocument) => ({
  ...document,
  additives: [{ id: 'essential-oil-lavender', at: 'trace', mass, percentOfFats: mass / 10 }],
  yield: { ...document.yield, releasedMass: 1200 },
});

export const WORK_CASES: Cases<keyof typeof workCautions> = {
  'batch-too-small': {
    fires: { document: refused('size-too-small-for-scale') },
    numbers: { batch: 'One kilogram' },
    says: ['One kilogram', 'too small for its scale'],
    silent: { document: refused('fat-density-not-known') },
  },
  'batch-above-vessel': {
    // cold process fills to four fifths: 1.6 L of 2 L
    fires: { reference: vessel(2000), document: batter(1601) },
    numbers: { batch: 'One kilogram', vessel: 2, limit: 80 },
    says: ['One kilogram', '1.6 L', '2 L', '80 %'],
    silent: { reference: vessel(2000), document: batter(1600) },
  },
  'batch-above-heat-limit': {
    fires: { reference: heatLimit(7000), document: fatsPoured(7001) },
    numbers: { batch: 'One kilogram', fats: 7.001, limit: 7 },
    says: ['One kilogram', '7 kg'],
    silent: { reference: heatLimit(7000), document: fatsPoured(7000) },
  },
  'rework-above-cap': {
    fires: { formula: { rework: 10.5 }, reference: reworkCap(10) },
    numbers: { percent: 10.5, cap: 10 },
    says: ['10.5 %', 'cap is 10 %'],
    silent: { formula: { rework: 10 }, reference: reworkCap(10) },
  },
  'hot-process-boil-over': {
    fires: { formula: { process: 'hot' } },
    numbers: { fill: 50 },
    says: ['50 %', 'aluminium'],
    silent: {},
  },
  'alcohol-near-heat': {
    fires: { formula: { process: 'hot', ...additive('ethanol-96', 2, 'after-cook') } },
    numbers: {},
    says: ['Ethanol', 'No flame'],
    silent: { formula: additive('ethanol-96', 2, 'trace') },
  },
  'heats-batter': {
    // honey is 17.1 % water: 0.61 % of it brings 0.506 % of sugars, 0.60 % brings 0.497 %
    fires: { formula: additive('honey', 0.61) },
    numbers: { materials: 'Honey' },
    says: ['Honey', '0.5 %'],
    silent: { formula: additive('honey', 0.6) },
  },
  'salt-sets-fast': {
    fires: { formula: additive('salt', 20) },
    numbers: { percent: 20 },
    says: ['Salt', '20 %'],
    silent: { formula: additive('salt', 19.9) },
  },
  'free-acid-seizes': {
    fires: { formula: fats(['olive', 98], ['stearic-acid', 2]) },
    numbers: { share: 2 },
    says: ['Stearic acid', '2 %'],
    silent: { formula: fats(['olive', 98.1], ['stearic-acid', 1.9]) },
  },
  'fast-trace': {
    fires: { formula: fats(['olive', 85], ['palm-kernel', 8], ['cocoa-butter', 7]) },
    numbers: { share: 15 },
    says: ['Palm kernel oil', 'Cocoa butter', '15 %'],
    silent: { formula: fats(['olive', 86], ['palm-kernel', 8], ['cocoa-butter', 6]) },
  },
  'fragrance-speeds-trace': {
    fires: { formula: additive('fragrance-quayside', 3) },
    numbers: { percent: 3 },
    says: ['Quayside', '3 %', 'pour at once'],
    silent: { formula: additive('essential-oil-lavender', 3) },
  },
  'slow-trace': {
    fires: { document: unsaturated(65, 10.1) },
    numbers: { limit: 75 },
    says: ['75 %'],
    silent: { document: unsaturated(65, 10) },
  },
  'fragrance-maximum-unknown': {
    fires: { formula: additive('essential-oil-lavender', 2) },
    numbers: { percent: 2 },
    says: ['lavender', '2 %'],
    silent: { formula: additive('essential-oil-lavender', 2), reference: withMaximum },
  },
  'fragrance-above-maximum': {
    // 24 g in 1200 g of released soap are 2 %
    fires: { reference: withMaximum, document: dose(24.36) },
    numbers: { maximum: 2 },
    says: ['2.03 %', 'maximum is 2 %'],
    silent: { reference: withMaximum, document: dose(24) },
  },
  'fragrance-near-flash-point': {
    fires: { formula: lavenderAt(60), reference: withFlashPoint },
    numbers: { hottest: 60, flashPoint: 70, margin: 10 },
    says: ['lavender', '60 °C', '70 °C'],
    silent: { formula: lavenderAt(59), reference: withFlashPoint },
  },
};
