import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, test } from 'vitest';
import { refusalProblem } from '../../src/formulary/compute-problems.ts';
import { loadFormulary } from '../../src/formulary/load.ts';
import { readFormula } from '../../src/formulary/read-formula.ts';
import { starterFormula } from '../../src/words/en/starter-formula.ts';
import { problemText } from '../../src/words/problem-text.ts';
import { KNOWN, SOUND } from './known.ts';

const SHOP = `name: Workshop of a test
invented: true
batches:
  - { id: pilot, label: Pilot, fats: 1 kg, losses: 3, scale: bench, kinds: [bar, paste, liquid] }
scales:
  - { id: bench, name: Bench scale, step: 1 g, error: 1 g, capacity: 15 kg }
start-temperature: 22 C
release-moisture: 12
largest-superfat-shift: 0.3
emergency:
  - { label: In an emergency, value: Call your local emergency number }
rules:
  - Goggles and gloves.
release-limits:
  - { kind: any, process: any, end: expanded, floor: 0 }
`;
const STOCK = `alkalis:
  - { alkali: sodium-hydroxide, lot: T-1, form: solution, assay: 30, uncertainty: 0.2, carbonate: 0.1, status: released, retest-by: 2027-03-01 }
`;

const root = mkdtempSync(join(tmpdir(), 'shops-'));
afterAll(() => rmSync(root, { recursive: true }));
let shops = 0;

/** A shop of these formulas over the packaged data. */
function load(formulas: readonly string[], lots = '') {
  const folder = join(root, String(shops++));
  mkdirSync(join(folder, 'formulas'), { recursive: true });
  mkdirSync(join(folder, 'data'));
  writeFileSync(join(folder, 'data/shop.yaml'), SHOP);
  if (lots !== '') writeFileSync(join(folder, 'data/lots.yaml'), lots);
  for (const [index, text] of formulas.entries()) {
    writeFileSync(join(folder, `formulas/${index}.md`), text);
  }
  return loadFormulary({ formulas: join(folder, 'formulas'), data: join(folder, 'data') });
}
const SAFE = SOUND.replace('superfat: 5', 'superfat: 8');
const textOf = ({ problems }: Pick<ReturnType<typeof load>, 'problems'>) =>
  `${problems
    .map(problemText)
    .join('\n')
    .replace(/\S+(?=formulas\/)/g, '')}\n`;
/** Where the exact text of a rule is kept, beside those of the broken files. */
const snapshotOf = (rule: string) =>
  join(import.meta.dirname, '../broken', `${rule.replace('formula/', '')}.problems.txt`);
const rulesOf = ({ problems }: ReturnType<typeof load>) => problems.map(({ rule }) => rule);

test('a shop of its own: the packaged fats, no lots of another shop, sorted by code', () => {
  const loaded = load([SAFE.replace('QY-014', 'QY-020'), SAFE]);
  if (!loaded.ok) throw new Error(loaded.problems.map(problemText).join('\n'));
  const { reference, formulas } = loaded.formulary;
  expect(formulas.map(({ formula }) => formula.code)).toEqual(['QY-014', 'QY-020']);
  expect(reference.fats.size).toBeGreaterThan(40);
  expect(reference.shop.name).toBe('Workshop of a test');
  expect(reference.lots).toEqual({ fats: [], alkalis: [] });
});

test('the starter file passes in a shop without lots', () => {
  const loaded = load([starterFormula('AA-001', 'First Soap', '2026-12-01')]);
  expect(loaded.problems.map(problemText)).toEqual([]);
  expect(loaded.ok).toBe(true);
});

describe('rules that need the whole formulary', () => {
  test.each([
    ['formula/below-release-limit', SAFE.replace('superfat: 8', 'superfat: 1'), ''],
    [
      'formula/concession-not-needed',
      SAFE.replace('targets:', 'concession: { reason: None., by: QA, on: 2026-01-01 }\ntargets:'),
      '',
    ],
    [
      'formula/stock-too-weak',
      SAFE.replace('lye-concentration: 32', 'lye-concentration: 40'),
      STOCK,
    ],
    [
      'formula/nothing-saponifies',
      SAFE.replace(/fats:\n( .*\n)+/, 'fats: [{ fat: jojoba, share: 100 }]\n')
        .replace(':weight[olive]', ':weight[jojoba]')
        .replace(':weight[coconut] with ', ''),
      '',
    ],
    [
      'formula/lye-does-not-dissolve',
      SAFE.replace('lye-concentration: 32', 'lye-concentration: 45, hold-back: 60'),
      '',
    ],
  ])('%s', async (rule, text, lots) => {
    const loaded = load([text], lots);
    expect(loaded.ok).toBe(false);
    expect(rulesOf(loaded)).toEqual([rule]);
    await expect(textOf(loaded)).toMatchFileSnapshot(snapshotOf(rule));
  });

  // no liquid of the packaged data goes that far
  test('formula/liquids-out-of-range', async () => {
    const { formula } = readFormula(
      SOUND.replace(
        'targets:',
        'liquids: [{ liquid: goat-milk, replaces-water: 100, at: lye }]\ntargets:',
      ),
      'a.md',
      KNOWN,
    );
    if (!formula) throw new Error('the formula is sound');
    const breach = {
      rule: 'liquids-need-more-alkali-than-they-leave-water-for',
      numbers: { remaining: -0.1 },
    };
    await expect(textOf({ problems: [refusalProblem(formula, breach)] })).toMatchFileSnapshot(
      snapshotOf('formula/liquids-out-of-range'),
    );
    expect(refusalProblem(formula, breach)).toMatchObject({
      rule: 'formula/liquids-out-of-range',
      file: 'a.md',
      line: 13,
      column: 10,
    });
  });
});

describe('a shop that is not whole', () => {
  test('one broken formula among many leaves no formulary', () => {
    const loaded = load([SAFE, SAFE.replace('QY-014', 'QY-015').replace('olive,', 'olve,')]);
    expect(loaded.ok).toBe(false);
    expect(loaded).not.toHaveProperty('formulary');
    expect(rulesOf(loaded)).toEqual(['formula/unknown-fat']);
  });

  test('problems of data and formulas come together', () => {
    const loaded = load([SAFE.replace('superfat: 8', 'superfat: 80')], 'alkalis: 5\n');
    expect(loaded.ok).toBe(false);
    expect(rulesOf(loaded).some((rule) => rule.startsWith('data/'))).toBe(true);
    expect(rulesOf(loaded)).toContain('formula/superfat-range');
  });

  test('no formulas', () => {
    expect(rulesOf(load([]))).toEqual(['formulary/empty']);
  });

  test('folders that are not there', () => {
    const loaded = loadFormulary({ formulas: join(root, 'no'), data: join(root, 'none') });
    expect(loaded.ok).toBe(false);
    expect(rulesOf(loaded)).toContain('formulary/missing-folder');
    expect(rulesOf(loaded)).toContain('data/missing-folder');
  });
});
