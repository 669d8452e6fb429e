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

const price = z.number().gte(0).lte(100_000);

/** `data/prices.yaml`: what the shop pays, per kilogram or per pound as bought. */
export const pricesSchema = z.strictObject({
  currency,
  prices: z.array(
    z
      .strictObject({
        material: z.string(),
        'per-kilogram': price.optional(),
        'per-pound': price.optional(),
        on: date,
      })
      .superRefine((entry, context) => {
        const stated = [entry['per-kilogram'], entry['per-pound']].filter(
          (each) => each !== undefined,
        );
        if (stated.length === 1) return;
        context.addIssue(
          broken({
            rule: 'data/missing-key',
            found: stated.length === 0 ? 'no price' : 'two prices',
            expected: 'either "per-kilogram" or "per-pound"',
            advice: 'state the price in one way',
          }),
        );
      }),
  ),
});
