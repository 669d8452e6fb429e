import { isWhole, verifyFolder } from '../edition/checksums-fs.ts';
import { readEdition } from '../edition/read-edition-fs.ts';
import { counted, problemText } from '../words/problem-text.ts';
import { readArguments } from './arguments.ts';

/** Says of a published folder what is missing, changed or extra. Status 1 where anything is. */
export function main(args: readonly string[]): number {
  const read = readArguments(args, {
    command: 'verify',
    about: 'Holds a published folder against the checksums in it.',
    options: {},
    files: { name: 'DIR', least: 0, most: 1 },
  });
  if (!read.ok) {
    console.error(read.text);
    return read.status;
  }
  const folder = read.files[0] ?? 'dist';
  const edition = readEdition(folder);
  const checked = verifyFolder(folder);
  const problems = [
    ...(edition.ok ? [] : edition.problems),
    ...(checked.ok ? [] : checked.problems),
  ];
  for (const problem of problems) console.error(problemText(problem));
  if (checked.ok) {
    const { missing, changed, extra } = checked.verified;
    for (const name of missing) console.error(`missing  ${name}`);
    for (const name of changed) console.error(`changed  ${name}`);
    for (const name of extra) console.error(`extra    ${name}`);
  }
  if (!edition.ok || !checked.ok || !isWhole(checked.verified)) return 1;
  const { shop, asOf, id, proof } = edition.edition;
  console.log(
    `${folder}: ${shop}, ${proof ? 'proof edition' : 'edition'} of ${asOf}, ${id}: ${counted(checked.verified.listed, 'file')}, all as listed`,
  );
  return 0;
}
