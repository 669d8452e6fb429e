import { isCalendarDate } from '../formulary/calendar-date.ts';
import { loadFormulary } from '../formulary/load.ts';
import { counted, problemSummary, problemText } from '../words/problem-text.ts';
import { FOLDERS, readArguments } from './arguments.ts';
import { asOfFor } from './as-of.ts';
import { speakFor } from './speak-for.ts';

/** Finds all problems of formulas and data, without building anything. Status 1 where there is an error. */
export function main(args: readonly string[]): number {
  const read = readArguments(args, {
    command: 'check',
    about: 'Finds all problems of the formulas and the data.',
    options: { ...FOLDERS, 'as-of': { value: 'DATE', about: 'the date of the check (today)' } },
  });
  if (!read.ok) {
    console.error(read.text);
    return read.status;
  }
  const start = performance.now();
  const { formulas = 'formulas', data = 'data' } = read.given;
  speakFor(data);
  const asOf = asOfFor(read.given['as-of'], data);
  if (read.given['as-of'] !== undefined && !isCalendarDate(asOf)) {
    console.error(`--as-of: "${asOf}" is no date. Write it like 2026-12-01.`);
    return 1;
  }
  const loaded = loadFormulary({ formulas, data }, { asOf });
  for (const problem of loaded.problems) console.error(problemText(problem));
  const counts = loaded.ok
    ? [
        counted(loaded.formulary.formulas.length, 'formula'),
        counted(loaded.formulary.reference.fats.size, 'fat'),
        problemSummary(loaded.problems),
      ]
    : [problemSummary(loaded.problems)];
  const seconds = ((performance.now() - start) / 1000).toFixed(1);
  console.log(`${counts.join(', ')} (${seconds} s)`);
  return loaded.ok ? 0 : 1;
}
