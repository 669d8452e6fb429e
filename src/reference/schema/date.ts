import { z } from 'zod';
import { broken } from './value.ts';

/** A day of the calendar, `2026-12-01`. */
export const date = z.string().superRefine((text, context) => {
  if (!isDate(text)) {
    context.addIssue(
      broken({
        rule: 'data/date',
        found: `"${text}"`,
        expected: 'a date like 2026-12-01',
        advice: 'write year, month and day of a day that exists',
      }),
    );
  }
});

function isDate(text: string): boolean {
  if (!/^[0-9]{4}-[0-9]{2}-[0-9]{2}$/.test(text)) return false;
  const time = Date.parse(`${text}T00:00:00Z`);
  return Number.isFinite(time) && new Date(time).toISOString().startsWith(text);
}
