import { readFileSync } from 'node:fs';
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { checkSheet, type SheetList } from '../../src/edition/check-sheet.ts';
import { ALPHABET } from '../../src/edition/digest-text.ts';
import { appendToLedger } from '../../src/edition/ledger-fs.ts';
import { publishedEntry } from '../../src/edition/publish-fs.ts';
import { approvedShop, LOTS } from './shop.ts';

const NOW = '8g9p-z8tn-pdkr-n';
const OLD = 'eg2t-8ap1-hvt3-j';
const LIST: SheetList = {
  shop: 'x',
  edition: 'x',
  asOf: '2026-12-01',
  proof: false,
  current: [
    { code: 'TT-001', revision: 3, digests: [NOW] },
    { code: 'TT-003', revision: 1, digests: [] },
  ],
  withdrawn: [{ code: 'TT-002', on: '2026-05-01' }],
  past: [
    { code: 'TT-001', revision: 2, digest: OLD, on: '2026-09-14' },
    { code: 'TT-009', revision: 1, digest: 'gab0-03b5-fe3b-p', on: '2026-10-01' },
  ],
};

describe('a sheet is', () => {
  test.each([
    ['TT-001', NOW],
    ['tt001', '8G9PZ8TNPDKRN'],
    [' tt-1 ', '8g9p z8tn pdkr n'],
  ])('current: %s %s', (code, digest) => {
    expect(checkSheet(code, digest, LIST)).toEqual({
      state: 'current',
      code: 'TT-001',
      revision: 3,
    });
  });

  test('superseded, by which revision and when', () => {
    expect(checkSheet('TT-001', OLD, LIST)).toEqual({
      state: 'superseded',
      code: 'TT-001',
      revision: 2,
      by: 3,
      on: '2026-09-14',
    });
    expect(checkSheet('TT-009', 'gab0-03b5-fe3b-p', LIST)).toMatchObject({ by: null });
  });

  test('withdrawn, whatever stands beside the code', () => {
    for (const digest of [NOW, OLD, '', 'nonsense']) {
      expect(checkSheet('TT-002', digest, LIST)).toMatchObject({
        state: 'withdrawn',
        on: '2026-05-01',
      });
    }
  });

  test('unknown where no edition had it', () => {
    expect(checkSheet('TT-001', '4f2a-91c0-7be4-m', LIST)).toEqual({ state: 'unknown' });
  });

  test('mistyped where digest and code do not belong together', () => {
    expect(checkSheet('TT-003', NOW, LIST)).toEqual({ state: 'mistyped', part: 'code' });
    expect(checkSheet('', NOW, LIST)).toEqual({ state: 'mistyped', part: 'code' });
  });

  test('mistyped for every single wrong symbol', () => {
    fc.assert(
      fc.property(fc.nat(12), fc.constantFrom(...ALPHABET), (at, symbol) => {
        const symbols = [...NOW.replaceAll('-', '')];
        fc.pre(symbols[at] !== symbol);
        expect(checkSheet('TT-001', symbols.with(at, symbol).join(''), LIST)).toEqual({
          state: 'mistyped',
          part: 'digest',
        });
      }),
    );
  });
});

test('the list of an edition knows the sheets of those before', () => {
  const shop = approvedShop();
  const first = shop.edition();
  appendToLedger(shop.ledger, publishedEntry(first.document));
  const [digest = ''] = first.sheets.current[0]?.digests ?? [];
  shop.setLots(LOTS.replace('O-1', 'O-2').replace('190.4', '189.4'));
  const { sheets } = shop.edition({ asOf: '2027-01-10' });
  expect(checkSheet('TT-001', digest, first.sheets)).toMatchObject({ state: 'current' });
  expect(checkSheet('TT-001', digest, sheets)).toEqual({
    state: 'superseded',
    code: 'TT-001',
    revision: 1,
    by: 1,
    on: '2027-01-10',
  });
});

test('what the browser loads imports nothing of Node', () => {
  for (const file of ['check-sheet', 'digest-text']) {
    const text = readFileSync(`src/edition/${file}.ts`, 'utf8');
    const imports = [...text.matchAll(/from '([^']+)'/g)].map(([, name]) => name);
    expect(imports.filter((name) => name !== './digest-text.ts')).toEqual([]);
  }
});
