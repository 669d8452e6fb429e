import { mkdirSync, mkdtempSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { readReference } from '../../src/reference/read-reference-fs.ts';
import { LARGEST_FILE } from '../../src/reference/read-text-fs.ts';
import { DATA_PROBLEMS } from '../../src/words/en/problems-data.ts';
import { BROKEN } from './broken-examples.ts';
import { PACKAGED, read, textsOf, withChange } from './packaged-data.ts';

test('the packaged data has no problems', () => {
  expect(textsOf(read(PACKAGED))).toEqual([]);
});

/** Rules about files rather than what stands in them, shown below on a disk; and of formulas' lots. */
const ELSEWHERE = [
  'data/lot-past-retest',
  'data/missing-folder',
  'data/unknown-file',
  'data/unreadable',
  'data/too-large',
  'data/not-utf8',
];

test('every problem has a broken example', () => {
  expect([...BROKEN.map(({ rule }) => rule), ...ELSEWHERE].sort()).toEqual(
    Object.keys(DATA_PROBLEMS)
      // those of the evidence are shown where the evidence is tested
      .filter((rule) => !rule.startsWith('data/evidence-'))
      .sort(),
  );
});

test.each(BROKEN)('$rule', async ({ rule, files }) => {
  const result = read(files);
  expect(result.reference).toBeNull();
  expect(result.problems.map((problem) => problem.rule)).toContain(rule);
  await expect(`${textsOf(result).join('\n')}\n`).toMatchFileSnapshot(
    `broken/${rule.replace('data/', '')}.txt`,
  );
});

test('all problems come at once', () => {
  const spoilt = withChange('shop.yaml', 'fats: 1 kg', 'fats: 1').map((entry) => {
    const other = BROKEN.find(({ rule }) => rule === 'data/no-trade-range');
    return entry.name.startsWith('alkalis/')
      ? (other?.files.find(({ name }) => name === entry.name) ?? entry)
      : entry;
  });
  expect(read(spoilt).problems.map(({ rule }) => rule)).toEqual([
    'data/measure-form',
    'data/no-trade-range',
  ]);
});

test('a broken fat is told once, not again by what names it', () => {
  const { problems } = read(withChange('fats/milk-fat.yaml', 'kind: glyceride', 'kind: glycerid'));
  expect(problems.map(({ rule }) => rule)).toEqual(['data/unknown-word']);
});

describe('folders on a disk', () => {
  let root = '';
  beforeEach(() => {
    root = mkdtempSync(join(tmpdir(), 'reference-'));
  });
  afterEach(() => rmSync(root, { recursive: true, force: true }));

  const write = (name: string, content: string | Uint8Array) => {
    mkdirSync(dirname(join(root, name)), { recursive: true });
    writeFileSync(join(root, name), content);
  };
  const shop = PACKAGED.find(({ name }) => name === 'shop.yaml')?.text ?? '';
  const textsOfFolders = (folders: readonly string[]) =>
    textsOf(readReference(folders)).map((text) => text.replaceAll(root, 'ROOT'));

  test('a shop of its own lies over the packaged data and inherits no lots', () => {
    write('shop.yaml', shop.replace('Test shop', 'Another shop'));
    const olive = PACKAGED.find(({ name }) => name === 'fats/olive.yaml')?.text ?? '';
    write('fats/olive.yaml', olive.replace('name: Olive oil', 'name: Our olive oil'));
    const { reference, problems } = readReference(['data', root]);
    expect(textsOf({ problems })).toEqual([]);
    expect(reference?.shop.name).toBe('Another shop');
    expect(reference?.fats.get('olive')?.name).toBe('Our olive oil');
    expect(reference?.fats.get('coconut')?.name).toBe('Coconut oil');
    expect(reference?.lots).toEqual({ fats: [], alkalis: [] });
  });

  test('a shop without settings does not get those of another', () => {
    write('lots.yaml', 'fats: []\n');
    expect(textsOfFolders(['data', root])).toEqual([
      'ROOT/shop.yaml:1:1  Found no such file, expected "shop.yaml" in the data folder; put it back, or copy the packaged one.  [data/missing-file]',
    ]);
  });

  test('data/missing-folder', () => {
    expect(textsOfFolders([join(root, 'nowhere')])).toEqual([
      'ROOT/nowhere:1:1  Found no such folder, expected a folder of data files; check the path.  [data/missing-folder]',
    ]);
  });

  test('data/unknown-file', () => {
    write('shop.yaml', shop);
    write('lot.yaml', 'fats: []\n');
    write('fats/Olive Oil.yaml', 'name: x\n');
    expect(textsOfFolders(['data', root])).toEqual([
      'ROOT/fats/Olive Oil.yaml:1:1  Found the file "fats/Olive Oil.yaml", expected only data files in the data folder; name it after the fat, with small letters, digits and single hyphens, at most 40.  [data/unknown-file]',
      'ROOT/lot.yaml:1:1  Found the file "lot.yaml", expected only data files in the data folder; did you mean "lots.yaml"?  [data/unknown-file]',
    ]);
  });

  test('data/too-large: a file is refused before it is read', () => {
    write('shop.yaml', shop);
    write('fats/huge.yaml', new Uint8Array(10 * LARGEST_FILE));
    expect(textsOfFolders(['data', root])).toEqual([
      'ROOT/fats/huge.yaml:1:1  Found 10000000 bytes, expected at most 1000000 bytes; a data file holds one material; split it or remove what does not belong.  [data/too-large]',
    ]);
  });

  test('data/not-utf8', () => {
    write('shop.yaml', shop);
    write('fats/trial.yaml', Buffer.from('name: Fat\ninci: Graisse \xe9paisse\n', 'latin1'));
    expect(textsOfFolders(['data', root])).toEqual([
      'ROOT/fats/trial.yaml:2:1  Found bytes that are not UTF-8, expected UTF-8 text; save the file as UTF-8 in your editor.  [data/not-utf8]',
    ]);
  });

  test('data/unreadable', () => {
    write('shop.yaml', shop);
    mkdirSync(join(root, 'fats'));
    // a link to itself can be listed but not opened
    symlinkSync('loop.yaml', join(root, 'fats/loop.yaml'));
    expect(textsOfFolders(['data', root])).toEqual([
      'ROOT/fats/loop.yaml:1:1  Found a file that cannot be opened, expected a readable file; check that it exists and that you may read it.  [data/unreadable]',
    ]);
  });
});
