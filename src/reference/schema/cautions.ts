import { z } from 'zod';
import { LIMIT_UNITS, type LimitName, MATERIAL_LISTS } from '../caution-thresholds.ts';
import { line } from './value.ts';

const origin = { basis: line, because: line };

const limit = (unit: string) =>
  z.strictObject({ value: z.number().gte(0).lte(200), unit: z.literal(unit), ...origin });

const list = z.strictObject({ ids: z.array(z.string()).min(1), ...origin });

/** `data/cautions.yaml`: every limit, in the unit that the rules reckon in, and every list of materials. */
export const cautionsSchema = z.strictObject({
  limits: z.strictObject(
    Object.fromEntries(
      Object.entries(LIMIT_UNITS).map(([name, unit]) => [name, limit(unit)]),
    ) as Record<LimitName, ReturnType<typeof limit>>,
  ),
  materials: z.strictObject(
    Object.fromEntries(MATERIAL_LISTS.map((name) => [name, list])) as Record<
      (typeof MATERIAL_LISTS)[number],
      typeof list
    >,
  ),
});
