import { z } from 'zod';
import { date } from './date.ts';
import { broken } from './value.ts';

const currency = z.string().superRefine((code, context) => {
  if (/^[A-Z]{3}$/.test(code)) return;
  context.addIssue(
    broken({
      rule: 'data/text-form',
      found: `the currency "${code}"`,
      expected: 'its code of three capital letters by ISO 4217, such as EUR',
      advice: 'write the code',
    }),
  );
});

/** `data/prices.yaml`: what the shop pays, per kilogram as bought. */
export const pricesSchema = z.strictObject({
  currency,
  prices: z.array(
    z.strictObject({
      material: z.string(),
      'per-kilogram': z.number().gte(0).lte(100_000),
      on: date,
    }),
  ),
});
