import { z } from 'zod';
import { line, origin } from './value.ts';

/** `data/tables/NAME.yaml`: sets of points that different sources give for one curve. */
export const tableSchema = z.strictObject({
  x: z.strictObject({ name: line, unit: line }),
  y: z.strictObject({ name: line, unit: line }),
  sets: z
    .array(
      z.strictObject({
        solute: z.enum(['sodium-hydroxide', 'potassium-hydroxide', 'potassium-carbonate']),
        ...origin,
        temperature: z.number().gte(-50).lte(200).optional(),
        /** Beyond the range in which the source's fit holds: shown, never used. */
        extrapolated: z.boolean().optional(),
        'infinite-dilution': z.number().gte(0).lte(100).optional(),
        points: z.array(z.tuple([z.number(), z.number()])).optional(),
      }),
    )
    .min(1),
});

export type RawTable = z.infer<typeof tableSchema>;
