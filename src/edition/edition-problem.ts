import type { ProblemParts } from '../formulary/report.ts';
import type { EditionRule } from '../words/en/problems-edition.ts';
import type { Problem } from '../words/problem.ts';

/** Where a problem stands. Without a place the whole file or folder is meant. */
export interface ProblemPlace {
  readonly file: string;
  readonly line?: number;
  readonly column?: number;
}

/** One problem of this part. The type of `rule` is what keeps every id in the catalogue. */
export function editionProblem(
  { file, line = 1, column = 1 }: ProblemPlace,
  rule: EditionRule,
  { found, expected, advice = '' }: ProblemParts,
  severity: Problem['severity'] = 'error',
): Problem {
  return { rule, severity, file, line, column, found, expected, advice };
}
