import { z } from 'zod';
import { date, demanding, filled, line, within } from './schema-values.ts';
import { isSane, parseTarget, suits, TARGETS, type TargetName } from './target.ts';

const STAGES = ['lye', 'fats', 'trace', 'after-cook', 'dilution'] as const;
const percentOfFats = within('formula/percent-range', 'percent-of-fats', {
  low: 0,
  high: 100,
  above: true,
});

const target = (name: TargetName) =>
  demanding(z.string(), (text) => {
    const { of, low, high } = TARGETS[name];
    const unit = of === 'temperature' ? 'C' : 'h';
    const parsed = parseTarget(text);
    if (!parsed || !suits(name, parsed)) {
      return {
        rule: 'formula/target-form',
        found: `${name} "${text}"`,
        expected:
          of === 'temperature'
            ? 'degrees Celsius as 38 C or 35-40 C'
            : 'a time as 90 min, 24 h, 24-36 h or 42 d',
      };
    }
    return isSane(name, parsed)
      ? null
      : {
          rule: 'formula/target-range',
          found: `${name} ${text}`,
          expected: `${Math.round(low * 100) / 100} to ${high} ${unit}, the lower end first`,
        };
  }).optional();

/**
 * The frontmatter, key by key. Strict: a key that is not here is an error. Ids are looked up elsewhere,
 * because they depend on the data.
 */
export const frontmatterSchema = z.strictObject({
  code: demanding(z.string(), (code) =>
    /^[A-Z]{2,4}-[0-9]{1,4}[A-Z]?$/.test(code)
      ? null
      : {
          rule: 'formula/code-form',
          found: `code "${code}"`,
          expected: 'two to four capitals, a hyphen, a number and at most one more capital',
          advice: 'write it as QY-014 or QY-014B; it becomes the name of a page',
        },
  ),
  name: line('name', 80),
  kind: z.enum(['bar', 'paste', 'liquid']),
  process: z.enum(['cold', 'hot']),
  revision: demanding(z.number(), (value) =>
    Number.isInteger(value) && value >= 1 && value <= 9999
      ? null
      : {
          rule: 'formula/revision-range',
          found: `revision ${value}`,
          expected: 'a whole number from 1 to 9999',
        },
  ),
  summary: line('summary', 300).optional(),
  fats: filled(
    'fats',
    z.strictObject({
      fat: z.string(),
      share: within(
        'formula/share-range',
        'share',
        { low: 0, high: 100, above: true },
        'leave out a fat that is not used',
      ),
    }),
  ),
  'after-cook-fats': z
    .array(
      z.strictObject({
        fat: z.string(),
        'percent-of-fats': within('formula/percent-range', 'percent-of-fats', {
          low: 0,
          high: 25,
          above: true,
        }),
      }),
    )
    .optional(),
  alkali: z.strictObject({
    sodium: within('formula/share-range', 'sodium', { low: 0, high: 100 }).optional(),
    potassium: within('formula/share-range', 'potassium', { low: 0, high: 100 }).optional(),
    basis: z.enum(['moles', 'mass']).optional(),
  }),
  superfat: within(
    'formula/superfat-range',
    'superfat',
    { low: 0, high: 25 },
    'a negative superfat leaves free alkali, a large one is a slip',
  ),
  water: z.strictObject({
    'lye-concentration': within('formula/water-range', 'lye-concentration', {
      low: 15,
      high: 50,
    }).optional(),
    'per-alkali': within('formula/water-range', 'per-alkali', { low: 1, high: 6 }).optional(),
    'percent-of-fats': within('formula/water-range', 'percent-of-fats', {
      low: 10,
      high: 80,
    }).optional(),
    'hold-back': within('formula/hold-back-range', 'hold-back', { low: 0, high: 80 }).optional(),
  }),
  liquids: z
    .array(
      z.strictObject({
        liquid: z.string(),
        'replaces-water': within(
          'formula/replaced-water',
          'replaces-water',
          { low: 0, high: 100, above: true },
          'it is the percent of the water that comes from this liquid',
        ),
        at: z.enum(STAGES),
      }),
    )
    .optional(),
  additives: z
    .array(
      z.strictObject({
        additive: z.string(),
        'percent-of-fats': percentOfFats,
        at: z.enum(STAGES),
      }),
    )
    .optional(),
  targets: z
    .strictObject({
      fats: target('fats'),
      lye: target('lye'),
      combine: target('combine'),
      cook: target('cook'),
      unmould: target('unmould'),
      cure: target('cure'),
    })
    .optional(),
  release: z
    .strictObject({
      'free-alkali': within('formula/release-range', 'free-alkali', {
        low: 0,
        high: 1,
      }).optional(),
      ph: demanding(z.array(z.number()), (ends) =>
        ends.length === 2 &&
        7 <= (ends[0] ?? 0) &&
        (ends[0] ?? 0) < (ends[1] ?? 0) &&
        (ends[1] ?? 0) <= 12
          ? null
          : {
              rule: 'formula/release-range',
              found: `ph [${ends.join(', ')}]`,
              expected: 'a lower and an upper end from 7 to 12, as [9, 10.5]',
            },
      ).optional(),
      moisture: within('formula/release-range', 'moisture', { low: 0, high: 60 }).optional(),
    })
    .optional(),
  batches: filled('batches', z.string()).optional(),
  tags: z
    .array(
      demanding(z.string(), (tag) =>
        /^[a-z0-9]+(-[a-z0-9]+)*$/.test(tag)
          ? null
          : {
              rule: 'formula/tag-form',
              found: `tag "${tag}"`,
              expected: 'small letters and digits, words joined by a hyphen, as palm-free',
            },
      ),
    )
    .optional(),
  changes: z
    .array(
      z.strictObject({
        revision: z.number(),
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
});

export type Frontmatter = z.output<typeof frontmatterSchema>;
export type FrontmatterKey = keyof Frontmatter;
