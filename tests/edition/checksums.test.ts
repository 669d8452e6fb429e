import { spawnSync } from 'node:child_process';
import { mkdirSync, readFileSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { verifyFolder, writeChecksums } from '../../src/edition/checksums-fs.ts';
import { emptyFolder } from './shop.ts';

function sealed() {
  const folder = emptyFolder();
  mkdirSync(join(folder, 'formulas'));
  writeFileSync(join(folder, 'empty'), '');
  writeFileSync(join(folder, 'index.html'), 'abc');
  writeFileSync(join(folder, 'formulas/TT 1.html'), 'x');
  writeChecksums(folder);
  return folder;
}

test('hashes are those of the standard', () => {
  // FIPS 180-4: the empty message and "abc"
  expect(readFileSync(join(sealed(), 'sha256sums.txt'), 'utf8').split('\n')).toEqual([
    'e3b0c44298fc1c149afbf4c8996fb92427ae41e4649b934ca495991b7852b855  empty',
    expect.stringMatching(/^[0-9a-f]{64} {2}formulas\/TT 1\.html$/),
    'ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad  index.html',
    '',
  ]);
});

const hasTool = spawnSync('sha256sum', ['--version']).status === 0;
test.skipIf(!hasTool)('sha256sum -c accepts the list', () => {
  const folder = sealed();
  const check = () => spawnSync('sha256sum', ['-c', '--strict', 'sha256sums.txt'], { cwd: folder });
  expect(check().status).toBe(0);
  writeFileSync(join(folder, 'index.html'), 'abd');
  expect(check().status).toBe(1);
});

describe('verifying', () => {
  test('a folder as it was written', () => {
    expect(verifyFolder(sealed())).toEqual({
      ok: true,
      verified: { listed: 3, missing: [], changed: [], extra: [] },
    });
  });

  test('says what is missing, changed and extra', () => {
    const folder = sealed();
    rmSync(join(folder, 'empty'));
    writeFileSync(join(folder, 'index.html'), 'abd');
    writeFileSync(join(folder, 'formulas/new.html'), '');
    symlinkSync(join(folder, 'index.html'), join(folder, 'link.html'));
    expect(verifyFolder(folder)).toMatchObject({
      verified: {
        missing: ['empty'],
        changed: ['index.html'],
        extra: ['formulas/new.html', 'link.html'],
      },
    });
  });

  test.each([
    ['no list', null, 1],
    ['words', 'not a list\n', 1],
    ['a path out of the folder', `${'0'.repeat(64)}  ../x\n`, 1],
    ['an absolute path', `${'0'.repeat(64)}  a\n${'0'.repeat(64)}  /etc/hostname\n`, 2],
    ['a short hash', `${'0'.repeat(63)}  index.html\n`, 1],
  ])('refuses %s', (_, text, line) => {
    const folder = sealed();
    rmSync(join(folder, 'sha256sums.txt'));
    if (text !== null) writeFileSync(join(folder, 'sha256sums.txt'), text);
    expect(verifyFolder(folder)).toMatchObject({
      ok: false,
      problems: [{ rule: 'edition/checksums', line }],
    });
  });

  test('a folder in the place of a file is a change', () => {
    const folder = sealed();
    rmSync(join(folder, 'empty'));
    mkdirSync(join(folder, 'empty'));
    expect(verifyFolder(folder)).toMatchObject({ verified: { missing: ['empty'] } });
  });
});

test.skipIf(process.platform === 'win32')('a name that no list can hold is refused', () => {
  const folder = emptyFolder();
  writeFileSync(join(folder, 'a\nb'), '');
  expect(() => writeChecksums(folder)).toThrow(RangeError);
});
