import { relative } from 'node:path';
import { publishEdition } from '../edition/publish-fs.ts';
import { counted, problemText } from '../words/problem-text.ts';
import { FOLDERS, readArguments } from './arguments.ts';

/**
 * Copies the built edition to the folder where it is read and records it in the ledger. Status 1 where
 * anything stands against it; the folder is then as it was.
 */
export function main(args: readonly string[]): number {
  const read = readArguments(args, {
    command: 'publish',
    about: 'Copies the built edition to a folder or a mounted stick, and keeps the one before.',
    options: {
      from: { value: 'DIR', about: 'folder of the edition (dist)' },
      data: FOLDERS.data,
      drafts: { value: null, about: 'publish a proof edition too; it is not recorded' },
    },
    files: { name: 'DIR', least: 1, most: 1 },
  });
  if (!read.ok) {
    console.error(read.text);
    return read.status;
  }
  const { from = 'dist', data = 'data', drafts } = read.given;
  const to = read.files[0] ?? '';
  const result = publishEdition({ from, to, data, drafts: drafts !== undefined });
  if (!result.ok) {
    for (const problem of result.problems) console.error(problemText(problem));
    console.error('Nothing was published.');
    return 1;
  }
  const { edition, files, previous } = result;
  console.log(
    `${to}: ${edition.proof ? 'proof edition' : 'edition'} of ${edition.asOf}, ${edition.id}: ${counted(files, 'file')}, verified`,
  );
  if (previous !== null) console.log(`The edition before is kept in ${relative('.', previous)}`);
  return 0;
}
