import { mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { loadSite } from '../../src/commands/load-site.ts';
import { AS_OF, shopWith } from '../edition/shop.ts';

test('a shop that replaces a fat is not held against the published values of another', () => {
  const shop = shopWith();
  const olive = readFileSync('data/fats/olive.yaml', 'utf8');
  mkdirSync(join(shop.folders.data, 'fats'));
  writeFileSync(
    join(shop.folders.data, 'fats/olive.yaml'),
    // without a composition the models of the evidence have no number for olive oil
    olive
      .replace('name: Olive oil', 'name: Our olive oil')
      .replace(/^compositions:\n( .*\n)*/m, ''),
  );
  const loaded = loadSite(shop.folders, { asOf: AS_OF, drafts: true });
  expect(loaded.problems.filter(({ severity }) => severity === 'error')).toEqual([]);
  if (!loaded.ok) throw new Error('nothing was loaded');
  const { evidence, formulary } = loaded.input;
  expect(formulary.reference.fats.get('olive')?.name).toBe('Our olive oil');
  const subjects = evidence.rows.map(({ subject }) => subject);
  expect(subjects).toContain('Olive oil');
  expect(subjects).not.toContain('Our olive oil');
});
