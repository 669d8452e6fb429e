import { z } from 'zod';
import { line } from './value.ts';

const names = z.record(z.string(), line);

/** `data/languages/LANGUAGE.yaml`: names by the id of what they name, prose by its English text. */
export const languageSchema = z.strictObject({
  fats: names,
  acids: names,
  'systematic-names': names,
  alkalis: names,
  additives: names,
  liquids: names,
  'soap-grades': names,
  phrases: z.record(z.string(), line),
});
