import { z } from 'zod';
import { ORDER_OF_CHOICE } from '../values.ts';
import { date } from './date.ts';
import { line } from './value.ts';

/** `data/sources.yaml`: id to publication. */
export const sourcesSchema = z.record(
  z.string().regex(/^[a-z0-9][a-z0-9.-]*$/),
  z.strictObject({
    title: line,
    author: line.optional(),
    edition: line.optional(),
    year: z.int().gte(1500).lte(2100).optional(),
    kind: z.enum(ORDER_OF_CHOICE),
    address: line.optional(),
    'read-on': date.optional(),
  }),
);
