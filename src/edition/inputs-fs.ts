import { createHash } from 'node:crypto';
import { readdirSync, readFileSync } from 'node:fs';
import { join, relative } from 'node:path';

/** One file that an edition is made from. */
export interface InputFile {
  /** Under a name that is the same on every machine: `formulas/x.md`, `data/shop.yaml`. */
  readonly path: string;
  /** SHA-256 in hexadecimal, with line ends of text files as `\n`. */
  readonly hash: string;
}

/**
 * Every file below some folders with its hash, sorted by path. `named` gives each folder the name it has in
 * the result. Hidden files do not count, nor does the ledger: of it only what a page shows is an input.
 */
export function readInputs(
  named: readonly (readonly [name: string, folder: string])[],
): readonly InputFile[] {
  return named
    .flatMap(([name, folder]) =>
      filesBelow(folder).map((file) => ({
        path: `${name}/${file}`,
        hash: hashOf(readFileSync(join(folder, file)), file),
      })),
    )
    .sort((a, b) => (a.path < b.path ? -1 : 1));
}

function filesBelow(folder: string): readonly string[] {
  return readdirSync(folder, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => relative(folder, join(entry.parentPath, entry.name)).replaceAll('\\', '/'))
    .filter((name) => !/(^|\/)\./.test(name) && name !== 'ledger.jsonl');
}

function hashOf(bytes: Buffer, name: string): string {
  const isText = /\.(md|yaml|yml|csv|json|txt)$/i.test(name);
  const content = isText ? bytes.toString('utf8').replaceAll('\r\n', '\n') : bytes;
  return createHash('sha256').update(content).digest('hex');
}
