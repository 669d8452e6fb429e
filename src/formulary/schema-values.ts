import { z } from 'zod';
import type { FormulaRule } from '../words/en/problems-formula.ts';
import { isCalendarDate } from './calendar-date.ts';
import type { ProblemParts } from './report.ts';

/** What a refused value carries through the schema to its problem. */
export interface Refusal extends ProblemParts {
  readonly rule: FormulaRule;
}

/** A schema with one more demand; `refuse` says what is wrong with a value, or `null`. */
export function demanding<S extends z.ZodType>(
  schema: S,
  refuse: (value: z.output<S>) => Refusal | null,
): S {
  return schema.superRefine((value, context) => {
    const refusal = refuse(value);
    if (refusal) context.addIssue({ code: 'custom', message: refusal.rule, params: { refusal } });
  });
}

/** A number from `low` to `high`; above `low` where `above` is set. */
export function within(
  rule: FormulaRule,
  what: string,
  { low, high, above = false }: { low: number; high: number; above?: boolean },
  advice = '',
) {
  return demanding(z.number(), (value) =>
    value > high || value < low || (above && value === low)
      ? {
          rule,
          found: `${what} ${value}`,
          expected: above ? `more than ${low} and at most ${high}` : `${low} to ${high}`,
          advice,
        }
      : null,
  );
}

/** A text on one line. */
export function line(what: string, longest: number) {
  return demanding(z.string(), (value) => {
    const text = value.trim();
    const lines = text.split(/\r?\n/).length;
    if (text !== '' && lines === 1 && text.length <= longest) return null;
    return {
      rule: 'formula/text-form',
      found:
        text === ''
          ? `${what} without text`
          : `${what} of ${text.length} characters on ${lines === 1 ? 'one line' : `${lines} lines`}`,
      expected: `one line of 1 to ${longest} characters`,
      advice: text === '' ? '' : 'what is longer belongs in the text below the frontmatter',
    };
  });
}

/** A day as `2026-09-14`. */
export const date = demanding(z.string(), (value) =>
  isCalendarDate(value)
    ? null
    : {
        rule: 'formula/date',
        found: `date "${value}"`,
        expected: 'a day of the calendar as year-month-day, 2026-09-14',
      },
);

/** A list with something in it. */
export function filled<S extends z.ZodType>(what: string, item: S) {
  return demanding(z.array(item), (list) =>
    list.length === 0
      ? {
          rule: 'formula/empty-list',
          found: `${what} with nothing in it`,
          expected: 'at least one entry',
        }
      : null,
  );
}
