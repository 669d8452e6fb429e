import { mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, expect, test } from 'vitest';
import { keptPages } from '../../src/site/kept-pages-fs.ts';

const folder = mkdtempSync(join(tmpdir(), 'pages-'));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

const page = Buffer.from('<p>129.8 g é</p>');

test('a page comes back under its own name and program alone', () => {
  const kept = keptPages(folder, 'one');
  expect(kept.find('a')).toBeNull();
  kept.keep('a', page);
  expect(kept.find('a')?.equals(page)).toBe(true);
  expect(kept.find('b')).toBeNull();
  expect(keptPages(folder, 'two').find('a')).toBeNull();
});

test.each([
  { name: 'cut off', damage: (bytes: Buffer) => bytes.subarray(0, -3) },
  { name: 'empty', damage: () => Buffer.alloc(0) },
  { name: 'changed', damage: (bytes: Buffer) => Buffer.from(`${bytes}`.replace('129', '192')) },
])('a file that is $name counts as none', ({ damage }) => {
  const kept = keptPages(folder, 'one');
  kept.keep('a', page);
  for (const name of readdirSync(folder)) {
    writeFileSync(join(folder, name), damage(readFileSync(join(folder, name))));
  }
  expect(kept.find('a')).toBeNull();
});
