import { z } from 'zod';
import { MODELS, type ModelId } from '../evidence/models.ts';
import { line, origin } from './value.ts';

const published = z.number();

/** `data/evidence.yaml`. */
export const evidenceSchema = z.strictObject({
  records: z.array(
    z.strictObject({
      model: z.enum(Object.keys(MODELS) as [ModelId, ...ModelId[]]),
      of: line,
      subject: line,
      published,
      tolerance: z.number().gt(0),
      unit: line,
      inputs: z.record(z.string(), z.number()).optional(),
      ...origin,
    }),
  ),
  disagreements: z.array(z.strictObject({ id: line, reason: line })),
});
