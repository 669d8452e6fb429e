import { readFileSync, statSync } from 'node:fs';

/** Larger files are not read at all. [bytes] */
export const LARGEST_FILE = 1_000_000;

/** The text of a file, or why it cannot be had. */
export type ReadText =
  | { readonly ok: true; readonly text: string }
  | { readonly ok: false; readonly why: 'missing' | 'unreadable' }
  | { readonly ok: false; readonly why: 'too-large'; readonly bytes: number }
  | { readonly ok: false; readonly why: 'not-utf8'; readonly line: number };

/** Reads a UTF-8 file of at most `LARGEST_FILE` bytes. A byte order mark is dropped. Never throws. */
export function readText(path: string): ReadText {
  let bytes: Buffer;
  try {
    const { size } = statSync(path);
    if (size > LARGEST_FILE) return { ok: false, why: 'too-large', bytes: size };
    bytes = readFileSync(path);
  } catch (error) {
    const code = error instanceof Error && 'code' in error ? error.code : '';
    return { ok: false, why: code === 'ENOENT' ? 'missing' : 'unreadable' };
  }
  try {
    return { ok: true, text: new TextDecoder('utf-8', { fatal: true }).decode(bytes) };
  } catch {
    return { ok: false, why: 'not-utf8', line: lineOfFirstBadByte(bytes) };
  }
}

function lineOfFirstBadByte(bytes: Buffer): number {
  const lossy = bytes.toString('utf8');
  return lossy.slice(0, lossy.indexOf('\uFFFD')).split('\n').length;
}
