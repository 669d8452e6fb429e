import {
  closeSync,
  cpSync,
  existsSync,
  fsyncSync,
  mkdirSync,
  openSync,
  readdirSync,
  renameSync,
  rmSync,
} from 'node:fs';
import { basename, dirname, join, resolve } from 'node:path';

/**
 * A folder that is published and its siblings while it is being replaced. At every moment `current` is
 * whole, or its whole predecessor stands beside it as `previous`; `healSwap` then puts it back.
 */
export interface SwapFolders {
  readonly current: string;
  /** Written by a build or a copy; becomes `current` when it is whole. */
  readonly next: string;
  /** What `current` was. */
  readonly previous: string;
  /** What is about to be deleted: never looked at again, so it may be half gone. */
  readonly discarded: string;
}

/** The siblings of a folder. A predecessor that is kept is plain to see, one that is not is hidden. */
export function swapFolders(
  out: string,
  { keepPrevious = false }: { readonly keepPrevious?: boolean } = {},
): SwapFolders {
  const current = resolve(out);
  const name = basename(current);
  const sibling = (file: string) => join(dirname(current), file);
  return {
    current,
    next: sibling(`.${name}-next`),
    previous: sibling(keepPrevious ? `${name}-previous` : `.${name}-previous`),
    discarded: sibling(`.${name}-discarded`),
  };
}

/** Files that tell a handbook from somebody's other folder. */
const SIGNS = ['edition.json', join('data', 'formulas.csv')];

/** Whether `current` may be replaced: it is not there, is empty, or is a handbook. */
export function mayBeReplaced({ current }: Pick<SwapFolders, 'current'>): boolean {
  return (
    !existsSync(current) ||
    readdirSync(current).length === 0 ||
    SIGNS.some((sign) => existsSync(join(current, sign)))
  );
}

/**
 * Mends what an interrupted swap has left: the predecessor goes back where there is no current folder, and
 * half-written or half-deleted leftovers are removed. Every command that writes or reads `current` does it first.
 */
export function healSwap({ current, next, previous, discarded }: SwapFolders): void {
  if (!existsSync(current) && existsSync(previous)) renameSync(previous, current);
  rmSync(discarded, { recursive: true, force: true });
  rmSync(next, { recursive: true, force: true });
}

/** Puts `next` in the place of `current` by renames and leaves the old one as `previous`. */
export function swap({ current, next, previous, discarded }: SwapFolders): void {
  // an older predecessor goes out of the way whole, so that what is called previous is never half deleted
  if (existsSync(previous)) renameSync(previous, discarded);
  if (existsSync(current)) renameSync(current, previous);
  renameSync(next, current);
  flushFolder(dirname(current));
  rmSync(discarded, { recursive: true, force: true });
}

/** Removes the predecessor that a swap left; harmless to interrupt. */
export function dropPrevious({ previous, discarded }: SwapFolders): void {
  rmSync(discarded, { recursive: true, force: true });
  if (existsSync(previous)) renameSync(previous, discarded);
  rmSync(discarded, { recursive: true, force: true });
}

/** Moves a folder, also to another disk, where a rename cannot go. */
export function moveFolder(from: string, to: string): void {
  mkdirSync(dirname(to), { recursive: true });
  try {
    renameSync(from, to);
  } catch {
    cpSync(from, to, { recursive: true });
    rmSync(from, { recursive: true, force: true });
  }
}

/** Makes the disk write a folder's names down, on systems that let a folder be flushed. */
export function flushFolder(folder: string): void {
  if (process.platform === 'win32') return;
  const handle = openSync(folder, 'r');
  try {
    fsyncSync(handle);
  } finally {
    closeSync(handle);
  }
}
