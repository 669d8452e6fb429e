import { execFile } from 'node:child_process';
import { mkdtempSync, readdirSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { promisify } from 'node:util';
import { afterAll, describe, expect, test } from 'vitest';
import { FOLDERS, readArguments } from '../../src/commands/arguments.ts';
import { nextCode } from '../../src/commands/next-code.ts';
import { readFormula } from '../../src/formulary/read-formula.ts';
import { starterFormula } from '../../src/words/en/starter-formula.ts';
import { KNOWN } from './known.ts';

const usage = {
  command: 'try',
  about: 'Tries.',
  options: { ...FOLDERS, loud: { value: null, about: 'with noise' } },
  files: { name: 'FILE', least: 0, most: 1 },
};

describe('arguments', () => {
  test.each([
    [['--formulas', 'x', '--loud', 'y'], { formulas: 'x', loud: '' }, ['y']],
    [['--data=x'], { data: 'x' }, []],
    [[], {}, []],
  ])('%j', (args, given, files) => {
    expect(readArguments(args, usage)).toEqual({ ok: true, given, files });
  });

  test.each([
    [['--formula', 'x'], 'There is no option --formula; did you mean "formulas"?'],
    [['--zzz'], 'There is no option --zzz.'],
    [['--data'], '--data needs a value, DIR.'],
    [['--loud=yes'], '--loud takes no value.'],
    [['--data', 'a', '--data', 'b'], '--data is given twice.'],
    [['a', 'b'], '"b" is one argument too many.'],
  ])('%j is refused', (args, text) => {
    const read = readArguments(args, usage);
    expect(read).toMatchObject({ ok: false, status: 1 });
    expect(!read.ok && read.text.split('\n')[0]).toBe(text);
  });

  test('help is no failure', () => {
    expect(readArguments(['--help'], usage)).toMatchObject({ ok: false, status: 0 });
  });
});

test.each([
  [[], 'AA-001'],
  [['QY-001', 'QY-014', 'XX-900'], 'QY-015'],
  [['QY-9', 'QY-10B', 'not a code'], 'QY-11'],
])('the code after %j', (codes, next) => {
  expect(nextCode(codes)).toBe(next);
});

describe('the starter file', () => {
  test.each(['Harbour Lamp', 'No. 5: "Öl" & #Seife', 'true', '- dash', '{braces}', "it's"])(
    'is sound with the name %s',
    (name) => {
      const { formula, problems } = readFormula(
        starterFormula('QY-050', name, '2026-12-01'),
        'new.md',
        KNOWN,
      );
      expect(problems).toEqual([]);
      expect(formula).toMatchObject({ code: 'QY-050', name, revision: 1 });
    },
  );
});

describe('run', () => {
  const folder = mkdtempSync(join(tmpdir(), 'shop-'));
  afterAll(() => rmSync(folder, { recursive: true }));
  const run = async (...args: string[]) =>
    promisify(execFile)(process.execPath, ['src/commands/run.js', ...args]).then(
      ({ stdout, stderr }) => ({ status: 0, stdout, stderr }),
      ({ code, stdout, stderr }) => ({ status: code, stdout, stderr }),
    );

  test('writes a new file once', async () => {
    const formulas = join(folder, 'formulas');
    expect(await run('new', 'First Öl', '--formulas', formulas)).toMatchObject({ status: 0 });
    expect(readdirSync(formulas)).toEqual(['AA-001-first-ol.md']);
    const before = readFileSync(join(formulas, 'AA-001-first-ol.md'), 'utf8');

    expect(await run('new', 'First Öl', '--formulas', formulas, '--code', 'AA-1')).toMatchObject({
      status: 1,
      stderr: 'The code AA-1 is taken; the next free one is AA-002.\n',
    });
    expect(await run('new', 'Path', '--formulas', formulas, '--code', '../x')).toMatchObject({
      status: 1,
    });
    expect(readdirSync(formulas)).toEqual(['AA-001-first-ol.md']);
    expect(readFileSync(join(formulas, 'AA-001-first-ol.md'), 'utf8')).toBe(before);
  });

  test('names the commands there are', async () => {
    const { status, stderr } = await run('bake');
    expect(status).toBe(1);
    expect(stderr).toContain('There is no command "bake".');
  });
});
