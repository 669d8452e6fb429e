import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { expect, test } from 'vitest';
import { refusalText } from '../../src/browser/any-size-refusal.ts';
import { csv } from '../../src/handbook/csv.ts';
import { EQUATIONS } from '../../src/handbook/equations.ts';
import { alkaliPerHundred } from '../../src/handbook/fat-sheet.ts';
import { withSubscripts } from '../../src/handbook/subscripts.ts';
import { words } from '../../src/words/catalogue.ts';
import { sizeSheetWords } from '../../src/words/en/any-size.ts';
import { CONSTANTS } from '../support/materials.ts';

const SRC = fileURLToPath(new URL('../../src', import.meta.url));

test('every refusal of the core has words of its own', () => {
  const rules = new Set<string>();
  for (const file of readdirSync(SRC, { recursive: true, encoding: 'utf8' })) {
    if (!file.endsWith('.ts')) continue;
    const text = readFileSync(join(SRC, file), 'utf8');
    for (const [, rule] of text.matchAll(/\brefused\(\s*'([a-z-]+)'/g)) rules.add(rule ?? '');
  }
  expect(rules.size).toBeGreaterThan(10);
  const wordless = [...rules].filter(
    (rule) =>
      words.breachText(rule, {}) === rule &&
      refusalText({ rule, numbers: {} }, sizeSheetWords.refusals) === rule,
  );
  expect(wordless).toEqual([]);
});

test('a refusal without words names its rule and its numbers', () => {
  expect(words.breachText('new-rule', { mass: 3 })).toBe('new-rule (mass 3)');
});

test('models and equations name each other', () => {
  expect(words.methodWords.map(({ id }) => id).toSorted()).toEqual(
    Object.keys(EQUATIONS).toSorted(),
  );
});

// SV is defined as mg KOH per g, so 100 g of a fat of SV 196.6 take 19.66 g of potassium hydroxide; as sodium
// hydroxide, by the molar masses 39.997 and 56.105, 14.02 g.
test('alkali for 100 g follows from the definition of the saponification value', () => {
  const { Na, K } = CONSTANTS.hydroxide;
  expect(alkaliPerHundred(196.6, { KOH: K, alkali: K })).toBeCloseTo(19.66, 10);
  expect(alkaliPerHundred(196.6, { KOH: K, alkali: Na })).toBeCloseTo((19.66 * 39.997) / 56.105, 3);
});

test('CSV follows RFC 4180 and gives a spreadsheet nothing to run', () => {
  expect(
    csv(
      ['a', 'b'],
      [
        ['x,y', 1.5],
        ['say "no"', null],
        ['=1+1', -2],
      ],
    ),
  ).toBe('a,b\r\n"x,y",1.5\r\n"say ""no""",\r\n\'=1+1,-2\r\n');
});

test('indexes are set low and nothing else is markup', () => {
  expect(withSubscripts('y_Na, y_K')).toBe('y<sub>Na</sub>, y<sub>K</sub>');
  expect(withSubscripts('<b>')).toBe('&lt;b>');
});
