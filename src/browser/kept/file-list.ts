import { LIST_FILE } from './copy.ts';

/** Hashes of the files of an edition by their path, from its list of checksums. */
export function readFileList(text: string): ReadonlyMap<string, string> {
  const files = new Map<string, string>();
  for (const line of text.split('\n')) {
    const [, hash, path] = /^([0-9a-f]{64}) [ *](.+)$/.exec(line) ?? [];
    if (hash && path) files.set(path, hash);
  }
  return files;
}

/** Large, or not needed at the bench: kept when they are first read. */
const LATER = /^(cards|data|working)\/|^(print\.html|print-heads\.css|404\.html|edition\.json)$/;

/** Whether a file belongs to a copy from the first moment. */
export const isKeptAtOnce = (path: string): boolean => !LATER.test(path);

/**
 * Path of an address below the scope as files are named, `index.html` for the scope itself; `null` outside. What
 * stands behind `?` or `#` names no other file.
 */
export function pathBelow(scope: string, address: string): string | null {
  const { origin, pathname } = new URL(address);
  const full = origin + pathname;
  if (!full.startsWith(scope)) return null;
  const path = decoded(full.slice(scope.length));
  return path === '' ? 'index.html' : path;
}

/** The list itself is no line of the list. */
export const isOfEdition = (path: string, files: ReadonlyMap<string, string>): boolean =>
  files.has(path) || path === LIST_FILE;

function decoded(path: string): string {
  try {
    return decodeURIComponent(path);
  } catch {
    return path;
  }
}
