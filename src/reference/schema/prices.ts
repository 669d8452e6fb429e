import { z } from 'zod';
import { date } from './date.ts';

/** `data/prices.yaml`: what the shop pays, per kilogram as bought. */
export const pricesSchema = z.strictObject({
  // ISO 4217
  currency: z.string().regex(/^[A-Z]{3}$/),
  prices: z.array(
    z.strictObject({
      material: z.string(),
      'per-kilogram': z.number().gte(0).lte(100_000),
      on: date,
    }),
  ),
});
