import { readdirSync } from 'node:fs';
import { sep } from 'node:path';
import { fileURLToPath } from 'node:url';
import { expect, test } from 'vitest';
import { PAGE_KINDS } from '../support/page-kinds.ts';

const folder = fileURLToPath(new URL('../../src/site/pages', import.meta.url));

test('every page file has a kind, on which readers of all sorts are thought of', () => {
  const files = readdirSync(folder, { recursive: true, encoding: 'utf8' })
    .map((path) => path.replaceAll(sep, '/'))
    .filter((path) => path.endsWith('.astro'));
  expect(files.length).toBeGreaterThan(20);
  expect(Object.keys(PAGE_KINDS).sort()).toEqual(files.sort());
});
