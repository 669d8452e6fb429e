import {
  closeSync,
  existsSync,
  fsyncSync,
  openSync,
  readFileSync,
  realpathSync,
  renameSync,
  rmSync,
  statSync,
  writeFileSync,
} from 'node:fs';
import { basename, dirname, join } from 'node:path';

/** Whether the file was replaced; `changed` where it no longer held what the caller had read. */
export type Replaced = 'replaced' | 'changed';

/**
 * Puts `next` in the place of a file as one step: written beside it, flushed, renamed. `read` is what the
 * caller saw in it, `null` where there was no file. Links are followed; the file's mode is kept.
 *
 * @throws what the file system says; the old file then stands as it was.
 */
export function replaceFile(
  path: string,
  next: string | Uint8Array,
  read: Buffer | null,
): Replaced {
  const target = existsSync(path) ? realpathSync(path) : path;
  const beside = join(dirname(target), `.${basename(target)}.${process.pid}.next`);
  const mode = existsSync(target) ? statSync(target).mode : 0o644;
  try {
    const file = openSync(beside, 'wx', mode);
    try {
      writeFileSync(file, next);
      fsyncSync(file);
    } finally {
      closeSync(file);
    }
    const now = existsSync(target) ? readFileSync(target) : null;
    if (now === null ? read !== null : read === null || !now.equals(read)) return 'changed';
    renameSync(beside, target);
    return 'replaced';
  } finally {
    rmSync(beside, { force: true });
  }
}
