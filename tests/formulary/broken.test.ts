import { mkdtempSync, readdirSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { readFormulas } from '../../src/formulary/formulas-fs.ts';
import { readFormula } from '../../src/formulary/read-formula.ts';
import { readText } from '../../src/reference/read-text-fs.ts';
import { FORMULA_PROBLEMS } from '../../src/words/en/problems-formula.ts';
import { problemText } from '../../src/words/problem-text.ts';
import { KNOWN, SOUND } from './known.ts';

const FOLDER = join(import.meta.dirname, '../broken');

/** Rules that only the computing of a whole formulary can find; `load.test.ts` breaks those. */
const COMPUTED = [
  'formula/stock-too-weak',
  'formula/liquids-out-of-range',
  'formula/lye-does-not-dissolve',
  'formula/nothing-saponifies',
  'formula/below-release-limit',
  'formula/concession-not-needed',
];
const GENERATED = [
  'formula/too-large',
  'formula/unreadable',
  'formula/not-utf8',
  'formulary/missing-folder',
];
const OF_FOLDERS = [
  'formulary/empty',
  'formulary/nested-file',
  'formula/duplicate-code',
  'formula/unknown-formula',
];

describe('each rule is broken by an example of its own', () => {
  const ofFiles = Object.keys(FORMULA_PROBLEMS).filter(
    (rule) => ![...COMPUTED, ...GENERATED, ...OF_FOLDERS].includes(rule),
  );

  test.each(ofFiles)('%s', async (rule) => {
    const name = rule.replace(/.*\//, '');
    const read = readText(join(FOLDER, `${name}.md`));
    if (!read.ok) throw new Error(`tests/broken/${name}.md is ${read.why}`);
    const { formula, problems } = readFormula(read.text, `${name}.md`, KNOWN);
    expect(formula).toBeNull();
    expect(problems.map((problem) => problem.rule)).toContain(rule);
    await expect(textOf(problems)).toMatchFileSnapshot(join(FOLDER, `${name}.problems.txt`));
  });

  test.each([...OF_FOLDERS, 'formula/one-broken-among-many'])('%s', async (rule) => {
    const name = rule.replace(/.*\//, '');
    const { problems } = readFormulas(join(FOLDER, name), KNOWN);
    const named = problems.map((problem) => ({
      ...problem,
      file: problem.file.replace(`${FOLDER}/`, ''),
      found: problem.found.replaceAll(`${FOLDER}/`, ''),
    }));
    await expect(textOf(named)).toMatchFileSnapshot(join(FOLDER, `${name}.problems.txt`));
    if (rule in FORMULA_PROBLEMS) expect(problems.map((problem) => problem.rule)).toContain(rule);
  });

  test('no example is left over', () => {
    const examples = readdirSync(FOLDER).filter((name) => name.endsWith('.md'));
    expect(examples.map((name) => `formula/${name.slice(0, -3)}`).sort()).toEqual(
      [...ofFiles].sort(),
    );
  });
});

describe('files that are not texts', () => {
  test.each([
    ['too-large.md', SOUND + 'x'.repeat(10_000_000), 'formula/too-large', 1],
    [
      'latin.md',
      Buffer.from(SOUND.replace('Harbour', 'Hafent\u00fcr'), 'latin1'),
      'formula/not-utf8',
      3,
    ],
    ['utf16.md', Buffer.from(`\uFEFF${SOUND}`, 'utf16le'), 'formula/not-utf8', 1],
  ])('%s', async (name, content, rule, line) => {
    const folder = mkdtempSync(join(tmpdir(), 'formulas-'));
    writeFileSync(join(folder, name), content);
    const { formulas, problems } = readFormulas(folder, KNOWN);
    rmSync(folder, { recursive: true });
    expect(formulas).toEqual([]);
    expect(problems).toMatchObject([{ rule, line, column: 1 }]);
    const said = textOf(problems).replaceAll(`${folder}/`, '');
    await expect(said).toMatchFileSnapshot(join(FOLDER, `${name}.problems.txt`));
  });

  test.skipIf(process.platform === 'win32')('a link to nowhere', () => {
    const folder = mkdtempSync(join(tmpdir(), 'formulas-'));
    symlinkSync(join(folder, 'gone'), join(folder, 'a.md'));
    const { problems } = readFormulas(folder, KNOWN);
    rmSync(folder, { recursive: true });
    expect(textOf(problems).replaceAll(`${folder}/`, '')).toBe(
      'a.md:1:1  Found a file that cannot be opened, expected one that may be read; look at its permissions.  [formula/unreadable]\n',
    );
  });

  test('a folder that is not there', () => {
    expect(textOf(readFormulas('no-such-folder', KNOWN).problems)).toBe(
      'no-such-folder:1:1  Found no such folder, expected a folder with one Markdown file for each formula; name the folder with --formulas, or begin with npm run new.  [formulary/missing-folder]\n',
    );
  });
});

const textOf = (problems: readonly Parameters<typeof problemText>[0][]) =>
  `${problems.map(problemText).join('\n')}\n`;
