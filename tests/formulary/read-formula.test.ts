import { describe, expect, test } from 'vitest';
import { readFormula } from '../../src/formulary/read-formula.ts';
import { KNOWN, SOUND } from './known.ts';

const read = (text: string) => readFormula(text, 'a.md', KNOWN);
const rules = (text: string) => read(text).problems.map(({ rule }) => rule);
const places = (text: string) => read(text).problems.map(({ line, column }) => [line, column]);

test('a sound formula, with what may be left out left out', () => {
  const { formula, problems, code } = read(SOUND);
  expect(problems).toEqual([]);
  expect(code).toEqual({ text: 'QY-014', place: { line: 2, column: 7 } });
  expect(formula).toMatchObject({
    file: 'a.md',
    code: 'QY-014',
    fats: [
      { fat: 'olive', share: 60 },
      { fat: 'coconut', share: 40 },
    ],
    afterCookFats: [],
    alkali: { sodium: 100, potassium: 0, basis: 'moles' },
    superfat: 5,
    water: { form: 'lye-concentration', value: 32, holdBack: 0 },
    liquids: [],
    additives: [],
    targets: {
      fats: { min: 38, max: 38, unit: 'C' },
      lye: { min: -2.5, max: -2.5, unit: 'C' },
      combine: { min: 35, max: 40, unit: 'C' },
      cure: { min: 42, max: 42, unit: 'd' },
    },
    release: { freeAlkali: null, ph: null, moisture: null },
    batches: null,
    approval: null,
    concession: null,
  });
  expect(formula?.places.get('fats.1.share')).toEqual({ line: 9, column: 28 });
  expect(formula?.methodText).toMatch(/^\n## Method\n/);
});

test('everything that a formula may state', () => {
  const full = SOUND.replace('process: cold', 'process: hot')
    .replace('alkali: { sodium: 100 }', 'alkali: { sodium: 40, potassium: 60, basis: mass }')
    .replace('lye-concentration: 32', 'per-alkali: 2.1, hold-back: 20')
    .replace(
      'targets:',
      `after-cook-fats: [{ fat: castor, percent-of-fats: 2 }]
liquids: [{ liquid: goat-milk, replaces-water: 50, at: trace }]
additives: [{ additive: kaolin, percent-of-fats: 1.5, at: after-cook }]
release: { free-alkali: 0.05, ph: [9, 10.5], moisture: 12 }
batches: [pilot]
tags: [unscented, palm-free]
changes:
  - { revision: 1, on: 2024-02-29, note: First version. }
approval: { by: QA lead, on: 2026-09-16, review-by: 2027-09-16, fingerprint: 4f2a-91c0-7be4-k }
concession: { reason: Stock is used up., by: QA lead, on: 2026-09-16 }
targets:`,
    )
    .replace('into :water', 'into :water less :held-back');
  const { formula, problems } = read(full);
  expect(problems).toEqual([]);
  expect(formula).toMatchObject({
    afterCookFats: [{ fat: 'castor', percentOfFats: 2 }],
    alkali: { sodium: 40, potassium: 60, basis: 'mass' },
    water: { form: 'per-alkali', value: 2.1, holdBack: 20 },
    liquids: [{ liquid: 'goat-milk', replacesWater: 50, at: 'trace' }],
    additives: [{ additive: 'kaolin', percentOfFats: 1.5, at: 'after-cook' }],
    release: { freeAlkali: 0.05, ph: [9, 10.5], moisture: 12 },
    batches: ['pilot'],
    tags: ['unscented', 'palm-free'],
    approval: { reviewBy: '2027-09-16' },
    concession: { reason: 'Stock is used up.' },
  });
});

test('all mistakes of one file come at once, in the order of the file', () => {
  const broken = SOUND.replace('kind: bar', 'kind: bars')
    .replace('fat: olive', 'fat: olve')
    .replace('share: 40', 'share: 39')
    .replace('superfat: 5', 'superfat: -1')
    .replace('lye-concentration: 32', 'lye-concentration: 32, per-alkali: 2')
    .replace('1. Stir', '1. <b>Stir</b>')
    .replace(':water', ':watr');
  expect(rules(broken)).toEqual([
    'formula/unknown-word',
    'formula/shares-sum',
    'formula/unknown-fat',
    'formula/superfat-range',
    'formula/water-twice',
    'formula/raw-html',
    'formula/raw-html',
    'formula/unknown-directive',
  ]);
});

describe('places', () => {
  const broken = SOUND.replace('fat: coconut', 'fat: cocnut').replace('into :water', 'into :watr');
  const expected = [
    [9, 12],
    [18, 30],
  ];

  test('are those of the file', () => {
    const lines = broken.split('\n');
    expect(lines[8]?.slice(11)).toMatch(/^cocnut/);
    expect(lines[17]?.slice(29)).toMatch(/^:watr/);
    expect(places(broken)).toEqual(expected);
  });
  test('with line ends of Windows', () => {
    expect(places(broken.replaceAll('\n', '\r\n'))).toEqual(expected);
    expect(read(SOUND.replaceAll('\n', '\r\n')).problems).toEqual([]);
  });
  test('with a byte order mark', () => {
    expect(places(`\uFEFF${broken}`)).toEqual(expected);
  });
  test('with empty lines before the frontmatter', () => {
    expect(places(`\n\n${broken}`)).toEqual(
      expected.map(([line = 0, column]) => [line + 2, column]),
    );
  });
});

describe('sums', () => {
  const withShares = (a: string, b: string) =>
    SOUND.replace('share: 60', `share: ${a}`).replace('share: 40', `share: ${b}`);
  test.each(['99.9', '100.1', '99.99999'])('%s is not 100', (sum) => {
    const rest = (Number(sum) - 60).toFixed(5);
    expect(rules(withShares('60', rest))).toEqual(['formula/shares-sum']);
  });
  test('a hundred in binary fractions is a hundred', () => {
    expect(rules(withShares('66.6', '33.4'))).toEqual([]);
    expect(66.6 + 33.4).toBe(100);
    const thirds = SOUND.replace('share: 60 }', 'share: 33.3 }').replace(
      'share: 40 }',
      'share: 33.3 }\n  - { fat: castor, share: 33.4 }',
    );
    expect(rules(thirds)).toEqual([]);
  });
});

describe('text that is no directive', () => {
  test.each([
    'At 10:30 or 9:05 h, one part in 1:1, see QY-014: next.',
    'Write it as \\:water, or `:water`.',
    'Colons: :) and :- and ::',
  ])('%s', (text) => {
    expect(rules(`${SOUND}\n${text}\n`)).toEqual([]);
  });
});

describe('text that would run away', () => {
  test.each([
    ['quotations', '> '.repeat(5000)],
    ['lists', Array.from({ length: 300 }, (_, depth) => `${'  '.repeat(depth)}- a`).join('\n')],
    ['blocks', ':::a\n'.repeat(3000)],
  ])('%s', (_, text) => {
    const { formula, problems } = read(`${SOUND}\n${text}\n`);
    expect(formula).toBeNull();
    expect(problems).toMatchObject([{ rule: 'formula/nesting' }]);
  });
  test.each([
    ['brackets', `x: ${'['.repeat(5000)}`, 'formula/yaml'],
    [
      'aliases',
      `a: &a [1]\n${Array.from({ length: 30 }, (_, i) => `b${i}: &b${i} [*${i ? `b${i - 1}` : 'a'}, *${i ? `b${i - 1}` : 'a'}]`).join('\n')}`,
      'formula/anchor',
    ],
    ['merge keys', '<<: { a: 1 }', 'formula/anchor'],
    ['names of the language', '__proto__: { a: 1 }\nconstructor: 1', 'formula/unknown-key'],
  ])('%s', (_, yaml, rule) => {
    const { formula, problems } = read(SOUND.replace('code:', `${yaml}\ncode:`));
    expect(formula).toBeNull();
    expect(new Set(problems.map((problem) => problem.rule))).toEqual(new Set([rule]));
  });
});

test('without data only the ids are not looked up', () => {
  const text = SOUND.replaceAll('olive', 'unheard-of').replace('superfat: 5', 'superfat: 50');
  expect(readFormula(text, 'a.md', null).problems).toMatchObject([
    { rule: 'formula/superfat-range' },
  ]);
});

test('an entry of a list that was left empty has a place', () => {
  expect(
    read(
      SOUND.replace('- { fat: coconut, share: 40 }', '- # later').replace(
        ' :weight[coconut] with',
        '',
      ),
    ).problems,
  ).toMatchObject([{ rule: 'formula/missing-key', line: 9, found: 'entry 2 without a value' }]);
});

test('pictures of the folder are found', () => {
  const text = `${SOUND}\n![The jug](pictures/jug.webp)\n`;
  expect(rules(text)).toEqual(['formula/image-missing']);
  expect(readFormula(text, 'a.md', KNOWN, new Set(['pictures/jug.webp'])).problems).toEqual([]);
});

test('a misspelt fat is told once, not again where the text weighs it', () => {
  expect(rules(SOUND.replace('fat: coconut', 'fat: cocnut'))).toEqual(['formula/unknown-fat']);
});
