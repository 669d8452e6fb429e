import { z } from 'zod';
import { CLAIMS } from '../label.ts';
import { line, origin, valueIn } from './value.ts';

/** Two names of what an alkali turns the material into. */
const bothNames = z.strictObject({ sodium: line, potassium: line, ...origin });

const shared = {
  // where the name on a label of the United States is another one
  'us-name': line.optional(),
  'open-claims': z.array(z.enum(CLAIMS)).min(1).optional(),
};

/** `label` of a fat. */
export const fatLabelSchema = z.strictObject({ saponified: bothNames.optional(), ...shared });

/** `label` of an additive. */
export const additiveLabelSchema = z.strictObject({
  neutralised: bothNames.optional(),
  // by the supplier's declaration, of the material as supplied
  'fragrance-allergens': z
    .array(z.strictObject({ name: line, content: valueIn('g/100 g', 0, 100) }))
    .optional(),
  ...shared,
});

/** `label` of a liquid. */
export const liquidLabelSchema = z.strictObject(shared);
