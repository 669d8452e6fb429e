import type { DataRule } from '../words/en/problems-data.ts';
import type { Problem } from '../words/problem.ts';
import type { Place, ReadYaml, YamlPath } from './yaml.ts';

/** `found` and `expected` are noun phrases; `advice` says what to do, without a full stop. */
export interface ProblemParts {
  readonly found: string;
  readonly expected: string;
  readonly advice: string;
  readonly severity?: 'error' | 'warning';
}

/** Something wrong at a path of one file. */
export interface Finding extends ProblemParts {
  readonly path: YamlPath;
  readonly rule: DataRule;
}

/** Collects the problems of one file, so that nobody has to mend one to see the next. */
export interface DataReport {
  readonly file: string;
  /** At a value; where it is absent, at the nearest that holds it. */
  in(path: YamlPath, rule: DataRule, parts: ProblemParts): void;
  /** At the key at the end of a path. */
  inKey(path: YamlPath, rule: DataRule, parts: ProblemParts): void;
  /** Where the value of a path stands, for a problem that is found later. */
  placeOf(path: YamlPath): Place;
}

export function reportOn(
  file: string,
  yaml: Pick<ReadYaml, 'placeOf' | 'placeOfKey'>,
  problems: Problem[],
): DataReport {
  const add = (place: Place, rule: DataRule, parts: ProblemParts) => {
    problems.push(dataProblem(file, place, rule, parts));
  };
  return {
    file,
    placeOf: yaml.placeOf,
    in: (path, rule, parts) => add(yaml.placeOf(path), rule, parts),
    inKey: (path, rule, parts) => add(yaml.placeOfKey(path), rule, parts),
  };
}

/** One problem by itself. The type of `rule` keeps every id in the catalogue. */
export function dataProblem(
  file: string,
  { line, column }: Place,
  rule: DataRule,
  { found, expected, advice, severity = 'error' }: ProblemParts,
): Problem {
  return { rule, severity, file, line, column, found, expected, advice };
}
