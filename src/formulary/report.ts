import type { Place, ReadYaml } from '../reference/yaml.ts';
import type { FormulaRule } from '../words/en/problems-formula.ts';
import type { Problem } from '../words/problem.ts';

/** Where a value stands in the frontmatter: `['fats', 0, 'share']`. */
export type Path = readonly (string | number)[];

/** `found` and `expected` are noun phrases; `advice` says what to do, without a full stop. */
export interface ProblemParts {
  readonly found: string;
  readonly expected: string;
  readonly advice?: string;
}

/** Collects the problems of one file, so that nobody has to mend one to see the next. */
export interface Report {
  readonly problems: Problem[];
  /** At a place in the text. */
  at(place: Place, rule: FormulaRule, parts: ProblemParts): void;
  /** At a value of the frontmatter; where it is absent, at the nearest that holds it. */
  in(path: Path, rule: FormulaRule, parts: ProblemParts): void;
  /** At a key of the frontmatter. */
  inKey(path: Path, rule: FormulaRule, parts: ProblemParts): void;
}

/** A report for `file`, whose frontmatter knows its places. */
export function reportOn(
  file: string,
  { placeOf, placeOfKey }: Pick<ReadYaml, 'placeOf' | 'placeOfKey'>,
): Report {
  const problems: Problem[] = [];
  const at: Report['at'] = (place, rule, parts) => {
    problems.push(formulaProblem(file, place, rule, parts));
  };
  return {
    problems,
    at,
    in: (path, rule, parts) => at(placeOf(path), rule, parts),
    inKey: (path, rule, parts) => at(placeOfKey(path), rule, parts),
  };
}

/** One problem by itself. The type of `rule` is what keeps every id in the catalogue. */
export function formulaProblem(
  file: string,
  { line, column }: Place,
  rule: FormulaRule,
  { found, expected, advice = '' }: ProblemParts,
): Problem {
  return { rule, severity: 'error', file, line, column, found, expected, advice };
}
