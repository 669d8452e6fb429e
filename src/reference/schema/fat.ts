import { z } from 'zod';
import { fatLabelSchema } from './label.ts';
import { broken, checkEnds, line, origin, valueIn } from './value.ts';

/** Checks that a fat's file may except itself from, with a reason. */
export const EXCEPTABLE = [
  'composition-sum',
  'computed-saponification-value',
  'computed-iodine-value',
] as const;

export const ALLERGENS = ['tree nuts', 'peanut', 'soy', 'sesame', 'milk', 'wheat'] as const;

const percent = z.number().gte(0).lte(100);
const acidShare = z
  .strictObject({ value: percent.optional(), min: percent.optional(), max: percent.optional() })
  .superRefine((share, context) => {
    checkEnds(share, context);
    if (share.value === undefined && share.max === undefined && share.min !== undefined) {
      context.addIssue(
        broken({
          rule: 'data/value-or-range',
          found: 'a lower end without an upper end',
          expected: '"max" beside "min"',
          advice: 'write the upper end; a share without one cannot be used',
        }),
      );
    }
  });

/** `data/fats/ID.yaml`. */
export const fatSchema = z.strictObject({
  name: line,
  inci: line,
  kind: z.enum(['glyceride', 'free-acid', 'wax']),
  origin: z.enum(['plant', 'animal']),
  palm: z.boolean().optional(),
  allergens: z.array(z.enum(ALLERGENS)).optional(),
  label: fatLabelSchema.optional(),
  'saponification-value': z.array(valueIn('mg KOH/g', 60, 400)).optional(),
  'acid-value': z.array(valueIn('mg KOH/g', 0, 400)).optional(),
  'iodine-value': z.array(valueIn('g I2/100 g', 0, 230)).optional(),
  'relative-density': z.array(valueIn('1', 0.8, 1.05)).optional(),
  'unsaponifiable-matter': z.array(valueIn('g/kg', 0, 600)).optional(),
  compositions: z
    .array(z.strictObject({ ...origin, acids: z.record(z.string(), acidShare) }))
    .optional(),
  notes: z.array(line).optional(),
  exceptions: z.array(z.strictObject({ check: z.enum(EXCEPTABLE), reason: line })).optional(),
});

export type RawFat = z.infer<typeof fatSchema>;
