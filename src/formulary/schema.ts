import { z } from 'zod';
import { recordSchemas, revision } from './schema-record.ts';
import { releaseSchema, targetsSchema } from './schema-targets.ts';
import { demanding, filled, line, within } from './schema-values.ts';

const STAGES = ['lye', 'fats', 'trace', 'after-cook', 'dilution'] as const;
const percentOfFats = within('formula/percent-range', 'percent-of-fats', {
  low: 0,
  high: 100,
  above: true,
});

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
  revision,
  summary: line('summary', 300).optional(),
  fats: filled(
    'fats',
    demanding(
      z.strictObject({
        fat: z.string().optional(),
        blend: z.string().optional(),
        share: within(
          'formula/share-range',
          'share',
          { low: 0, high: 100, above: true },
          'leave out a fat that is not used',
        ),
      }),
      ({ fat, blend }) =>
        (fat === undefined) === (blend === undefined)
          ? {
              rule: 'formula/fat-or-blend',
              found:
                fat === undefined ? 'an entry without "fat"' : 'an entry with "fat" and "blend"',
              expected: 'either "fat" or "blend"',
              advice: 'write the blend in an entry of its own',
            }
          : null,
    ),
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
    'lye-concentration': within(
      'formula/water-range',
      'lye-concentration',
      { low: 15, high: 50 },
      'it is a percentage: 32 for 32 %',
    ).optional(),
    'per-alkali': within('formula/water-range', 'per-alkali', { low: 1, high: 6 }).optional(),
    'percent-of-fats': within(
      'formula/water-range',
      'percent-of-fats',
      { low: 10, high: 80 },
      'it is a percentage: 33 for 33 %',
    ).optional(),
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
  rework: within(
    'formula/percent-range',
    'rework',
    { low: 0, high: 50, above: true },
    'it is the percent of the batter; leave it out where the shop’s cap holds',
  ).optional(),
  targets: targetsSchema,
  release: releaseSchema,
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
  ...recordSchemas,
});

export type Frontmatter = z.output<typeof frontmatterSchema>;
export type FrontmatterKey = keyof Frontmatter;
