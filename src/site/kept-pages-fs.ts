import { createHash } from 'node:crypto';
import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { keepFile, markUsed } from '../handbook/kept-files-fs.ts';

/** Length of a SHA-256 in hexadecimal, and of the line end after it. */
const HEAD = 65;

/** The pages that are kept in a folder, for one state of the program. */
export interface KeptPages {
  /** The page that was kept under a name; `null` where none is or the file is damaged. */
  readonly find: (name: string) => Buffer | null;
  readonly keep: (name: string, page: Buffer) => void;
}

/**
 * Keeps pages in `folder`, each in a file that is named by the hash of the program and of the page's own name, so that
 * nothing is ever kept under the name of something else: a broken build, two builds at once and a change that is taken
 * back leave only pages that are right. The file begins with the hash of the page.
 *
 * @param program Hash of all that makes pages besides what they are made from.
 */
export function keptPages(folder: string, program: string): KeptPages {
  const fileOf = (name: string) =>
    join(folder, createHash('sha256').update(`${program}\n${name}`).digest('hex'));
  return {
    find: (name) => {
      const file = fileOf(name);
      if (!existsSync(file)) return null;
      const bytes = readFileSync(file);
      const page = bytes.subarray(HEAD);
      if (bytes.subarray(0, HEAD).toString('latin1') !== headOf(page)) return null;
      markUsed(file);
      return page;
    },
    keep: (name, page) => keepFile(fileOf(name), Buffer.concat([Buffer.from(headOf(page)), page])),
  };
}

const headOf = (page: Buffer) => `${createHash('sha256').update(page).digest('hex')}\n`;
