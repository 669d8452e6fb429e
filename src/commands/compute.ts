import { withCautions } from '../cautions/with-cautions.ts';
import { withDigests } from '../edition/with-digests.ts';
import { loadFiles } from '../formulary/load-files.ts';
import { problemText } from '../words/problem-text.ts';
import { FOLDERS, readArguments } from './arguments.ts';
import { speakFor } from './speak-for.ts';

/**
 * Prints the computed document of each file as JSON on standard output: one object for one file, an array for
 * several. Problems go to standard error. Status 1 where there is any error.
 */
export function main(args: readonly string[]): number {
  const read = readArguments(args, {
    command: 'compute',
    about: 'Prints formulas with all that is computed from them, as JSON.',
    options: { data: FOLDERS.data },
    files: { name: 'FILE...', least: 1, most: Number.POSITIVE_INFINITY },
  });
  if (!read.ok) {
    console.error(read.text);
    return read.status;
  }
  const { data = 'data' } = read.given;
  speakFor(data);
  const { reference, formulas, problems } = loadFiles(read.files, data);
  for (const problem of problems) console.error(problemText(problem));
  if (reference) {
    const finished = withDigests(withCautions({ reference, formulas })).formulas;
    const documents = finished.map(({ document }) => document);
    const printed = read.files.length === 1 ? documents[0] : documents;
    if (printed) console.log(JSON.stringify(printed, null, 2));
  }
  return problems.some(({ severity }) => severity === 'error') ? 1 : 0;
}
