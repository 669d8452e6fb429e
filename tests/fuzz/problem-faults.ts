import { DATA_PROBLEMS } from '../../src/words/en/problems-data.ts';
import { FORMULA_PROBLEMS } from '../../src/words/en/problems-formula.ts';
import type { Problem } from '../../src/words/problem.ts';
import { problemText } from '../../src/words/problem-text.ts';

const RULES: ReadonlySet<string> = new Set([
  ...Object.keys(DATA_PROBLEMS),
  ...Object.keys(FORMULA_PROBLEMS),
]);

/** What no problem may be: without a known rule or a place inside its file, or a text that a terminal would obey. */
export function problemFaults(problem: Problem, text: string): readonly string[] {
  const { rule, line, column } = problem;
  const lines = text.split(/\r?\n/);
  // a carriage return that ends no line is a problem of its own; some readers count it as an end of one
  const isOdd = /\r(?!\n)/.test(text);
  const most = isOdd ? text.split(/[\r\n]/).length : lines.length;
  const width = isOdd ? Number.POSITIVE_INFINITY : (lines[line - 1]?.length ?? -1);
  const said = problemText(problem);
  return [
    ...(RULES.has(rule) ? [] : [`no rule ${rule}`]),
    ...(line >= 1 && line <= most && column >= 1 && column <= width + 1
      ? []
      : [`${rule} at ${line}:${column} of ${lines.length} lines, this one of ${width}`]),
    // biome-ignore lint/suspicious/noControlCharactersInRegex: that is what must not be there
    ...(/[\x00-\x1f\x7f-\x9f\u202A-\u202E\u2066-\u2069]/.test(said)
      ? [`${rule} is said with a control character`]
      : []),
    ...(said.length <= 2000 ? [] : [`${rule} is said in ${said.length} characters`]),
  ];
}
