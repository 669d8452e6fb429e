import { mkdtempSync, readdirSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, expect, test } from 'vitest';
import { buildWithCopy, copyProject } from '../support/project-copy.ts';
import { SHOP_CHANGES, writeSmallShop } from '../support/small-shop.ts';

const folder = mkdtempSync(join(tmpdir(), 'kept-'));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

test('after a change of one formula the pages of the others are kept, and all are as from nothing', () => {
  const project = join(folder, 'project');
  copyProject(project);
  const shop = writeSmallShop(join(folder, 'shop'));
  const pages = join(project, '.cache', 'pages');
  const build = (out: string) => {
    const to = join(folder, out);
    const { formulas, data } = shop;
    buildWithCopy(project, ['--drafts', '--formulas', formulas, '--data', data, '--out', to]);
    return readFileSync(join(to, 'sha256sums.txt'), 'utf8');
  };
  const before = build('before');
  // of each formula its page, its working and three sheets
  expect(readdirSync(pages)).toHaveLength(15);
  const change = SHOP_CHANGES.find(({ touches }) => touches === 'first');
  change?.make(shop);
  const kept = build('kept');
  expect(readdirSync(pages)).toHaveLength(20);
  rmSync(pages, { recursive: true });
  expect(kept).toBe(build('clean'));
  expect(kept).not.toBe(before);
}, 300_000);
