import { completeApproval, prepareApproval } from '../edition/approve-fs.ts';
import { words } from '../words/catalogue.ts';
import { problemText } from '../words/problem-text.ts';
import { FOLDERS, readArguments } from './arguments.ts';
import { asOfFor } from './as-of.ts';
import { speakFor } from './speak-for.ts';

/**
 * Shows what changed in a formula since it was last approved, then writes the approval into its file and
 * into the ledger. Status 1 where anything stands against it; the file is then as it was.
 */
export function main(args: readonly string[]): number {
  const read = readArguments(args, {
    command: 'approve',
    about: 'Approves one formula as it stands, until a day of review.',
    options: {
      by: { value: 'NAME', about: 'who approves' },
      until: { value: 'DATE', about: 'last day on which the approval counts' },
      on: { value: 'DATE', about: 'day of the approval (today)' },
      'show-only': { value: null, about: 'show what changed and write nothing' },
      ...FOLDERS,
    },
    files: { name: 'CODE', least: 1, most: 1 },
  });
  if (!read.ok) {
    console.error(read.text);
    return read.status;
  }
  const { formulas = 'formulas', data = 'data', by = '', until = '' } = read.given;
  speakFor(data);
  const on = asOfFor(read.given.on, data);
  const prepared = prepareApproval(
    { formulas, data },
    { code: read.files[0] ?? '', by, until, on },
  );
  if (!prepared.ok) {
    for (const problem of prepared.problems) console.error(problemText(problem));
    return 1;
  }
  const { pending } = prepared;
  for (const line of words.approvalLines(pending)) console.log(line);
  if (read.given['show-only'] !== undefined) return 0;
  const problems = completeApproval(pending);
  for (const problem of problems) console.error(problemText(problem));
  if (problems.length > 0) return 1;
  console.log(
    `Approved by ${pending.approval.by} on ${on}, to be reviewed by ${until}: ${pending.formula.file}`,
  );
  return 0;
}
