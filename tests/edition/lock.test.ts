import { spawn, spawnSync } from 'node:child_process';
import { once } from 'node:events';
import { existsSync, mkdirSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { hostname } from 'node:os';
import { dirname, join } from 'node:path';
import { expect, test } from 'vitest';
import { lockFileOf, lockFolder } from '../../src/edition/lock-fs.ts';
import { publishEdition } from '../../src/edition/publish-fs.ts';
import { problemText } from '../../src/words/problem-text.ts';
import { approvedShop, builtFolder, emptyFolder } from './shop.ts';

const ENDED = spawnSync(process.execPath, ['-e', '']).pid;

test('one at a time, then the next', () => {
  const dist = join(emptyFolder(), 'dist');
  const first = lockFolder(dist);
  const second = lockFolder(dist);
  expect(first.ok && first.lock.isHeld()).toBe(true);
  expect(second.ok ? [] : second.problems.map(problemText)).toEqual([
    `${dist}:1:1  Found a folder that process ${process.pid} on ${hostname()} is writing, expected one command at a time for one folder; wait until it has ended; if nothing runs there any more, delete .dist-lock beside the folder.  [edition/in-use]`,
  ]);
  if (first.ok) first.lock.release();
  expect(readdirSync(dirname(dist))).toEqual([]);
  expect(lockFolder(dist).ok).toBe(true);
});

test.each([
  ['a process that has ended', `${ENDED} ${hostname()}\n`],
  ['a process of another time with this number', `${process.pid} ${hostname()}\n`],
  ['a file cut short', ''],
])('what was left by %s is taken over', (_, text) => {
  const dist = join(emptyFolder(), 'dist');
  writeFileSync(lockFileOf(dist), text);
  expect(lockFolder(dist).ok).toBe(true);
});

test('of a process on another machine nobody can tell', () => {
  const dist = join(emptyFolder(), 'dist');
  writeFileSync(lockFileOf(dist), `${ENDED} another-machine\n`);
  expect(lockFolder(dist).ok).toBe(false);
});

test('a hold that was taken over is known to be lost, and is not released for the other', () => {
  const dist = join(emptyFolder(), 'dist');
  const taken = lockFolder(dist);
  writeFileSync(lockFileOf(dist), `${ENDED} another-machine\n`);
  expect(taken.ok && taken.lock.isHeld()).toBe(false);
  if (taken.ok) taken.lock.release();
  expect(existsSync(lockFileOf(dist))).toBe(true);
});

test('neither what is being built nor what is being published to can be published', async () => {
  const shop = approvedShop();
  const from = builtFolder(shop);
  const to = join(emptyFolder(), 'handbook');
  const other = spawn(process.execPath, ['-e', 'setInterval(() => {}, 1000)']);
  await once(other, 'spawn');
  const next = join(dirname(from), '.dist-next');
  mkdirSync(next);
  for (const folder of [from, to]) {
    const path = lockFileOf(folder);
    writeFileSync(path, `${other.pid} ${hostname()}\n`);
    expect(publishEdition({ from, to, data: shop.folders.data, drafts: false })).toMatchObject({
      ok: false,
      problems: [{ rule: 'edition/in-use', file: folder }],
    });
    // the pages that the other is writing are left alone
    expect(existsSync(next)).toBe(folder === from);
    if (folder === from) writeFileSync(path, '');
  }
  other.kill();
  await once(other, 'exit');
  expect(publishEdition({ from, to, data: shop.folders.data, drafts: false }).ok).toBe(true);
  expect(readdirSync(dirname(to))).toEqual(['handbook']);
  expect(readFileSync(join(to, 'index.html'), 'utf8')).toBe('x');
});
