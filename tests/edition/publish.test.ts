import { spawnSync } from 'node:child_process';
import { existsSync, mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { isWhole, verifyFolder } from '../../src/edition/checksums-fs.ts';
import { parseLedger, publishedIn } from '../../src/edition/ledger.ts';
import { publishEdition } from '../../src/edition/publish-fs.ts';
import { approvedShop, builtFolder, emptyFolder, shopWith } from './shop.ts';

type TestShop = ReturnType<typeof shopWith>;

const publish = (shop: TestShop, from: string, to: string, drafts = false) =>
  publishEdition({ from, to, data: shop.folders.data, drafts });
const pageIn = (folder: string) => readFileSync(join(folder, 'index.html'), 'utf8');
const recorded = ({ ledger }: TestShop) =>
  publishedIn(parseLedger(readFileSync(ledger, 'utf8'), ledger).entries);
const isVerified = (folder: string) => {
  const checked = verifyFolder(folder);
  return checked.ok && isWhole(checked.verified);
};

describe('publishing', () => {
  test('copies, verifies, keeps the one before and records each edition once', () => {
    const shop = approvedShop();
    const to = join(emptyFolder(), 'handbook');
    const first = builtFolder(shop, 'first');
    expect(publish(shop, first, to)).toMatchObject({ ok: true, files: 4, previous: null });
    expect(pageIn(to)).toBe('first');
    expect(isVerified(to)).toBe(true);
    const second = builtFolder(shop, 'second', { asOf: '2026-12-15' });
    expect(publish(shop, second, to)).toMatchObject({ ok: true, previous: `${to}-previous` });
    expect(pageIn(to)).toBe('second');
    expect(pageIn(`${to}-previous`)).toBe('first');
    expect(isVerified(`${to}-previous`)).toBe(true);
    expect(publish(shop, second, join(emptyFolder(), 'stick'))).toMatchObject({ ok: true });
    expect(recorded(shop).map(({ asOf }) => asOf)).toEqual(['2026-12-01', '2026-12-15']);
    expect(readdirSync(dirname(to)).sort()).toEqual(['handbook', 'handbook-previous']);
  });

  test('refuses a proof unless told, and never records one', () => {
    const shop = shopWith();
    const to = join(emptyFolder(), 'handbook');
    const from = builtFolder(shop, 'proof', { drafts: true });
    expect(publish(shop, from, to)).toMatchObject({ problems: [{ rule: 'edition/proof' }] });
    expect(existsSync(to)).toBe(false);
    expect(publish(shop, from, to, true)).toMatchObject({ ok: true });
    expect(existsSync(shop.ledger)).toBe(false);
  });

  test('refuses an edition that was touched after it was built', () => {
    const shop = approvedShop();
    const from = builtFolder(shop);
    writeFileSync(join(from, 'index.html'), 'other weights');
    const to = join(emptyFolder(), 'handbook');
    expect(publish(shop, from, to)).toMatchObject({ problems: [{ rule: 'edition/not-whole' }] });
    expect(existsSync(to)).toBe(false);
    rmSync(join(from, 'edition.json'));
    expect(publish(shop, from, to)).toMatchObject({
      problems: [{ rule: 'edition/not-an-edition' }],
    });
  });

  test('refuses a revision that was published as something else', () => {
    const shop = approvedShop();
    publish(shop, builtFolder(shop), join(emptyFolder(), 'a'));
    const ledger = readFileSync(shop.ledger, 'utf8');
    rmSync(shop.ledger);
    shop.edit('TT-001.md', 'Stir', 'Pour');
    shop.approve();
    const from = builtFolder(shop);
    writeFileSync(shop.ledger, ledger);
    expect(publish(shop, from, join(emptyFolder(), 'b'))).toMatchObject({
      problems: [{ rule: 'edition/same-revision' }],
    });
  });

  test.each([
    ["somebody's folder", 'edition/target'],
    ['a file', 'edition/target'],
    ['a folder whose parent is not there', 'edition/target'],
    ['the edition itself', 'edition/target'],
    ['a folder in the edition', 'edition/target'],
    ['the root', 'edition/target'],
    ["another shop's edition", 'edition/edition-of-another-shop'],
  ])('leaves %s alone', (what, rule) => {
    const shop = approvedShop();
    const from = builtFolder(shop);
    let to = join(emptyFolder(), 'x');
    if (what === "somebody's folder") {
      mkdirSync(to);
      writeFileSync(join(to, 'letters.txt'), '');
    } else if (what === 'a file') writeFileSync(to, '');
    else if (what === 'a folder whose parent is not there') to = join(to, 'y');
    else if (what === 'the edition itself') to = from;
    else if (what === 'a folder in the edition') to = join(from, 'inside');
    else if (what === 'the root') to = '/';
    else {
      const other = shopWith();
      other.editSettings('Workshop of a test', 'Another workshop');
      other.approve();
      to = builtFolder(other);
    }
    const before = existsSync(to) && what !== 'a file' ? readdirSync(to) : null;
    expect(publish(shop, from, to)).toMatchObject({ ok: false, problems: [{ rule }] });
    if (before) expect(readdirSync(to)).toEqual(before);
    expect(isVerified(from)).toBe(true);
  });

  test.skipIf(process.platform !== 'linux')(
    'a mounted disk itself is refused with what to give',
    () => {
      const shop = approvedShop();
      expect(publish(shop, builtFolder(shop), '/dev/shm')).toMatchObject({
        problems: [{ rule: 'edition/target' }],
      });
    },
  );

  test.skipIf(process.platform === 'win32')('on a full disk the old edition stands', () => {
    const shop = approvedShop();
    const to = join(emptyFolder(), 'handbook');
    publish(shop, builtFolder(shop, 'old'), to);
    const from = builtFolder(shop, 'new '.repeat(20_000), { asOf: '2026-12-15' });
    // the limit stands in for a full disk: the file system refuses the bytes in the same place
    const words = [process.execPath, 'src/commands/run.js', 'publish', to, '--from', from];
    const all = [...words, '--data', shop.folders.data].map((word) => `'${word}'`).join(' ');
    const { status, stderr } = spawnSync('sh', ['-c', `trap "" XFSZ; ulimit -f 32; exec ${all}`], {
      encoding: 'utf8',
    });
    expect(stderr).toContain('[edition/cannot-write]');
    expect(status).toBe(1);
    expect(pageIn(to)).toBe('old');
    expect(readdirSync(dirname(to))).toEqual(['handbook']);
    expect(recorded(shop)).toHaveLength(1);
  });
});

test('verify and publish as commands', () => {
  const shop = approvedShop();
  const from = builtFolder(shop);
  const to = join(emptyFolder(), 'handbook');
  const run = (...args: string[]) =>
    spawnSync(process.execPath, ['src/commands/run.js', ...args], { encoding: 'utf8' });
  expect(run('publish', to, '--from', from, '--data', shop.folders.data).status).toBe(0);
  expect(run('verify', to)).toMatchObject({
    status: 0,
    stdout: expect.stringContaining('4 files, all as listed'),
  });
  writeFileSync(join(to, 'index.html'), 'changed');
  rmSync(join(to, 'formulas/TT-001.html'));
  writeFileSync(join(to, 'new.html'), '');
  expect(run('verify', to)).toMatchObject({
    status: 1,
    stderr: 'missing  formulas/TT-001.html\nchanged  index.html\nextra    new.html\n',
  });
});
