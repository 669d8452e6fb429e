import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, test } from 'vitest';
import { loadFormulary } from '../../src/formulary/load.ts';
import { readFormula } from '../../src/formulary/read-formula.ts';
import { problemText } from '../../src/words/problem-text.ts';
import { documentFaults } from '../fuzz/document-faults.ts';
import { KNOWN, SOUND } from './known.ts';

const root = mkdtempSync(join(tmpdir(), 'extremes-'));
afterAll(() => rmSync(root, { recursive: true }));
let shops = 0;

const formula = (fats: string, method: string) => `---
code: EX-001
name: Extreme
kind: bar
process: cold
revision: 1
fats:
${fats}
alkali: { sodium: 100 }
superfat: 8
water: { lye-concentration: 32 }
---

## Method

1. Stir :lye into ${method}.
`;
const OLIVE = formula('  - { fat: olive, share: 100 }', ':weight[olive]');

const PLAIN = `name: Plain fat
inci: Plain Fat
kind: glyceride
origin: plant
saponification-value:
  - { min: 184, max: 196, unit: mg KOH/g, source: cxs-33-1981, at: made up for a test, how: from memory }
`;

/** One formula in a shop with one batch size, its scale, and plain fats under these ids. */
function load(
  text: string,
  { size = '1 kg', step = '1 g', capacity = '15 kg', fats = [] as readonly string[] } = {},
) {
  const folder = join(root, String(shops++));
  mkdirSync(join(folder, 'formulas'), { recursive: true });
  mkdirSync(join(folder, 'data/fats'), { recursive: true });
  writeFileSync(join(folder, 'formulas/EX-001.md'), text);
  for (const id of fats) writeFileSync(join(folder, `data/fats/${id}.yaml`), PLAIN);
  writeFileSync(
    join(folder, 'data/shop.yaml'),
    `name: Workshop of a test
batches: [{ id: only, label: Only, fats: ${size}, scale: bench, kinds: [bar] }]
scales: [{ id: bench, name: Bench, step: ${step}, error: ${step}, capacity: ${capacity} }]
start-temperature: 22 C
release-moisture: 12
largest-superfat-shift: 0.3
emergency: []
release-limits: [{ kind: any, process: any, end: expanded, floor: 0 }]
`,
  );
  return loadFormulary({ formulas: join(folder, 'formulas'), data: join(folder, 'data') });
}

function documentOf(...wish: Parameters<typeof load>) {
  const loaded = load(...wish);
  if (!loaded.ok) throw new Error(loaded.problems.map(problemText).join('\n'));
  const [computed] = loaded.formulary.formulas;
  if (!computed) throw new Error('no formula');
  expect(documentFaults(computed.document)).toEqual([]);
  return computed.document;
}

test('200 fats in one formula weigh what one fat with their values weighs', () => {
  const fats = Array.from({ length: 200 }, (_, i) => `plain-${i + 1}`);
  const lines = fats.map((fat) => `  - { fat: ${fat}, share: 0.5 }`).join('\n');
  const shop = { fats, size: '20 kg', capacity: '60 kg' };
  const many = documentOf(formula(lines, 'the fats'), shop);
  const one = documentOf(formula('  - { fat: plain-1, share: 100 }', 'the fat'), shop);
  expect(many.fats).toHaveLength(200);
  expect(many.batches[0]?.fats.every(({ weighedMass }) => weighedMass === 100)).toBe(true);
  expect(many.batches[0]?.alkali).toEqual(one.batches[0]?.alkali);
  expect(many.superfat.worstCase[0]).toBeCloseTo(one.superfat.worstCase[0], 9);
});

describe('batches are right or refused, never quietly wrong', () => {
  test.each(['0.1 g', '49 g', '0 g', '-1 kg', '5000 kg', '1e3 kg'])(
    '%s is no batch size',
    (size) => {
      const loaded = load(OLIVE, { size });
      expect(loaded.ok).toBe(false);
      expect(loaded.problems.map(({ rule }) => rule)[0]).toMatch(
        /data\/(out-of-range|measure-form)/,
      );
    },
  );

  test('50 g on a scale of whole grams is refused, and on one of hundredths right', () => {
    expect(documentOf(OLIVE, { size: '50 g' }).batches[0]?.refused).toMatchObject({
      rule: 'size-too-small-for-scale',
    });
    const batch = documentOf(OLIVE, { size: '50 g', step: '0.01 g', capacity: '500 g' }).batches[0];
    expect(batch?.refused).toBeNull();
    // 50 g at 190 mg KOH/g, 8 % superfat, lye of 98.5 to 100 %: between these
    expect(batch?.alkali[0]?.weighedMass).toBeGreaterThan(5.9);
    expect(batch?.alkali[0]?.weighedMass).toBeLessThan(6.4);
  });

  test('500 kg is refused on a bench scale and is 500 times 1 kg on a weighbridge', () => {
    expect(documentOf(OLIVE, { size: '500 kg' }).batches[0]?.refused).toMatchObject({
      rule: 'weight-above-scale-capacity',
    });
    const large = documentOf(OLIVE, { size: '500 kg', step: '100 g', capacity: '1000 kg' });
    const alkali = (large.alkali[0]?.weighedMass ?? 0) * 500;
    const weighed = large.batches[0]?.alkali[0]?.weighedMass ?? 0;
    expect(alkali - weighed).toBeGreaterThanOrEqual(0);
    expect(alkali - weighed).toBeLessThan(200);
  });
});

describe('names', () => {
  test.each([
    ['right to left', '\u05E1\u05D1\u05D5\u05DF \u05D6\u05D9\u05EA 5'],
    ['combining', 'Se\u0301same\u0308 a\u0323\u0302'],
    ['joined', 'Lamp \u{1F469}\u200D\u{1F52C}'],
    ['80 characters', 'n'.repeat(80)],
  ])('a name of %s characters is kept as it is', (_, name) => {
    const { formula: read, problems } = readFormula(
      SOUND.replace('Harbour Lamp', name),
      'a.md',
      KNOWN,
    );
    expect(problems).toEqual([]);
    expect(read?.name).toBe(name);
  });

  test('a name of 300 characters is refused', () => {
    const { problems } = readFormula(SOUND.replace('Harbour Lamp', 'n'.repeat(300)), 'a.md', KNOWN);
    expect(problems.map(({ rule }) => rule)).toEqual(['formula/text-form']);
  });

  test('pictures whose names differ in capitals only are one file on many disks', () => {
    const text = `${SOUND}\n![A lamp](Lamp.png)\n`;
    expect(readFormula(text, 'a.md', KNOWN, new Set(['Lamp.png'])).problems).toEqual([]);
    expect(
      readFormula(text, 'a.md', KNOWN, new Set(['Lamp.png', 'lamp.png'])).problems.map(problemText),
    ).toEqual([
      'a.md:21:1  Found the image "Lamp.png" beside "lamp.png", expected names that differ in more than capitals; give one of the two another name; on many disks they are one file.  [formula/image-address]',
    ]);
  });

  test('Windows line ends and folders with backslashes change nothing but the line ends', () => {
    const unix = readFormula(SOUND, 'a.md', KNOWN);
    const windows = readFormula(SOUND.replaceAll('\n', '\r\n'), 'a.md', KNOWN);
    expect(windows.problems).toEqual([]);
    expect(windows.formula?.places).toEqual(unix.formula?.places);
    expect(windows.formula?.fats).toEqual(unix.formula?.fats);
  });
});
