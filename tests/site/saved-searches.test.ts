import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, test } from 'vitest';
import { readSavedSearches } from '../../src/site/find/saved-searches-fs.ts';
import { FIXTURE } from '../search/finder-fixture.ts';

const folder = mkdtempSync(join(tmpdir(), 'searches-'));
afterAll(() => rmSync(folder, { recursive: true }));

function read(yaml: string) {
  writeFileSync(join(folder, 'searches.yaml'), yaml);
  return readSavedSearches(folder, FIXTURE);
}

test('a kept search is read as it stands', () => {
  const { searches, problems } = read(
    'searches:\n  - id: mild\n    title: High superfat\n    search: superfat=6..&kind=bar\n',
  );
  expect(problems).toEqual([]);
  expect(searches).toEqual([
    { id: 'mild', title: 'High superfat', note: null, search: 'superfat=6..&kind=bar' },
  ]);
});

test('no file, no searches', () =>
  expect(readSavedSearches(join(folder, 'nowhere'), FIXTURE)).toEqual({
    searches: [],
    problems: [],
  }));

describe('a search that cannot be answered is a problem at its place', () => {
  test.each([
    ['an unknown property', 'weather=5..', 'weather=5..', 4],
    ['an unknown fat', 'fats=unobtainium', 'fats=unobtainium', 4],
    ['a range of words', 'superfat=low', 'superfat=low', 4],
    ['words, which no page answers when it is made', 'words=olive', 'words=olive', 4],
    ['where to look for words', 'where=methods', 'where=methods', 4],
  ])('%s', (_, search, found, line) => {
    const { problems } = read(`searches:\n  - id: one\n    title: One\n    search: ${search}\n`);
    expect(problems).toHaveLength(1);
    expect(problems[0]).toMatchObject({
      rule: 'data/text-form',
      found: `"${found}"`,
      line,
      column: 13,
    });
  });

  test('two of one id', () => {
    const entry = (title: string) => `  - { id: one, title: ${title}, search: superfat=5 }\n`;
    const { problems } = read(`searches:\n${entry('First')}${entry('Second')}`);
    expect(problems).toMatchObject([{ rule: 'data/repeated-entry', line: 3 }]);
  });

  test('a file of another form', () => {
    expect(read('- id: one\n').problems.length).toBeGreaterThan(0);
    expect(read('searches:\n  - id: A B\n').problems.length).toBeGreaterThan(0);
  });
});
