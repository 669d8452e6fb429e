import { spawn } from 'node:child_process';
import { once } from 'node:events';
import {
  existsSync,
  mkdirSync,
  readdirSync,
  readFileSync,
  renameSync,
  writeFileSync,
} from 'node:fs';
import { dirname, join } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { expect, test } from 'vitest';
import { isWhole, verifyFolder } from '../../src/edition/checksums-fs.ts';
import { healSwap, mayBeReplaced, swap, swapFolders } from '../../src/edition/swap-fs.ts';
import { emptyFolder } from './shop.ts';

const POINTS = 24;

/** Killed within this time of the first swap; one swap takes a few milliseconds. [ms] */
const LONGEST = 120;

function whole(folder: string): boolean {
  const checked = verifyFolder(folder);
  return checked.ok && isWhole(checked.verified);
}

/** The number that an edition has in every page. */
function numberIn(folder: string): number {
  const { id } = JSON.parse(readFileSync(join(folder, 'edition.json'), 'utf8')) as { id: string };
  expect(readFileSync(join(folder, 'formulas/39.html'), 'utf8')).toContain(`edition ${id} `);
  return Number(id);
}

test.each(['drop', 'keep'])(
  'killed at any moment, a whole edition stands (%s the one before)',
  async (keep) => {
    const out = join(emptyFolder(), 'dist');
    const folders = swapFolders(out, { keepPrevious: keep === 'keep' });
    let last = -1;
    for (let point = 0; point < POINTS / 2; point++) {
      const script = new URL('swap-until-killed.ts', import.meta.url).pathname;
      const child = spawn(process.execPath, [script, out, String(last + 1), keep]);
      await once(child.stdout, 'data');
      await pause(Math.random() * LONGEST);
      child.kill('SIGKILL');
      await once(child, 'exit');

      // the promise: the folder itself, or its whole predecessor beside it
      const standing = existsSync(out) ? out : folders.previous;
      if (existsSync(standing)) {
        expect(whole(standing)).toBe(true);
        expect(numberIn(standing)).toBeGreaterThanOrEqual(last);
        last = numberIn(standing);
      } else expect(last).toBe(-1);
      // a reader's folder comes back with the next command, and only what is kept stays beside it
      healSwap(folders);
      if (last >= 0) expect(numberIn(out)).toBe(last);
      const kept = keep === 'keep' ? ['dist', 'dist-previous'] : ['dist', '.dist-previous'];
      expect(readdirSync(dirname(out)).filter((name) => !kept.includes(name))).toEqual([]);
      if (existsSync(folders.previous)) expect(whole(folders.previous)).toBe(true);
    }
    expect(last).toBeGreaterThan(0);
  },
);

test('a kill between the two renames is healed', () => {
  const folders = swapFolders(join(emptyFolder(), 'dist'));
  mkdirSync(folders.previous);
  writeFileSync(join(folders.previous, 'index.html'), 'old');
  mkdirSync(folders.next);
  healSwap(folders);
  expect(readFileSync(join(folders.current, 'index.html'), 'utf8')).toBe('old');
  expect(existsSync(folders.next)).toBe(false);
});

test('a swap keeps the one before, and only that', () => {
  const folders = swapFolders(join(emptyFolder(), 'dist'), { keepPrevious: true });
  for (const text of ['1', '2', '3']) {
    mkdirSync(folders.next);
    writeFileSync(join(folders.next, 'index.html'), text);
    swap(folders);
  }
  expect(readFileSync(join(folders.current, 'index.html'), 'utf8')).toBe('3');
  expect(readFileSync(join(folders.previous, 'index.html'), 'utf8')).toBe('2');
  expect(readdirSync(dirname(folders.current)).sort()).toEqual(['dist', 'dist-previous']);
});

test("a folder of somebody's own is not replaced", () => {
  const { current } = swapFolders(join(emptyFolder(), 'dist'));
  expect(mayBeReplaced({ current })).toBe(true);
  mkdirSync(current);
  expect(mayBeReplaced({ current })).toBe(true);
  writeFileSync(join(current, 'letters.txt'), '');
  expect(mayBeReplaced({ current })).toBe(false);
  renameSync(join(current, 'letters.txt'), join(current, 'edition.json'));
  expect(mayBeReplaced({ current })).toBe(true);
});
