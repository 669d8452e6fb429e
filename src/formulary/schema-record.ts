import { z } from 'zod';
import { date, demanding, line } from './schema-values.ts';

export const revision = demanding(z.number(), (value) =>
  Number.isInteger(value) && value >= 1 && value <= 9999
    ? null
    : {
        rule: 'formula/revision-range',
        found: `revision ${value}`,
        expected: 'a whole number from 1 to 9999',
      },
);

/** The keys that say what became of a formula, who answers for it and since when. */
export const recordSchemas = {
  changes: z
    .array(
      z.strictObject({
        revision,
        on: date,
        note: line('note', 300),
      }),
    )
    .optional(),
  approval: z
    .strictObject({
      by: line('by', 120),
      on: date,
      'review-by': date,
      fingerprint: demanding(z.string(), (text) =>
        /^([0-9a-hjkmnp-tv-z]{4}-){3}[0-9a-hjkmnp-tv-z]$/.test(text)
          ? null
          : {
              rule: 'formula/fingerprint-form',
              found: `fingerprint "${text}"`,
              expected: 'three groups of four letters and digits and one more, as 4f2a-91c0-7be4-k',
              advice: 'let the approval be written by the command, not by hand',
            },
      ),
    })
    .optional(),
  concession: z
    .strictObject({ reason: line('reason', 300), by: line('by', 120), on: date })
    .optional(),
  withdrawn: z
    .strictObject({ on: date, reason: line('reason', 300), by: line('by', 120) })
    .optional(),
};
