import { mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { hostname } from 'node:os';
import { basename, dirname, join, resolve } from 'node:path';
import type { Problem } from '../words/problem.ts';
import { editionProblem } from './edition-problem.ts';
import { writeProblem } from './write-problem.ts';

/** One command's hold on a published folder, from before it heals the folder until after it has swapped it. */
export interface FolderLock {
  /** Whether no other command has taken the hold over. Ask right before the swap. */
  isHeld(): boolean;
  release(): void;
}

export type LockTaken =
  | { readonly ok: true; readonly lock: FolderLock }
  | { readonly ok: false; readonly problems: readonly Problem[] };

/** The rule of a folder that somebody else is writing. */
export const IN_USE = 'edition/in-use';

/** What this process holds: in a container a new process may have the number of the one that was killed. */
const held = new Set<string>();

/** The file beside a folder that says which process writes it. */
export const lockFileOf = (folder: string): string => {
  const path = resolve(folder);
  return join(dirname(path), `.${basename(path)}-lock`);
};

/**
 * Takes hold of a published folder, so that two commands never write it at once: they would delete each other's
 * half-written pages. What a killed command has left is taken over where its process can be seen to be gone.
 */
export function lockFolder(
  folder: string,
  { makeParent = false }: { readonly makeParent?: boolean } = {},
): LockTaken {
  const path = lockFileOf(folder);
  const own = `${process.pid} ${hostname()}\n`;
  const holder = textOf(path);
  if (holder !== null && (holder === own ? held.has(path) : isAtWork(holder)))
    return inUse(folder, path, holder);
  try {
    if (holder !== null) rmSync(path, { force: true });
    if (makeParent) mkdirSync(dirname(path), { recursive: true });
    // fails where another has made the file in the meantime
    writeFileSync(path, own, { flag: 'wx' });
    held.add(path);
  } catch (error) {
    const other = textOf(path);
    return other === null
      ? { ok: false, problems: [writeProblem(folder, error)] }
      : inUse(folder, path, other);
  }
  const isHeld = () => textOf(path) === own;
  const release = () => {
    if (isHeld()) rmSync(path, { force: true });
    held.delete(path);
  };
  return { ok: true, lock: { isHeld, release } };
}

/** The problem of a folder whose hold was lost: two commands have taken a dead one's over at the same moment. */
export const lostHold = (folder: string): Problem =>
  editionProblem({ file: folder }, IN_USE, {
    found: 'a folder that another command has begun to write',
    expected: 'one command at a time for one folder',
    advice: 'wait until it has ended, then run this one again',
  });

function inUse(folder: string, path: string, holder: string): LockTaken {
  const [pid = '', host = ''] = holder.trim().split(' ');
  const problem = editionProblem({ file: folder }, IN_USE, {
    found: `a folder that process ${pid} on ${host} is writing`,
    expected: 'one command at a time for one folder',
    advice: `wait until it has ended; if nothing runs there any more, delete ${basename(path)} beside the folder`,
  });
  return { ok: false, problems: [problem] };
}

/** Whether the process may still be there. Of another machine nobody here can tell. */
function isAtWork(holder: string): boolean {
  const [pid, host] = holder.trim().split(' ');
  if (!pid || !host || !/^[1-9][0-9]*$/.test(pid)) return false;
  if (host !== hostname()) return true;
  try {
    process.kill(Number(pid), 0);
    return true;
  } catch (error) {
    // a process that is there and belongs to somebody else may not be asked
    return error instanceof Error && 'code' in error && error.code === 'EPERM';
  }
}

function textOf(path: string): string | null {
  try {
    return readFileSync(path, 'utf8');
  } catch {
    return null;
  }
}
