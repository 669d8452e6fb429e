import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join, relative } from 'node:path';
import type { Problem } from '../words/problem.ts';
import { editionProblem } from './edition-problem.ts';

/** The list of checksums in a published folder, in the form that `sha256sum -c` reads. */
export const CHECKSUMS = 'sha256sums.txt';

/** Writes the list for every other file of a folder. The last thing that a build writes. */
export function writeChecksums(folder: string): void {
  writeFileSync(join(folder, CHECKSUMS), checksumList(folder));
}

/**
 * The list for every file of a folder but the list's own.
 *
 * @throws RangeError for a name with a line end or a backslash, which the list could not hold.
 */
export function checksumList(folder: string): string {
  const odd = filesOf(folder).find((name) => /[\r\n\\]/.test(name));
  if (odd !== undefined) throw new RangeError(`no checksum list can hold ${JSON.stringify(odd)}`);
  return filesOf(folder)
    .map((name) => `${hashOf(join(folder, name))}  ${name}\n`)
    .join('');
}

/** How a folder differs from its list; three empty lists where it is whole. */
export interface Verified {
  readonly missing: readonly string[];
  readonly changed: readonly string[];
  readonly extra: readonly string[];
  /** How many files the list names. */
  readonly listed: number;
}

export type Verification =
  | { readonly ok: true; readonly verified: Verified }
  | { readonly ok: false; readonly problems: readonly Problem[] };

/** Holds a folder against the list in it. Never throws for what it finds. */
export function verifyFolder(folder: string): Verification {
  const file = join(folder, CHECKSUMS);
  if (!existsSync(file)) {
    return refused(file, 1, 'no list of checksums', 'publish the folder again');
  }
  const sums = new Map<string, string>();
  for (const [index, line] of readFileSync(file, 'utf8').split(/\r?\n/).entries()) {
    if (line === '') continue;
    const [, hash, name] = /^([0-9a-f]{64}) [ *](.+)$/.exec(line) ?? [];
    if (hash === undefined || name === undefined || !isInside(name)) {
      return refused(file, index + 1, `"${line.slice(0, 90)}"`, 'publish the folder again');
    }
    sums.set(name, hash);
  }
  const there = new Set(filesOf(folder));
  const names = [...sums.keys()];
  return {
    ok: true,
    verified: {
      listed: sums.size,
      missing: names.filter((name) => !there.has(name)),
      changed: names.filter(
        (name) => there.has(name) && hashOf(join(folder, name)) !== sums.get(name),
      ),
      extra: [...there].filter((name) => !sums.has(name)),
    },
  };
}

/** Whether nothing is missing, changed or extra. */
export const isWhole = ({ missing, changed, extra }: Verified): boolean =>
  missing.length + changed.length + extra.length === 0;

function refused(file: string, line: number, found: string, advice: string): Verification {
  const problem = editionProblem({ file, line }, 'edition/checksums', {
    found,
    expected: 'lines of a SHA-256, two spaces and the name of a file in the folder',
    advice,
  });
  return { ok: false, problems: [problem] };
}

/** A list from elsewhere must not lead out of the folder. */
const isInside = (name: string) =>
  !name.includes('\\') && !name.startsWith('/') && !name.split('/').includes('..');

/**
 * All names below a folder but the list's own, with forward slashes, sorted by code point. A link counts as
 * a file, because nobody publishes one.
 */
export function filesOf(folder: string): readonly string[] {
  return readdirSync(folder, { recursive: true, withFileTypes: true })
    .filter((entry) => !entry.isDirectory())
    .map((entry) => relative(folder, join(entry.parentPath, entry.name)))
    .map((name) => (process.platform === 'win32' ? name.replaceAll('\\', '/') : name))
    .filter((name) => name !== CHECKSUMS)
    .sort((a, b) => (a < b ? -1 : 1));
}

/** `null` for what cannot be read as a file: it is not what was listed. */
function hashOf(path: string): string | null {
  try {
    return createHash('sha256').update(readFileSync(path)).digest('hex');
  } catch {
    return null;
  }
}
