import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, expect, test } from 'vitest';
import { speakFor } from '../../src/commands/speak-for.ts';
import { loadEdition } from '../../src/edition/load-edition-fs.ts';
import type { ShopFolders } from '../../src/formulary/formulary.ts';
import { EDITION_MARK, handOverCommon } from '../../src/site/common-input.ts';
import {
  commonOf,
  handOver,
  type SiteInput,
  siteInput,
  withoutFormulary,
} from '../../src/site/input.ts';
import { keptPath } from '../../src/site/kept-path.ts';
import { speak } from '../../src/words/catalogue.ts';
import { SHOP_CHANGES, writeSmallShop } from '../support/small-shop.ts';

const folder = mkdtempSync(join(tmpdir(), 'kept-'));
afterEach(() => {
  rmSync(folder, { recursive: true, force: true });
  speak('en-GB');
});

/** What the pages of each formula are kept under, by its code. */
function keysOf(shop: ShopFolders, asOf = '2026-12-01'): ReadonlyMap<string, string> {
  speakFor(shop.data);
  const loaded = loadEdition(shop, { asOf, drafts: true, last: null });
  if (!loaded.ok) throw new Error(JSON.stringify(loaded.problems));
  const { edition } = loaded;
  const { formulary } = edition;
  handOverCommon(commonOf({ edition, formulary, asOf }, EDITION_MARK));
  return new Map(
    formulary.formulas.map((computed) => {
      const { code } = computed.document;
      const state = edition.states.get(code) ?? 'not-approved';
      return [code, keptPath({ code }, { computed, state }).cacheKey];
    }),
  );
}

const before = keysOf(writeSmallShop(folder));

test('the same inputs give the same keys', () => {
  expect(keysOf(writeSmallShop(folder))).toEqual(before);
  expect(new Set(before.values()).size).toBe(3);
});

test.each(SHOP_CHANGES)('$name: $touches', ({ make, options, touches }) => {
  const shop = writeSmallShop(folder);
  make(shop);
  const after = keysOf(shop, options?.asOf);
  const changed = [...before].filter(([code, key]) => after.get(code) !== key);
  const expected = { all: ['BM-0001', 'BM-0002', 'BM-0003'], first: ['BM-0001'], none: [] };
  expect(changed.map(([code]) => code)).toEqual(expected[touches]);
});

test('while a kept page is made nothing can read the whole formulary', async () => {
  const loaded = loadEdition(writeSmallShop(folder), {
    asOf: '2026-12-01',
    drafts: true,
    last: null,
  });
  if (!loaded.ok) throw new Error('the small shop has problems');
  const { edition } = loaded;
  handOver({ edition, formulary: edition.formulary, asOf: edition.asOf } as SiteInput, edition.id);
  await expect(withoutFormulary(async () => siteInput())).rejects.toThrow('whole formulary');
  expect(siteInput().formulary.formulas).toHaveLength(3);
});
