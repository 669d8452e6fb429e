import { cpSync, existsSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { editionSchema } from '../../src/edition/edition-schema.ts';
import { appendToLedger } from '../../src/edition/ledger-fs.ts';
import { loadEdition } from '../../src/edition/load-edition-fs.ts';
import { publishedEntry } from '../../src/edition/publish-fs.ts';
import { AS_OF, approvedShop, builtFolder, emptyFolder, FORMULA, shopWith } from './shop.ts';

const LATER = '2026-12-15';

/** Records the edition as published. */
function record(shop: ReturnType<typeof shopWith>, asOf = AS_OF) {
  const { document } = shop.edition({ asOf });
  expect(appendToLedger(shop.ledger, publishedEntry(document))).toEqual([]);
  return document;
}

describe('the id of an edition', () => {
  test('is that of its inputs: the same in another folder, with other line ends, at another time', () => {
    const shop = approvedShop();
    const copy = emptyFolder();
    cpSync(shop.folder, copy, { recursive: true });
    const folders = { formulas: join(copy, 'formulas'), data: join(copy, 'data') };
    const file = join(folders.formulas, 'TT-001.md');
    writeFileSync(file, readFileSync(file, 'utf8').replaceAll('\n', '\r\n'));
    writeFileSync(join(folders.data, '.hidden'), 'x');
    const zone = process.env.TZ;
    process.env.TZ = 'Pacific/Kiritimati';
    const there = loadEdition(folders, { asOf: AS_OF });
    process.env.TZ = zone;
    expect(there.ok && there.edition.document).toEqual(shop.edition().document);
  });

  test('changes with a file, with the day, and with nothing that publishing does', () => {
    const shop = approvedShop();
    const { id } = shop.edition();
    expect(shop.edition({ asOf: LATER }).id).not.toBe(id);
    record(shop);
    expect(shop.edition().id).toBe(id);
    shop.edit('TT-001.md', 'tags: [plain]', 'tags: [plain, bar]');
    expect(shop.edition().id).not.toBe(id);
  });
});

test('edition.json is read back as it was written', () => {
  const shop = approvedShop();
  const folder = builtFolder(shop);
  const text = readFileSync(join(folder, 'edition.json'), 'utf8');
  expect(editionSchema.parse(JSON.parse(text))).toEqual(shop.edition().document);
});

describe('the ledger', () => {
  test('a published revision says one thing for ever', () => {
    const shop = approvedShop();
    record(shop);
    shop.edit('TT-001.md', 'Stir', 'Pour');
    expect(shop.approve()).toMatchObject([{ rule: 'edition/same-revision', line: 6 }]);
    expect(shop.rules({ asOf: LATER })).toContain('edition/same-revision');
    expect(shop.load({ drafts: true }).ok).toBe(true);
    shop.edit('TT-001.md', 'revision: 1', 'revision: 2');
    shop.edit(
      'TT-001.md',
      'tags:',
      'changes:\n  - { revision: 2, on: 2026-12-02, note: Poured. }\ntags:',
    );
    shop.approve();
    expect(shop.rules({ asOf: LATER })).toEqual([]);
    record(shop, LATER);
    shop.write('TT-001.md', FORMULA);
    expect(shop.approve()).toMatchObject([{ rule: 'edition/revision-went-back' }]);
    expect(shop.rules({ asOf: LATER })).toContain('edition/revision-went-back');
  });

  test('a published formula does not vanish', () => {
    const shop = shopWith({ 'a.md': FORMULA, 'b.md': FORMULA.replace('TT-001', 'TT-002') });
    shop.approve('TT-001');
    shop.approve('TT-002');
    record(shop);
    shop.write('b.md', FORMULA.replace('TT-001', 'TT-003'));
    shop.approve('TT-003');
    expect(shop.rules()).toEqual(['edition/formula-vanished']);
  });

  test('a withdrawn formula comes back on a new approval only', () => {
    const shop = approvedShop();
    const withdrawal = 'withdrawn: { on: 2026-12-10, reason: r, by: b }\n';
    shop.edit('TT-001.md', 'tags:', `${withdrawal}tags:`);
    record(shop, LATER);
    shop.edit('TT-001.md', withdrawal, '');
    expect(shop.rules({ asOf: LATER })).toEqual(['edition/back-without-approval']);
    shop.approve('TT-001', { on: '2026-12-11' });
    expect(shop.rules({ asOf: LATER })).toEqual([]);
  });

  test('a line that is broken stops the build', () => {
    const shop = approvedShop();
    writeFileSync(shop.ledger, '{"kind":"published"}\n');
    expect(shop.rules()).toEqual(['edition/ledger-line']);
    rmSync(shop.ledger);
    mkdirSync(shop.ledger);
    expect(shop.rules()).toEqual(['edition/ledger-unreadable']);
  });

  test('two writers do not lose a line of each other', () => {
    const shop = approvedShop();
    const lines = () => readFileSync(shop.ledger, 'utf8').trimEnd().split('\n').length;
    const { document } = shop.edition();
    const before = lines();
    for (let n = 0; n < 5; n++) appendToLedger(shop.ledger, publishedEntry(document));
    expect(lines()).toBe(before + 5);
  });
});

describe('the edition before', () => {
  test('is compared with, from its folder or its edition.json', () => {
    const shop = approvedShop();
    const last = builtFolder(shop);
    shop.edit('TT-001.md', 'revision: 1', 'revision: 2');
    shop.edit(
      'TT-001.md',
      'tags:',
      'changes:\n  - { revision: 2, on: 2026-12-02, note: x }\ntags:',
    );
    shop.approve();
    const changes = shop.edition({ last }).changes;
    expect(changes?.changed).toMatchObject([{ code: 'TT-001', revisionBefore: 1, revision: 2 }]);
    expect(shop.edition({ last: join(last, 'edition.json') }).changes).toEqual(changes);
    expect(shop.edition().changes).toBeNull();
  });

  test.each([
    ['another shop', 'edition/edition-of-another-shop'],
    ['a proof', 'edition/proof'],
    ['no edition', 'edition/not-an-edition'],
    ['something else', 'edition/edition-unreadable'],
  ])('%s is an error', (what, rule) => {
    const shop = approvedShop();
    let last = emptyFolder();
    if (what === 'another shop') {
      const other = shopWith();
      other.editSettings('Workshop of a test', 'Another workshop');
      other.approve();
      last = builtFolder(other);
    } else if (what === 'a proof') last = builtFolder(shopWith(), 'x', { drafts: true });
    else if (what === 'something else') writeFileSync(join(last, 'edition.json'), '{"schema": 1}');
    expect(shop.rules({ last })).toEqual([rule]);
    expect(existsSync(shop.ledger)).toBe(true);
  });
});
