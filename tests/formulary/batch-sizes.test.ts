import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, expect, test } from 'vitest';
import type { BatchDocument } from '../../src/formulary/document.ts';
import { loadFormulary } from '../../src/formulary/load.ts';
import { words } from '../../src/words/catalogue.ts';
import { problemText } from '../../src/words/problem-text.ts';
import { SOUND } from './known.ts';

// An invented shop with every way to state a size, and with sizes that cannot be weighed.
const SHOP = `name: Workshop of a test
invented: true
batches:
  - { id: by-fats, label: By fats, fats: 2 kg, losses: 5, scale: bench, fine-scale: fine, kinds: [bar] }
  - { id: by-batter, label: By batter, batter: 3 kg, losses: 5, scale: bench, fine-scale: fine, kinds: [bar] }
  - { id: by-bars, label: By bars, bars: 24, wet-mass: 120 g, losses: 5, scale: bench, fine-scale: fine, kinds: [bar] }
  - { id: by-mould, label: By mould, mould: 3 L, losses: 5, scale: bench, fine-scale: fine, kinds: [bar] }
  - { id: without-losses, label: Without losses, batter: 3 kg, scale: bench, fine-scale: fine, kinds: [bar] }
  - { id: crumb, label: Crumb, fats: 60 g, scale: floor, kinds: [bar] }
  - { id: small, label: Small, fats: 500 g, scale: floor, kinds: [bar] }
  - { id: vast, label: Vast, fats: 90 kg, scale: bench, kinds: [bar] }
scales:
  - { id: fine, name: Fine scale, step: 0.1 g, error: 0.1 g, capacity: 500 g }
  - { id: bench, name: Bench scale, step: 1 g, error: 1 g, capacity: 15 kg }
  - { id: floor, name: Floor scale, step: 50 g, error: 50 g, capacity: 60 kg }
start-temperature: 22 C
release-moisture: 12
largest-superfat-shift: 0.3
emergency:
  - { label: Invented, value: none }
release-limits:
  - { kind: any, process: any, end: worst-case, floor: -10 }
`;

const root = mkdtempSync(join(tmpdir(), 'sizes-'));
afterAll(() => rmSync(root, { recursive: true }));
let shops = 0;

function batchesOf(formula: string): ReadonlyMap<string, BatchDocument> {
  const folder = join(root, String(shops++));
  mkdirSync(join(folder, 'formulas'), { recursive: true });
  mkdirSync(join(folder, 'data'));
  writeFileSync(join(folder, 'data/shop.yaml'), SHOP);
  writeFileSync(join(folder, 'formulas/a.md'), formula);
  const loaded = loadFormulary({ formulas: join(folder, 'formulas'), data: join(folder, 'data') });
  if (!loaded.ok) throw new Error(loaded.problems.map(problemText).join('\n'));
  const [only] = loaded.formulary.formulas;
  return new Map(only?.document.batches.map((batch) => [batch.id, batch]));
}

const batches = batchesOf(SOUND.replace('superfat: 5', 'superfat: 8'));
const weighed = (id: string) => {
  const batch = batches.get(id);
  if (!batch?.yield || batch.total === null || batch.massOfFats === null) {
    throw new Error(`${id} has no weights: ${JSON.stringify(batch?.refused)}`);
  }
  return { ...batch, yield: batch.yield, total: batch.total, massOfFats: batch.massOfFats };
};

test('by fats the losses change nothing to weigh, and are taken off what is poured', () => {
  const batch = weighed('by-fats');
  expect(batch.massOfFats).toBe(2000);
  expect(batch.yield.poured).toBeCloseTo(0.95 * batch.total, 6);
});

test('by batter and by bars what is asked for is poured, to the steps of the scale', () => {
  // half a gram for each of the weights that the coarser scale takes, half a tenth for the rest
  expect(Math.abs(weighed('by-batter').yield.poured - 3000)).toBeLessThan(2);
  const bars = weighed('by-bars');
  expect(Math.abs(bars.yield.poured - 24 * 120)).toBeLessThan(2);
  expect(bars.bars).toBe(24);
  expect(weighed('by-batter').bars).toBeNull();
});

test('losses come on top: made is poured over 0.95', () => {
  const ratio = weighed('by-batter').total / weighed('without-losses').total;
  expect(Math.abs(ratio - 1 / 0.95)).toBeLessThan(0.001);
});

test('by mould the batter fills the litres at a density between fat and lye', () => {
  // fats are 0.91 to 0.92 g/mL and the lye of 32 % 1.35: the batter lies between, nearer to the fats
  const { poured } = weighed('by-mould').yield;
  expect(poured / 3000).toBeGreaterThan(0.98);
  expect(poured / 3000).toBeLessThan(1.03);
});

test('a bar at release: water goes, everything else stays', () => {
  const { poured, releasedMass, soap } = weighed('by-bars').yield;
  expect(releasedMass).toBeLessThan(poured);
  expect(soap).toBeLessThan(releasedMass * 0.88);
});

test.each([
  ['crumb', 'weight-below-scale-step'],
  ['small', 'size-too-small-for-scale'],
  ['vast', 'weight-above-scale-capacity'],
])('%s: a reason in place of weights', (id, rule) => {
  const batch = batches.get(id);
  expect(batch?.refused?.rule).toBe(rule);
  expect(words.breachText(rule, batch?.refused?.numbers ?? {})).not.toContain('?');
  expect(batch).toMatchObject({
    fats: [],
    alkali: [],
    additives: [],
    weighedWater: null,
    total: null,
    superfat: null,
    yield: null,
  });
});

test('a fat without a density gives no mould volume, and every other size its weights', () => {
  const unknown = batchesOf(
    SOUND.replace('superfat: 5', 'superfat: 8').replaceAll('olive', 'lauric-acid'),
  );
  expect(unknown.get('by-mould')?.refused?.rule).toBe('fat-density-not-known');
  expect(unknown.get('by-batter')?.refused).toBeNull();
});
