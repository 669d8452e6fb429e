import {
  existsSync,
  mkdirSync,
  readdirSync,
  renameSync,
  rmSync,
  statSync,
  utimesSync,
  writeFileSync,
} from 'node:fs';
import { dirname, join } from 'node:path';

/** [ms] */
const DAY = 24 * 60 * 60 * 1000;

/** Keeps a file for later builds. Under another name first, so that a broken write is never taken for it. */
export function keepFile(path: string, bytes: string | Uint8Array): void {
  const beside = `${path}.${process.pid}`;
  mkdirSync(dirname(path), { recursive: true });
  writeFileSync(beside, bytes);
  renameSync(beside, path);
}

/** The time of a kept file is when it was last used, to the day: most builds then leave it alone. */
export function markUsed(path: string): void {
  const now = new Date();
  if (now.getTime() - statSync(path).mtimeMs > DAY) utimesSync(path, now, now);
}

/**
 * Deletes the kept files that no build has asked for in `days` before `now`, and what broken writes have left. What is
 * published never depends on it: what is missed is made again, the same to the byte.
 */
export function pruneKept(folder: string, days: number, now: number): void {
  for (const name of existsSync(folder) ? readdirSync(folder) : []) {
    const path = join(folder, name);
    const used = statSync(path, { throwIfNoEntry: false })?.mtimeMs;
    if (used !== undefined && now - used > days * DAY) rmSync(path, { force: true });
  }
}
