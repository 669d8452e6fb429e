import { mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { whatIsWrongWith } from '../../src/reference/ids.ts';
import { readReference } from '../../src/reference/read-reference-fs.ts';
import { read, textsOf, withChange } from './packaged-data.ts';

// the names are those of Microsoft, "Naming Files, Paths, and Namespaces"
test.each(['con', 'prn', 'aux', 'nul', 'com1', 'com9', 'lpt1', 'lpt0'])(
  'no file can be called %s on Windows',
  (id) => expect(whatIsWrongWith(id)).toMatch(/device of Windows/),
);

test.each(['', 'Olive', 'a b', '../a', 'a/b', 'a.', 'nul.html', 'a--b', '-a', 'é', '__proto__'])(
  '"%s" is no id',
  (id) => expect(whatIsWrongWith(id)).toMatch(/small letters/),
);

test.each(['olive', 'com10', 'console', 'sunflower-ho', 'x'.repeat(40)])('%s is an id', (id) =>
  expect(whatIsWrongWith(id)).toBeNull(),
);

describe('every id of a material is checked where it stands', () => {
  test.each([
    ['additives.yaml', '\nkaolin:', '\n"../kaolin":'],
    ['additives.yaml', '\nkaolin:', '\naux:'],
    ['liquids.yaml', '\ngoat-milk:', '\n"<b>":'],
    ['blends.yaml', 'firm:', 'nul:'],
    ['shop.yaml', 'id: pot', 'id: con'],
  ])('%s, %j as %j', (name, from, to) => {
    const { reference, problems } = read(withChange(name, from, to));
    expect(reference).toBeNull();
    expect(problems.map(({ rule }) => rule)).toContain('data/text-form');
  });

  test('one id on a sheet means one thing', () => {
    const liquid = textsOf(read(withChange('liquids.yaml', '\ngoat-milk:', '\nkaolin:')));
    expect(liquid).toHaveLength(1);
    expect(liquid[0]).toMatch(/the id "kaolin", which is also that of an additive.*repeated-entry/);
    const additive = textsOf(read(withChange('additives.yaml', '\nkaolin:', '\nolive:')));
    expect(additive[0]).toMatch(/the id "olive", which is also that of a fat.*repeated-entry/);
  });

  test('a fat whose file could not lie on every disk', () => {
    const folder = mkdtempSync(join(tmpdir(), 'ids-'));
    mkdirSync(join(folder, 'fats'));
    writeFileSync(join(folder, 'shop.yaml'), readFileSync('data/shop.yaml'));
    writeFileSync(join(folder, 'fats/aux.yaml'), readFileSync('data/fats/olive.yaml'));
    const { problems } = readReference(['data', folder]);
    rmSync(folder, { recursive: true });
    expect(textsOf({ problems }).map((text) => text.replaceAll(folder, 'ROOT'))).toEqual([
      'ROOT/fats/aux.yaml:1:1  Found the file "fats/aux.yaml", expected only data files in the data folder; name it after the fat, with an id that is no device of Windows, where no file can have its name.  [data/unknown-file]',
    ]);
  });
});
