import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { buildWithCopy, copyProject } from '../support/project-copy.ts';
import { SHOP_CHANGES, writeSmallShop } from '../support/small-shop.ts';

const folder = mkdtempSync(join(tmpdir(), 'kept-'));
const project = join(folder, 'project');
const pages = join(project, '.cache', 'pages');
afterAll(() => rmSync(folder, { recursive: true, force: true }));

describe('after a change of each kind of input, kept pages and all others are as from nothing', () => {
  beforeAll(() => copyProject(project));

  test.each(SHOP_CHANGES)('$name', ({ name, make, options }) => {
    const place = join(folder, name.replaceAll(/\W/g, '-'));
    const shop = writeSmallShop(place);
    const build = (asOf: string) => {
      const { formulas, data } = shop;
      const out = join(place, 'out');
      const files = ['--formulas', formulas, '--data', data, '--out', out];
      buildWithCopy(project, ['--drafts', '--as-of', asOf, ...files]);
      return readFileSync(join(out, 'sha256sums.txt'), 'utf8');
    };
    const before = build('2026-12-01');
    make(shop);
    const kept = build(options?.asOf ?? '2026-12-01');
    rmSync(pages, { recursive: true });
    expect(kept).toBe(build(options?.asOf ?? '2026-12-01'));
    expect(kept).not.toBe(before);
  });
});
