import { madeVisible } from './hidden-characters.ts';
import type { Problem } from './problem.ts';
/**
 * One line for one problem:
 * `formulas/x.md:6:12  Found fat "cocnut", expected an id from data/fats; did you mean "coconut"?  [rule]`
 */
export function problemText(problem: Problem): string {
  const { file, line, column, found, expected, advice, rule, severity } = problem;
  const parts = [`Found ${cut(found)}`];
  if (expected !== '') parts.push(`, expected ${cut(expected)}`);
  if (advice !== '') parts.push(`; ${cut(advice)}`);
  const sentence = parts.join('');
  const end = /[.?!]$/.test(sentence) ? '' : '.';
  const warning = severity === 'warning' ? 'Warning: ' : '';
  return madeVisible(`${file}:${line}:${column}  ${warning}${sentence}${end}  [${rule}]`);
}

/** Longer parts are cut: what was found may be a whole file on one line. [characters] */
const LONGEST = 400;

const cut = (text: string) => (text.length > LONGEST ? `${text.slice(0, LONGEST)}…` : text);

/** `3 errors and 1 warning in 2 files`, or `no problems`. */
export function problemSummary(problems: readonly Problem[]): string {
  const errors = problems.filter(({ severity }) => severity === 'error').length;
  const warnings = problems.length - errors;
  const files = new Set(problems.map(({ file }) => file)).size;
  const counts = [
    ...(errors > 0 ? [counted(errors, 'error')] : []),
    ...(warnings > 0 ? [counted(warnings, 'warning')] : []),
  ];
  return counts.length === 0
    ? 'no problems'
    : `${counts.join(' and ')} in ${counted(files, 'file')}`;
}

/** `1 file`, `2 files`. */
export function counted(count: number, noun: string): string {
  return `${count} ${noun}${count === 1 ? '' : 's'}`;
}
