import { z } from 'zod';
import { LANGUAGES } from '../../words/languages.ts';
import { UNIT_SYSTEMS } from '../../words/units.ts';
import { voiceOf } from '../../words/voice.ts';
import { whatIsWrongWith } from '../ids.ts';
import { date } from './date.ts';
import { measure, writtenMeasure } from './measure.ts';
import { broken, line } from './value.ts';

const id = z.string().superRefine((text, context) => {
  const expected = whatIsWrongWith(text);
  if (expected === null) return;
  context.addIssue(
    broken({
      rule: 'data/text-form',
      found: `the id "${text}"`,
      expected,
      advice: 'ids become addresses of pages; the label may be anything',
    }),
  );
});

/** Ends up in pictures that are printed, so it must be a plain address. */
const siteAddress = line.superRefine((text, context) => {
  if (!/^https?:\/\/[^\s?#]+$/.test(text) || !URL.canParse(text) || text.length > 200) {
    context.addIssue(
      broken({
        rule: 'data/text-form',
        found: `the address "${text}"`,
        expected: 'where the handbook is served, like https://example.org/handbook/',
        advice: 'leave the key out where the handbook has no address',
      }),
    );
  }
});

/** The language of the handbook and how it writes numbers and dates. */
const locale = z.string().superRefine((text, context) => {
  try {
    voiceOf(text);
  } catch {
    context.addIssue(
      broken({
        rule: 'data/locale',
        found: `the locale "${text}"`,
        expected: `a BCP 47 tag, like en-GB or es-US, that begins with one of ${LANGUAGES.join(', ')}`,
        advice: 'the first part is the language; the second says how numbers and dates are written',
      }),
    );
  }
});

const KINDS = ['bar', 'paste', 'liquid'] as const;
const WAYS = ['fats', 'batter', 'bars', 'mould'] as const;

const batch = z
  .strictObject({
    id,
    label: line,
    fats: measure('mass', 50, 2_000_000).optional(),
    batter: measure('mass', 50, 2_000_000).optional(),
    bars: z.int().gte(1).lte(100_000).optional(),
    'wet-mass': measure('mass', 5, 5000).optional(),
    mould: measure('volume', 50, 2_000_000).optional(),
    vessel: measure('volume', 50, 5_000_000).optional(),
    'heat-limit': measure('mass', 50, 2_000_000).optional(),
    losses: z.number().gte(0).lte(50).optional(),
    scale: z.string(),
    'fine-scale': z.string().optional(),
    kinds: z.array(z.enum(KINDS)).min(1),
  })
  .superRefine((size, context) => {
    const stated = WAYS.filter((way) => size[way] !== undefined);
    const barsWhole = (size.bars === undefined) === (size['wet-mass'] === undefined);
    if (stated.length !== 1 || !barsWhole) {
      context.addIssue(
        broken({
          rule: 'data/batch-size',
          found: !barsWhole
            ? 'only one of "bars" and "wet-mass"'
            : stated.length === 0
              ? 'no size'
              : `sizes by ${stated.join(' and ')}`,
          expected: 'exactly one of "fats", "batter", "bars" with "wet-mass", "mould"',
          advice: 'state the size in one way',
        }),
      );
    }
  });

/** The day of an invented shop stands still, so that a demonstration does not expire; no other shop's may. */
function checkFixedDay(
  { invented, 'as-of': asOf }: { invented?: boolean | undefined; 'as-of'?: string | undefined },
  context: { addIssue(issue: ReturnType<typeof broken>): void },
): void {
  if (asOf === undefined || invented) return;
  context.addIssue(
    broken({
      rule: 'data/fixed-day',
      found: `the day ${asOf} for a shop that is not invented`,
      expected: 'the day of the build, or the one given with --as-of',
      advice: 'take "as-of" out: approvals and lots must be able to expire',
    }),
  );
}

/** `data/shop.yaml`. */
export const shopSchema = z
  .strictObject({
    name: line,
    invented: z.boolean().optional(),
    'as-of': date.optional(),
    locale: locale.optional(),
    weights: z.enum(UNIT_SYSTEMS).optional(),
    'site-address': siteAddress.optional(),
    batches: z.array(batch).min(1),
    scales: z
      .array(
        z.strictObject({
          id,
          name: line,
          step: writtenMeasure('mass', 0.001, 1000),
          error: writtenMeasure('mass', 0, 1000),
          capacity: writtenMeasure('mass', 1, 5_000_000),
        }),
      )
      .min(1),
    'start-temperature': measure('temperature', 0, 40),
    'release-moisture': z.number().gte(0).lte(40),
    'largest-superfat-shift': z.number().gt(0).lte(5),
    'rework-cap': z.number().gt(0).lte(50).optional(),
    'any-size': z.boolean().optional(),
    emergency: z.array(z.strictObject({ label: line, value: line })),
    rules: z.array(line).optional(),
    'release-limits': z.array(
      z.strictObject({
        kind: z.enum([...KINDS, 'any']),
        process: z.enum(['cold', 'hot', 'any']),
        end: z.enum(['expanded', 'worst-case']),
        floor: z.number().gte(-10).lte(25),
      }),
    ),
  })
  .superRefine(checkFixedDay);

export type RawShop = z.infer<typeof shopSchema>;
