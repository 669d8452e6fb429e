import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, test } from 'vitest';
import { documentSchema } from '../../src/formulary/document-schema.ts';
import { loadFormulary } from '../../src/formulary/load.ts';
import { amountText } from '../../src/handbook/amounts.ts';
import { lyeCsv } from '../../src/handbook/lye-csv.ts';
import { lyeTable } from '../../src/handbook/lye-table.ts';
import { weightsTable } from '../../src/handbook/weights.ts';
import { problemText } from '../../src/words/problem-text.ts';

const SHOP = `name: Workshop of a test
invented: true
batches:
  - { id: pilot, label: Pilot, fats: 1 kg, losses: 0, scale: bench, kinds: [bar, paste, liquid] }
scales:
  - { id: bench, name: Bench scale, step: 0.1 g, error: 0.1 g, capacity: 15 kg }
start-temperature: 22 C
release-moisture: 12
largest-superfat-shift: 0.3
emergency:
  - { label: In an emergency, value: Call your local emergency number }
rules: []
release-limits:
  - { kind: any, process: any, end: expanded, floor: 0 }
`;
const FATS = '  - { fat: olive, share: 70 }\n  - { fat: coconut, share: 30 }\n';
const formula = (code: string, fats = FATS) => `---
code: ${code}
name: Test Bar
kind: bar
process: cold
revision: 1
fats:
${fats}alkali: { sodium: 100 }
superfat: 8
water: { lye-concentration: 30 }
---

## Method

1. Stir :alkali[sodium] into :water.
`;
const olive = (wish = '') =>
  `  - { fat: olive, lot: O-1, saponification-value: 190.4, uncertainty: 0.8, method: ISO 3657, status: released, retest-by: 2027-06-01${wish} }\n`;
const STOCK =
  'alkalis:\n  - { alkali: sodium-hydroxide, lot: N-5, form: solution, assay: 50, uncertainty: 0.3, carbonate: 0.1, status: released, retest-by: 2027-03-01 }\n';
const BLENDS = `base:
  name: Ready base
  parts:
    - { fat: coconut, share: 60 }
    - { fat: olive, share: 40 }
`;

const root = mkdtempSync(join(tmpdir(), 'lots-'));
afterAll(() => rmSync(root, { recursive: true }));
let shops = 0;

interface Files {
  readonly lots?: string;
  readonly blends?: string;
  readonly formulas?: readonly string[];
  readonly asOf?: string;
}

function load({ lots = '', blends = '', formulas = [formula('TT-001')], asOf }: Files) {
  const folder = join(root, String(shops++));
  mkdirSync(join(folder, 'formulas'), { recursive: true });
  mkdirSync(join(folder, 'data'));
  writeFileSync(join(folder, 'data/shop.yaml'), SHOP);
  if (lots !== '') writeFileSync(join(folder, 'data/lots.yaml'), lots);
  if (blends !== '') writeFileSync(join(folder, 'data/blends.yaml'), blends);
  for (const [i, text] of formulas.entries()) {
    writeFileSync(join(folder, `formulas/${i}.md`), text);
  }
  const loaded = loadFormulary(
    { formulas: join(folder, 'formulas'), data: join(folder, 'data') },
    { asOf: asOf ?? null },
  );
  const said = loaded.problems.map((problem) => problemText(problem).replaceAll(folder, 'SHOP'));
  return { loaded, said };
}

function sound(files: Files) {
  const { loaded, said } = load(files);
  if (!loaded.ok) throw new Error(said.join('\n'));
  return loaded.formulary;
}
const documentOf = (files: Files, index = 0) => {
  const document = sound(files).formulas[index]?.document;
  if (!document) throw new Error('no such formula');
  return document;
};

describe('a lot past its retest date', () => {
  const lots = `fats:\n${olive()}`;
  const place = `2:${olive().indexOf('2027-06-01') + 1}`;

  test('is an error at its date that names the formulas weighed from it', () => {
    const formulas = [
      formula('TT-002'),
      formula('TT-001'),
      formula('TT-003', '  - { fat: coconut, share: 100 }\n'),
    ];
    const { loaded, said } = load({ lots, formulas, asOf: '2027-06-02' });
    expect(loaded.ok).toBe(false);
    expect(said).toEqual([
      `SHOP/data/lots.yaml:${place}  Found retest by 2027-06-01 for lot "O-1" of olive, of which TT-001, TT-002 are weighed, expected a day not before 2027-06-02, the day that this is for; have the lot measured again, release another one, or set it to quarantine.  [data/lot-past-retest]`,
    ]);
  });

  test('is good on the day itself, and without a day nothing is asked', () => {
    expect(load({ lots, asOf: '2027-06-01' }).said).toEqual([]);
    expect(load({ lots }).said).toEqual([]);
  });

  test('is a warning where no formula is weighed from it', () => {
    const formulas = [formula('TT-003', '  - { fat: coconut, share: 100 }\n')];
    const { loaded, said } = load({ lots, formulas, asOf: '2027-06-02' });
    expect(loaded.ok).toBe(true);
    expect(said.join()).toContain(`SHOP/data/lots.yaml:${place}  Warning: `);
    expect(said.join()).toContain('no formula is weighed');
  });

  test('counts for the parts of a blend, and for alkalis', () => {
    const both = load({
      lots: `${lots}${STOCK}`,
      blends: BLENDS,
      formulas: [formula('TT-009', '  - { blend: base, share: 100 }\n')],
      asOf: '2028-01-01',
    });
    expect(both.said).toHaveLength(2);
    for (const text of both.said) expect(text).toContain('of which TT-009 is weighed');
  });

  test('is nothing where the lot is not released: it decides no weight', () => {
    const held = lots.replace('status: released', 'status: quarantine');
    expect(load({ lots: held, asOf: '2030-01-01' }).said).toEqual([]);
    expect(documentOf({ lots: held }).fats[0]?.saponificationValue).toEqual(
      documentOf({}).fats[0]?.saponificationValue,
    );
  });
});

describe('what a lot measured', () => {
  test('a saponification value decides and narrows; without lots the margin is that of a shop without lots', () => {
    const [bare, measured] = [documentOf({}), documentOf({ lots: `fats:\n${olive()}` })];
    expect(bare.superfat.withoutLots).toBeNull();
    expect(measured.superfat.withoutLots).toEqual({
      expanded: bare.superfat.expanded,
      worstCase: bare.superfat.worstCase,
    });
    const width = ([low, high]: readonly [number, number]) => high - low;
    expect(width(measured.superfat.expanded)).toBeLessThan(width(bare.superfat.expanded));
    expect(documentSchema.safeParse(measured).success).toBe(true);
  });

  test('free acidity of a glyceride changes neither alkali nor margin', () => {
    const acid = ', acid-value: 1.2, acid-uncertainty: 0.1, acid-method: ISO 660';
    const [without, beside] = ['', acid].map((wish) =>
      documentOf({ lots: `fats:\n${olive(wish)}` }),
    );
    expect(beside).toEqual(without);
    const alone = `fats:\n${olive(acid).replace('saponification-value: 190.4, uncertainty: 0.8, method: ISO 3657, ', '')}`;
    expect(documentOf({ lots: alone })).toEqual(documentOf({}));
  });

  test('the acid value of a free acid is its saponification value', () => {
    const lots =
      'fats:\n  - { fat: stearic-acid, lot: S-1, acid-value: 206.9, acid-uncertainty: 0.8, acid-method: ISO 660, status: released, retest-by: 2027-06-01 }\n';
    const formulas = [
      formula('TT-001', '  - { fat: olive, share: 80 }\n  - { fat: stearic-acid, share: 20 }\n'),
    ];
    expect(documentOf({ lots, formulas }).fats[1]?.saponificationValue).toMatchObject({
      value: 206.9,
      source: 'ISO 660',
      lot: 'S-1',
    });
  });

  test('the acid value of a wax is what lower ends count in cold process, and no more', () => {
    const lots = (acid: number) =>
      `fats:\n  - { fat: beeswax, lot: B-1, acid-value: ${acid}, acid-uncertainty: 0.2, acid-method: ISO 660, status: released, retest-by: 2027-06-01 }\n`;
    const formulas = [
      formula('TT-001', '  - { fat: olive, share: 98 }\n  - { fat: beeswax, share: 2 }\n'),
    ];
    const [little, much] = [17.5, 23].map((acid) => documentOf({ lots: lots(acid), formulas }));
    expect(little?.alkali).toEqual(much?.alkali);
    expect(little?.superfat.worstCase[0]).toBeLessThan(much?.superfat.worstCase[0] ?? 0);
  });

  test.each([
    [
      'no value',
      olive().replace('saponification-value: 190.4, uncertainty: 0.8, method: ISO 3657, ', ''),
    ],
    ['a value without its uncertainty', olive().replace('uncertainty: 0.8, ', '')],
    ['an acid value without its method', olive(', acid-value: 1, acid-uncertainty: 0.1')],
  ])('%s is refused', (_, lot) => {
    expect(load({ lots: `fats:\n${lot}` }).said.join()).toContain('[data/missing-key]');
  });
});

describe('stock lye of 50 %', () => {
  const formulary = sound({ lots: STOCK });
  const [computed] = formulary.formulas;
  if (!computed) throw new Error('the shop has a formula');
  const { document } = computed;

  test('twice the hydroxide is weighed, and its water is not added again', () => {
    // by hand, of 1000 g: E = sum(m S) / (1000 x 56.105); n = 0.92 E; NaOH 39.997 g/mol
    const equivalents = document.fats.reduce(
      (sum, { mass, saponificationValue: { value } }) => sum + (mass * value) / 56105,
      0,
    );
    const hydroxide = 0.92 * equivalents * 39.997;
    expect(document.alkali[0]).toMatchObject({ form: 'solution' });
    expect(document.alkali[0]?.weighedMass).toBeCloseTo(2 * hydroxide, 1);
    // 30 % lye of the dissolved hydroxide: 70/30 of it is water, as much as itself is in the stock
    expect(document.water).toBeCloseTo((hydroxide * 7) / 3 - hydroxide, 1);
    expect(document.lye.concentration).toBeCloseTo(30, 9);
  });

  test('the sheet says solution, its strength, its lot, the water besides it, and on what basis', () => {
    const batch = document.batches[0];
    if (!batch) throw new Error('the shop has a size');
    const { groups, notes } = weightsTable(document, batch, formulary.reference);
    const [water, alkali] = groups[0]?.lines ?? [];
    expect(alkali).toMatchObject({ name: 'Sodium hydroxide, solution of 50\u00a0%', lot: 'N-5' });
    expect(water?.name).toBe('Water, besides the solution');
    expect(notes.join()).toMatch(/no solid.*counts the hydroxide dissolved/);
    expect(documentSchema.safeParse(document).success).toBe(true);
    expect(amountText('alkali', 'sodium', computed.formula, batch)).toBe(
      `${alkali?.text}\u00a0g (weighed as a solution of 50\u00a0%, not as a solid)`,
    );
  });

  test('the lye table and its CSV cannot be taken for solid alkali', () => {
    const table = lyeTable(formulary, 'pilot');
    expect(table.alkalis[0]?.name).toBe('Sodium hydroxide, solution of 50\u00a0%');
    expect(table.notes).toHaveLength(1);
    expect(lyeCsv(formulary, 'pilot')).toContain(',sodium-hydroxide-solution,');
  });

  test('a lye stronger than the stock is refused', () => {
    const strong = formula('TT-001').replace('lye-concentration: 30', 'lye-concentration: 50');
    const weak = STOCK.replace('assay: 50,', 'assay: 45,');
    expect(load({ lots: weak, formulas: [strong] }).said.join()).toContain(
      'formula/stock-too-weak',
    );
  });
});

describe('a blend', () => {
  const files = {
    blends: BLENDS,
    lots: `fats:\n${olive()}`,
    formulas: [
      formula('TT-001', '  - { fat: olive, share: 50 }\n  - { blend: base, share: 50 }\n'),
      formula('TT-002', FATS),
    ],
  };
  const formulary = sound(files);
  const [blended, written] = formulary.formulas.map(({ document }) => document);
  if (!blended || !written) throw new Error('the shop has two formulas');

  test('is reckoned as its parts', () => {
    expect(blended.alkali[0]?.weighedMass).toBeCloseTo(written.alkali[0]?.weighedMass ?? 0, 9);
    expect(blended.superfat.expanded[0]).toBeCloseTo(written.superfat.expanded[0], 9);
    expect(blended.profile?.iodineValue).toBeCloseTo(written.profile?.iodineValue ?? 0, 9);
    expect(blended.yield.soap).toBeCloseTo(written.yield.soap, 9);
    expect(blended.fats.map(({ id, blend, share }) => [id, blend, share])).toEqual([
      ['olive', undefined, 50],
      ['coconut', 'base', 30],
      ['olive', 'base', 20],
    ]);
    expect(documentSchema.safeParse(blended).success).toBe(true);
  });

  test('is one line to weigh, with the lots of its parts and what is in it', () => {
    const batch = blended.batches[0];
    if (!batch) throw new Error('the shop has a size');
    expect(batch.fats).toEqual([
      { id: 'olive', weighedMass: 500, step: 0.1 },
      { id: 'base', weighedMass: 500, step: 0.1 },
    ]);
    const { groups, notes } = weightsTable(blended, batch, formulary.reference);
    const lines = groups.find(({ name }) => name === 'fats')?.lines ?? [];
    expect(lines.map(({ name, lot }) => [name, lot])).toEqual([
      ['Olive oil', 'O-1'],
      ['Ready base', 'O-1 of Olive oil'],
    ]);
    expect(notes.join()).toContain('60 % Coconut oil, 40 % Olive oil');
  });

  test('of another shop is not known here', () => {
    const { said } = load({
      formulas: [formula('TT-001', '  - { blend: pastille-base, share: 100 }\n')],
    });
    expect(said.join()).toContain('[formula/unknown-blend]');
  });
});
