import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import fc from 'fast-check';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { grams } from '../../src/chemistry/quantity.ts';
import { computeFormula } from '../../src/formulary/compute.ts';
import type { FormulaDocument } from '../../src/formulary/document.ts';
import { knownFrom } from '../../src/formulary/known.ts';
import { readFormula } from '../../src/formulary/read-formula.ts';
import { sizeText } from '../../src/handbook/batch-sizes.ts';
import { targetRows } from '../../src/handbook/targets.ts';
import { weightsTable } from '../../src/handbook/weights.ts';
import { readReference } from '../../src/reference/read-reference-fs.ts';
import type { Reference } from '../../src/reference/reference.ts';
import { readMeasure } from '../../src/reference/schema/measure.ts';
import { speak } from '../../src/words/catalogue.ts';
import { massUnit } from '../../src/words/measures.ts';
import { OUNCE, POUND } from '../../src/words/units.ts';

// An invented shop that weighs in pounds and ounces, without lots.
const SHOP = `name: Workshop of a test
invented: true
weights: us
batches:
  - { id: large, label: Large, fats: 40 lb 8 oz, scale: floor, fine-scale: bench, kinds: [bar] }
  - { id: mould, label: By mould, mould: 1 gal, losses: 5, scale: bench, fine-scale: fine, kinds: [bar] }
scales:
  - { id: fine, name: Fine scale, step: 0.1 oz, error: 0.1 oz, capacity: 4 lb }
  - { id: bench, name: Bench scale, step: 0.5 oz, error: 0.5 oz, capacity: 30 lb }
  - { id: floor, name: Floor scale, step: 1 oz, error: 2 oz, capacity: 100 lb }
start-temperature: 72 F
release-moisture: 12
largest-superfat-shift: 5
emergency:
  - { label: Invented, value: none }
release-limits:
  - { kind: any, process: any, end: worst-case, floor: -10 }
`;

const root = mkdtempSync(join(tmpdir(), 'us-'));
let reference: Reference;

beforeAll(() => {
  mkdirSync(join(root, 'data'));
  writeFileSync(join(root, 'data/shop.yaml'), SHOP);
  const read = readReference(['data', join(root, 'data')]);
  if (!read.reference) throw new Error(JSON.stringify(read.problems));
  reference = read.reference;
  speak('en-US', 'us');
});

afterAll(() => {
  speak('en-GB');
  rmSync(root, { recursive: true });
});

const formulaText = (olive: number, superfat: number) => `---
code: TT-001
name: Test
kind: bar
process: cold
revision: 1
fats:
  - { fat: olive, share: ${olive} }
  - { fat: coconut, share: ${100 - olive} }
alkali: { sodium: 100 }
superfat: ${superfat}
water: { lye-concentration: 32 }
targets: { fats: 100 F, lye: 95-105 F }
---

## Method

1. Stir :alkali[sodium] into :water and melt :weight[coconut] with :weight[olive].
`;

function computed(text: string, data: Reference) {
  const { formula, problems } = readFormula(text, 'a.md', knownFrom(data));
  if (!formula) throw new Error(JSON.stringify(problems));
  const result = computeFormula(formula, data);
  if (!result.computed) throw new Error(JSON.stringify(result.problems));
  return { formula, document: result.computed.document };
}

/** What a size prints to weigh, by material. */
function printed(document: FormulaDocument, id: string, data: Reference) {
  const batch = document.batches.find((each) => each.id === id);
  if (!batch || batch.refused) throw new Error(JSON.stringify(batch?.refused));
  const lines = weightsTable(document, batch, data).groups.flatMap((group) => group.lines);
  const texts = lines.map((line): [string, string] => [
    line.id,
    `${line.text} ${massUnit()}`.replaceAll('\u00a0', ' '),
  ]);
  return { batch, texts: new Map(texts) };
}

describe('a sheet worked by hand', () => {
  // 40 lb 8 oz of fats are 648 oz: olive oil 60 % 388.8 oz, coconut oil 40 % 259.2 oz, both within the 30 lb of the
  // bench scale and so to its half ounce: 389.0 and 259.0 oz.
  // KOH 648 oz x (0.6 x 190 + 0.4 x 256.5) mg/g = 140.3568 oz; NaOH = x 39.9968 / 56.1053 = 100.0586 oz; less 5 %
  // superfat 95.0557 oz; as weighed at 99.5 % 95.5333 oz, rounded down to 95.5 oz. (CODEX STAN 33-1981 and CXS 210:
  // middles of 184 to 196 and 248 to 265.) Water 95.5333 x 68 / 32 = 203.008 oz, to the nearest half 203.0 oz.
  test('every weight in pounds and ounces', () => {
    const { document } = computed(formulaText(60, 5), reference);
    const { texts, batch } = printed(document, 'large', reference);
    expect([...texts]).toEqual([
      ['water', '12 lb 11.0 oz'],
      ['sodium-hydroxide', '5 lb 15.5 oz'],
      ['olive', '24 lb 5.0 oz'],
      ['coconut', '16 lb 3.0 oz'],
    ]);
    // 1 - (95.5 x 0.995 / 39.9968) / ((389 x 190 + 259 x 256.5) / 56105.3) = 0.05025
    expect(batch.superfat?.weighed).toBeCloseTo(5.025, 3);
  });

  test('sizes and temperatures in the units of the shop', () => {
    const { formula } = computed(formulaText(60, 5), reference);
    expect(
      reference.shop.batches.map(sizeText).map((text) => text.replaceAll('\u00a0', ' ')),
    ).toEqual(['40 lb 8 oz of fats', 'mould of 1.0 gal']);
    expect(targetRows(formula).map(({ value }) => value)).toEqual([
      '100\u00a0°F',
      '95 to 105\u00a0°F',
    ]);
    expect(reference.shop.startTemperature).toBeCloseTo(22.2222, 4);
  });
});

test('the weights printed are those of the document, and their superfat is not below the one written', () => {
  const shares = fc.integer({ min: 1, max: 99 });
  const superfats = fc.integer({ min: 0, max: 20 });
  const sizes = fc.integer({ min: 40, max: 1500 });
  const steps = fc.constantFrom(0.01, 0.05, 0.1, 0.25, 0.5, 1);
  fc.assert(
    fc.property(shares, superfats, sizes, steps, (olive, superfat, ounces, step) => {
      const [size] = reference.shop.batches;
      const [scale] = reference.shop.scales;
      if (!size || !scale) throw new Error('the shop of this test has no size');
      const data: Reference = {
        ...reference,
        shop: {
          ...reference.shop,
          batches: [
            {
              ...size,
              size: { by: 'fats', mass: grams(ounces * OUNCE) },
              fineScale: null,
              scale: 'it',
            },
          ],
          scales: [
            {
              ...scale,
              id: 'it',
              step: grams(Number((step * OUNCE).toPrecision(14))),
              capacity: grams(200 * POUND),
            },
          ],
        },
      };
      const { document } = computed(formulaText(olive, superfat), data);
      if (document.batches[0]?.refused) return;
      const { texts, batch } = printed(document, 'large', data);
      const read = (id: string) => readMeasure('mass', texts.get(id) ?? '')?.value ?? Number.NaN;
      for (const line of [...batch.fats, ...batch.alkali]) {
        expect(read(line.id)).toBeCloseTo(line.weighedMass, 8);
      }
      const sum = ['water', 'sodium-hydroxide', 'olive', 'coconut'].reduce(
        (all, id) => all + read(id),
        0,
      );
      expect(sum).toBeCloseTo(batch.total ?? Number.NaN, 7);
      // IUPAC abridged atomic weights, the values named above, the assay at the top of the trade range
      const equivalents = (read('olive') * 190 + read('coconut') * 256.5) / 1000 / 56.1053;
      const hydroxide = (read('sodium-hydroxide') * 0.995) / 39.9968;
      expect(100 * (1 - hydroxide / equivalents)).toBeGreaterThan(superfat - 0.001);
    }),
    { numRuns: 200 },
  );
});
