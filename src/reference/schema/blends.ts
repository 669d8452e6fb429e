import { z } from 'zod';
import { line } from './value.ts';

const part = z.strictObject({ fat: z.string(), share: z.number().gt(0).lt(100) });

/** `data/blends.yaml`: fats that the shop keeps mixed. Shares in percent by mass of the blend. */
export const blendsSchema = z.record(
  z.string(),
  z.strictObject({
    name: line,
    parts: z.array(part).min(2),
    notes: z.array(line).optional(),
  }),
);

export type RawBlends = z.infer<typeof blendsSchema>;
