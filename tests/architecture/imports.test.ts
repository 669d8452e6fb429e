import { readdirSync, readFileSync } from 'node:fs';
import { dirname, join, posix, relative, sep } from 'node:path';
import { fileURLToPath } from 'node:url';
import { describe, expect, test } from 'vitest';

const SRC = fileURLToPath(new URL('../../src', import.meta.url));

/** Each folder of `src` and the folders it may import from; the arrows point one way. */
const MAY_IMPORT: Readonly<Record<string, readonly string[]>> = {
  chemistry: [],
  words: ['chemistry'],
  reference: ['chemistry', 'words'],
  formulary: ['chemistry', 'words', 'reference'],
  cautions: ['chemistry', 'words', 'reference', 'formulary'],
  edition: ['chemistry', 'words', 'reference', 'formulary', 'cautions'],
  handbook: ['chemistry', 'words', 'reference', 'formulary', 'cautions', 'edition'],
  search: ['chemistry', 'words'],
  browser: ['chemistry', 'words', 'search', 'edition'],
  site: [
    'chemistry',
    'words',
    'reference',
    'formulary',
    'cautions',
    'edition',
    'handbook',
    'browser',
    'search',
  ],
  commands: [
    'chemistry',
    'words',
    'reference',
    'formulary',
    'cautions',
    'edition',
    'handbook',
    'search',
    'site',
  ],
};

const FILES = readdirSync(SRC, { recursive: true, encoding: 'utf8' })
  .filter((path) => /\.(ts|astro|js)$/.test(path))
  .map((path) => path.split(sep).join('/'));

const importsOf = (path: string): string[] =>
  [
    ...readFileSync(join(SRC, path), 'utf8').matchAll(/(?:from|import)\s*\(?\s*['"]([^'"]+)['"]/g),
  ].map(([, name = '']) => name);

const folderOf = (path: string) => path.split('/')[0] ?? '';

describe('imports point one way', () => {
  test('there are files to look at', () => expect(FILES.length).toBeGreaterThan(50));

  test.each(FILES)('%s', (path) => {
    const folder = folderOf(path);
    const allowed = MAY_IMPORT[folder];
    expect(allowed, `src/${folder} has no place in the order of folders`).toBeDefined();
    for (const name of importsOf(path).filter((name) => name.startsWith('.'))) {
      const target = posix.normalize(posix.join(posix.dirname(path), name));
      const to = folderOf(target);
      if (to !== folder) expect(allowed, `imports ${name}`).toContain(to);
    }
  });
});

describe('the core is closed', () => {
  const core = FILES.filter((path) => folderOf(path) === 'chemistry');

  test.each(core)('%s imports nothing from outside and knows no clock and no chance', (path) => {
    expect(importsOf(path).filter((name) => !/^\.\/[\w-]+\.ts$/.test(name))).toEqual([]);
    expect(readFileSync(join(SRC, path), 'utf8')).not.toMatch(/Date\b|Math\.random|globalThis/);
  });
});

test('only commands print', () => {
  const printing = FILES.filter(
    (path) =>
      folderOf(path) !== 'commands' &&
      /\bconsole\.|process\.std(out|err)/.test(readFileSync(join(SRC, path), 'utf8')),
  );
  expect(printing).toEqual([]);
});

test('no tracked text names a path of a machine', () => {
  const root = dirname(SRC);
  const machine = /(^|[\s"'`(=])\/(home|root|Users|work|tmp)\//m;
  const texts = readdirSync(root, { recursive: true, encoding: 'utf8' })
    .filter((path) => /\.(ts|js|mjs|astro|md|yaml|json|css)$/.test(path))
    .filter((path) => !/(^|[\\/])(node_modules|dist|\.\w[\w-]*)([\\/]|$)/.test(path))
    .filter((path) => machine.test(readFileSync(join(root, path), 'utf8')))
    .map((path) => relative(root, join(root, path)))
    .filter((path) => !path.endsWith('imports.test.ts'));
  expect(texts).toEqual([]);
});
