import { mkdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { sealEdition } from '../../src/edition/seal-fs.ts';
import { dropPrevious, healSwap, swap, swapFolders } from '../../src/edition/swap-fs.ts';

/**
 * Replaces a folder by a new one over and over, as builds would, until it is killed from outside:
 * `node swap-until-killed.ts FOLDER FIRST KEEP`. Every edition has the same number in each of its files.
 */
const [out = '', first = '0', keep = ''] = process.argv.slice(2);
const keepPrevious = keep === 'keep';
const folders = swapFolders(out, { keepPrevious });
process.stdout.write('ready\n');
for (let number = Number(first); ; number++) {
  healSwap(folders);
  mkdirSync(join(folders.next, 'formulas'), { recursive: true });
  for (let page = 0; page < 40; page++) {
    writeFileSync(join(folders.next, `formulas/${page}.html`), `edition ${number} `.repeat(200));
  }
  sealEdition(folders.next, {
    schema: 1,
    shop: 'Workshop of a test',
    id: String(number),
    asOf: '2026-12-01',
    proof: false,
    models: 1,
    formulas: [],
  });
  swap(folders);
  if (!keepPrevious) dropPrevious(folders);
}
