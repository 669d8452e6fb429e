import { existsSync, mkdirSync, readdirSync, renameSync, rmSync } from 'node:fs';
import { basename, dirname, join, resolve } from 'node:path';

/** The folder that is published, and its two siblings while it is being replaced. */
export interface SwapFolders {
  readonly current: string;
  /** Written by a build; becomes `current` when it is whole. */
  readonly next: string;
  /** What `current` was, between the two renames. */
  readonly previous: string;
}

/** A file that every handbook has: what tells a handbook from somebody's other folder. */
const SIGN = join('data', 'formulas.csv');

export function swapFolders(out: string): SwapFolders {
  const current = resolve(out);
  const sibling = (name: string) => join(dirname(current), `.${basename(current)}-${name}`);
  return { current, next: sibling('next'), previous: sibling('previous') };
}

/** Whether `current` may be replaced: it is not there, is empty, or is a handbook. */
export function mayBeReplaced({ current }: SwapFolders): boolean {
  return (
    !existsSync(current) || readdirSync(current).length === 0 || existsSync(join(current, SIGN))
  );
}

/**
 * Mends what an interrupted swap has left: the predecessor goes back where there is no current folder, and
 * leftovers are removed. Afterwards `current` is whole or has never been.
 */
export function healSwap({ current, next, previous }: SwapFolders): void {
  if (!existsSync(current) && existsSync(previous)) renameSync(previous, current);
  rmSync(previous, { recursive: true, force: true });
  rmSync(next, { recursive: true, force: true });
}

/** Puts `next` in the place of `current` by two renames. At every moment one whole folder is there. */
export function swap({ current, next, previous }: SwapFolders): void {
  mkdirSync(dirname(current), { recursive: true });
  if (existsSync(current)) renameSync(current, previous);
  renameSync(next, current);
  rmSync(previous, { recursive: true, force: true });
}
