import { closeSync, copyFileSync, fsyncSync, mkdirSync, openSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { CHECKSUMS, filesOf } from './checksums-fs.ts';
import { flushFolder } from './swap-fs.ts';

/** Copies every file of a published folder, flushed, so that a stick may be pulled out when it is done. */
export function copyWhole(from: string, to: string): void {
  for (const name of [...filesOf(from), CHECKSUMS]) {
    const target = join(to, name);
    mkdirSync(dirname(target), { recursive: true });
    copyFileSync(join(from, name), target);
    const file = openSync(target, 'r+');
    try {
      fsyncSync(file);
    } finally {
      closeSync(file);
    }
  }
  flushFolder(to);
}
