import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { approvedContent } from '../../src/edition/approved-content.ts';
import { canonicalText } from '../../src/edition/canonical-text.ts';
import { fingerprintOf } from '../../src/edition/fingerprint.ts';
import { knownFrom } from '../../src/formulary/known.ts';
import { readFormula } from '../../src/formulary/read-formula.ts';
import type { FatRecord } from '../../src/reference/material-records.ts';
import type { Reference } from '../../src/reference/reference.ts';
import { packagedReference } from '../reference/packaged-data.ts';
import { alkali, fat } from '../support/materials.ts';
import { FORMULA } from './shop.ts';

const packaged = packagedReference();

/** Two fats and one alkali of the test's own, so that no change of the data moves these vectors. */
function referenceWith(oliveHigh = 196): Reference {
  const record = (id: string, core: FatRecord['core']) => {
    const found = packaged.fats.get(id);
    if (!found) throw new Error(id);
    return [id, { ...found, core }] as const;
  };
  const sodium = packaged.alkalis.get('sodium-hydroxide');
  if (!sodium) throw new Error('no sodium hydroxide');
  return {
    ...packaged,
    fats: new Map([
      record('olive', fat('olive', { value: 190, low: 184, high: oliveHigh })),
      record('coconut', fat('coconut', { value: 256, low: 248, high: 265 })),
    ]),
    alkalis: new Map([
      ['sodium-hydroxide', { ...sodium, trade: alkali('Na', 0.99, { low: 0.98, high: 0.99 }) }],
    ]),
  };
}
const REFERENCE = referenceWith();

function read(text: string) {
  const { formula, problems } = readFormula(text, 'formulas/TT-001.md', knownFrom(REFERENCE));
  if (!formula) throw new Error(JSON.stringify(problems));
  return formula;
}
const fingerprint = (text: string, reference = REFERENCE) => fingerprintOf(read(text), reference);
const PLAIN = fingerprint(FORMULA);

test('a published vector: the text that is hashed, written out, and its digest', () => {
  // weights by hand: E = (600 x 190 + 400 x 256) / (1000 x 56.105) = 3.85705 mol; x 0.92 = 3.54849 mol of
  // hydroxide, x 39.997 / 0.99 = 143.363 g; water = that x 68 / 32 = 304.645 g
  const text =
    '{"formula":{"alkali":{"sodium":100},"code":"TT-001","fats":[{"fat":"olive","share":60},' +
    '{"fat":"coconut","share":40}],"kind":"bar",' +
    '"method":"## Method 1. Stir :alkali[sodium] into :water. 2. Melt :weight[coconut] with :weight[olive] and combine.",' +
    '"name":"Test Bar","process":"cold","revision":1,"superfat":8,"water":{"lye-concentration":32}},' +
    '"models":1,"values":{"alkali":[{"assay":{"high":0.99,"low":0.98,"value":0.99},"id":"sodium-hydroxide"}],' +
    '"fats":[{"id":"olive","kind":"glyceride","saponification-value":{"high":196,"low":184,"value":190}},' +
    '{"id":"coconut","kind":"glyceride","saponification-value":{"high":265,"low":248,"value":256}}]},' +
    '"weights":{"alkali":[{"id":"sodium-hydroxide","mass":143.363}],"fats":[{"id":"olive","mass":600},' +
    '{"id":"coconut","mass":400}],"water":304.645}}';
  expect(canonicalText(approvedContent(read(FORMULA), REFERENCE))).toBe(text);
  // by Python's hashlib, from the text above
  expect(PLAIN).toBe('gab0-03b5-fe3b-p');
});

test('rework changes it, in the file or out of it', () => {
  const with5 = fingerprint(FORMULA.replace('tags:', 'rework: 5\ntags:'));
  expect(with5).not.toBe(PLAIN);
  expect(fingerprint(FORMULA.replace('tags:', 'rework: 6\ntags:'))).not.toBe(with5);
});

describe('what does not change it', () => {
  test.each([
    ['tags', FORMULA.replace('tags: [plain]', 'tags: [other, bar]')],
    ['no tags', FORMULA.replace('tags: [plain]\n', '')],
    ['a summary', FORMULA.replace('revision: 1', 'revision: 1\nsummary: A bar for a test.')],
    ['a comment', FORMULA.replace(' # the lathering part', '')],
    ['line ends', FORMULA.replaceAll('\n', '\r\n')],
    ['a byte order mark', `\uFEFF${FORMULA}`],
    [
      'changes',
      FORMULA.replace('tags:', 'changes:\n  - { revision: 1, on: 2026-01-02, note: x }\ntags:'),
    ],
    [
      'an approval',
      FORMULA.replace(
        'tags:',
        'approval: { by: x, on: 2026-01-01, review-by: 2027-01-01, fingerprint: 0000-0000-0000-0 }\ntags:',
      ),
    ],
    [
      'a withdrawal',
      FORMULA.replace('tags:', 'withdrawn: { on: 2026-01-01, by: x, reason: y }\ntags:'),
    ],
    ['a paragraph wrapped anew', FORMULA.replace('into :water', 'into\n   :water')],
    ['spaces at line ends', FORMULA.replace('into :water.', 'into :water.   ')],
    ['numbers written longer', FORMULA.replace('superfat: 8', 'superfat: 8.0')],
    ['an empty list', FORMULA.replace('tags:', 'liquids: []\ntags:')],
    ['accents put together otherwise', null],
  ])('%s', (_, text) => {
    if (text === null) {
      const composed = FORMULA.replace('combine', 'm\u00e9lange');
      expect(fingerprint(composed.normalize('NFD'))).toBe(fingerprint(composed));
    } else expect(fingerprint(text)).toBe(PLAIN);
  });

  test('the order of the keys and the spaces between them', () => {
    const [, front = '', body = ''] = FORMULA.split('---\n');
    const keys = front.split(/\n(?=[a-z])/).map((key) => key.trimEnd());
    fc.assert(
      fc.property(
        fc.shuffledSubarray(keys, { minLength: keys.length }),
        fc.array(fc.constantFrom('', '\n', '# a comment\n'), { minLength: 12, maxLength: 12 }),
        fc.nat(4),
        (order, gaps, blank) => {
          const lines = order.map((key, index) => `${gaps[index]}${key}\n`);
          const text = `---\n${lines.join('')}---\n${'\n'.repeat(blank)}${body}${'\n'.repeat(blank)}`;
          expect(fingerprint(text.replaceAll(': ', ':  '))).toBe(
            fingerprint(text.replaceAll(': ', ': ')),
          );
          expect(fingerprint(text)).toBe(PLAIN);
        },
      ),
      { numRuns: 50 },
    );
  });

  test('a new lot', () => {
    const lots = {
      ...packaged.lots,
      fats: packaged.lots.fats.filter(({ fat }) => fat === 'olive'),
    };
    expect(lots.fats.length).toBeGreaterThan(0);
    expect(fingerprint(FORMULA, { ...REFERENCE, lots })).toBe(PLAIN);
    expect(fingerprint(FORMULA, { ...REFERENCE, lots: { fats: [], alkalis: [] } })).toBe(PLAIN);
  });
});

describe('what changes it', () => {
  const steps = /1\. (.*)\n2\. (.*)\n/;
  test.each([
    ['two steps of the method swapped', FORMULA.replace(steps, '1. $2\n2. $1\n')],
    ['one word', FORMULA.replace('Stir', 'Pour')],
    ['one letter', FORMULA.replace('Stir', 'stir')],
    ['a share', FORMULA.replace('60 }', '59.9 }').replace('40 }', '40.1 }')],
    ['the order of the fats', FORMULA.replace(/( {2}- .*60 }\n)( {2}- .*\n)/, '$2$1')],
    ['the code', FORMULA.replace('TT-001', 'TT-002')],
    ['the name', FORMULA.replace('Test Bar', 'Best Tar')],
    [
      'the revision',
      FORMULA.replace(
        'revision: 1',
        'revision: 2\nchanges:\n  - { revision: 2, on: 2026-01-02, note: x }',
      ),
    ],
    ['the process', FORMULA.replace('process: cold', 'process: hot')],
    ['the superfat', FORMULA.replace('superfat: 8', 'superfat: 8.1')],
    ['the water', FORMULA.replace('lye-concentration: 32', 'lye-concentration: 33')],
    ['water held back', FORMULA.replace('32 }', '32, hold-back: 20 }')],
    [
      'an additive',
      FORMULA.replace(
        'tags:',
        'additives:\n  - { additive: kaolin, percent-of-fats: 2, at: trace }\ntags:',
      ),
    ],
    ['a target', FORMULA.replace('tags:', 'targets: { cure: 42 d }\ntags:')],
    ['a release limit', FORMULA.replace('tags:', 'release: { ph: [9, 10.5] }\ntags:')],
    ['the batch sizes', FORMULA.replace('tags:', 'batches: [pilot]\ntags:')],
    [
      'a concession',
      FORMULA.replace('tags:', 'concession: { reason: r, by: b, on: 2026-01-01 }\ntags:'),
    ],
  ])('%s', (_, text) => {
    expect(text).not.toBe(FORMULA);
    expect(fingerprint(text)).not.toBe(PLAIN);
  });

  test('the end of a range in the data', () => {
    expect(fingerprint(FORMULA, referenceWith(196.5))).not.toBe(PLAIN);
  });
});
