import { z } from 'zod';
import type { SchemaRule } from '../schema-problems.ts';
import type { How, ValueRecord } from '../values.ts';

export const HOW = [
  'measured',
  'standard',
  'handbook',
  'supplier',
  'common practice',
  'from memory',
] as const satisfies readonly How[];

/** Text of one line. */
export const line = z.string().min(1).max(600);
/** What stands beside every figure: where it comes from. */
export const origin = {
  source: z.string().min(1),
  at: line,
  how: z.enum(HOW),
  note: line.optional(),
};

export const broken = (rule: SchemaRule) => ({ code: 'custom' as const, params: { ...rule } });

/** One value of one source in `unit`; figures outside `least` to `most` are slips of the pen. */
export function valueIn(unit: string, least: number, most: number) {
  const number = z.number().gte(least).lte(most);
  return z
    .strictObject({
      value: number.optional(),
      min: number.optional(),
      max: number.optional(),
      unit: z.literal(unit),
      temperature: z.number().gte(-50).lte(200).optional(),
      statistic: z.enum(['range', 'mean', 'typical']).optional(),
      samples: z.int().gte(1).optional(),
      ...origin,
    })
    .superRefine((record, context) => checkEnds(record, context));
}

/** Either a value or at least one end; the ends in order. */
export function checkEnds(
  {
    value,
    min,
    max,
  }: {
    readonly value?: number | undefined;
    readonly min?: number | undefined;
    readonly max?: number | undefined;
  },
  context: { addIssue(issue: ReturnType<typeof broken>): void },
): void {
  if ((value === undefined) === (min === undefined && max === undefined)) {
    context.addIssue(
      broken({
        rule: 'data/value-or-range',
        found:
          value === undefined ? 'neither a value nor an end of a range' : 'a value and a range',
        expected: 'either "value" or "min" and "max" (one may be left out)',
        advice: 'write the figure as the source prints it',
      }),
    );
  }
  if (min !== undefined && max !== undefined && min > max) {
    context.addIssue(
      broken({
        rule: 'data/range-order',
        found: `min ${min} above max ${max}`,
        expected: 'the lower end first',
        advice: 'look the two figures up again',
      }),
    );
  }
}

export type RawValue = z.infer<ReturnType<typeof valueIn>>;

export function valueRecord(raw: RawValue): ValueRecord {
  return {
    value: raw.value ?? null,
    min: raw.min ?? null,
    max: raw.max ?? null,
    unit: raw.unit,
    source: raw.source,
    at: raw.at,
    how: raw.how,
    statistic: raw.statistic ?? (raw.value === undefined ? 'range' : 'typical'),
    samples: raw.samples ?? null,
    temperature: raw.temperature ?? null,
    note: raw.note ?? null,
  };
}

/** The value, or the middle of the range with an absent lower end reckoned as 0. `null` without an upper end. */
export function middleOf({
  value,
  min,
  max,
}: Pick<ValueRecord, 'value' | 'min' | 'max'>): number | null {
  if (value !== null) return value;
  return max === null ? null : ((min ?? 0) + max) / 2;
}

/** What is sure to be there: the value, or the lower end, or 0. */
export const leastOf = ({ value, min }: Pick<ValueRecord, 'value' | 'min'>): number =>
  value ?? min ?? 0;
