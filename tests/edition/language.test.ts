import {
  copyFileSync,
  existsSync,
  mkdtempSync,
  readFileSync,
  rmSync,
  writeFileSync,
} from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, expect, test } from 'vitest';
import { loadEdition } from '../../src/edition/load-edition-fs.ts';
import { SHOP_FILES } from '../../src/reference/data-files.ts';
import { speak } from '../../src/words/catalogue.ts';

const root = mkdtempSync(join(tmpdir(), 'language-'));
afterAll(() => {
  speak('en-GB');
  rmSync(root, { recursive: true, force: true });
});

/** What identifies the demonstration in a language: a fingerprint and a digest for every sheet. */
function identityIn(locale: string) {
  const data = mkdtempSync(join(root, 'data-'));
  for (const name of [...SHOP_FILES, 'ledger.jsonl'].filter((file) => existsSync(`data/${file}`)))
    copyFileSync(`data/${name}`, join(data, name));
  const shop = readFileSync('data/shop.yaml', 'utf8');
  writeFileSync(join(data, 'shop.yaml'), shop.replace('locale: en-GB', `locale: ${locale}`));
  speak(locale);
  const loaded = loadEdition({ formulas: 'formulas', data }, { asOf: '2026-12-01' });
  if (!loaded.ok) throw new Error(JSON.stringify(loaded.problems, null, 2));
  const { reference, formulas } = loaded.edition.formulary;
  return {
    olive: reference.fats.get('olive')?.name,
    sheets: formulas.map(({ document }) => [
      document.code,
      document.fingerprint,
      document.batches.map(({ id, digest }) => [id, digest]),
    ]),
  };
}

test('fingerprints and weights digests are the same in every language', () => {
  const english = identityIn('en-GB');
  const spanish = identityIn('es-MX');
  expect([english.olive, spanish.olive]).toEqual(['Olive oil', 'Aceite de oliva']);
  expect(english.sheets.length).toBeGreaterThan(20);
  expect(spanish.sheets).toEqual(english.sheets);
});
