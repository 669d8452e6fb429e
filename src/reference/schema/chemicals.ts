import { z } from 'zod';
import { ALLERGENS } from './fat.ts';
import { additiveLabelSchema, liquidLabelSchema } from './label.ts';
import { line, origin, valueIn } from './value.ts';

/** `data/elements.yaml`: symbol to standard atomic weight. */
export const elementsSchema = z.record(z.string().regex(/^[A-Z][a-z]?$/), valueIn('g/mol', 1, 300));

/** `data/acids.yaml`: id to fatty acid. */
export const acidsSchema = z.record(
  z.string(),
  z.strictObject({
    name: line,
    'systematic-name': line,
    formula: line,
    carbons: z.int().gte(2).lte(40),
    'double-bonds': z.int().gte(0).lte(8),
    hydroxyls: z.int().gte(0).lte(3),
    'iodine-factor': z
      .strictObject({
        glyceride: z.number().gte(0).lte(5),
        acid: z.number().gte(0).lte(5),
        ...origin,
      })
      .optional(),
    'melting-point': valueIn('degC', -120, 120).optional(),
  }),
);

const perHundred = valueIn('g/100 g', 0, 100);

/** `data/alkalis/ID.yaml`. */
export const alkaliSchema = z.strictObject({
  name: line,
  inci: line,
  formula: line,
  cation: z.enum(['Na', 'K']),
  remainder: z.enum(['water', 'inert']),
  assay: z.array(perHundred),
  carbonate: z.array(perHundred).optional(),
  notes: z.array(line).optional(),
});

/** What an acid or a hydrate is made of; molar masses come from the formula. */
const substance = z.strictObject({
  name: line.optional(),
  formula: line,
  protons: z.int().gte(1).lte(6).optional(),
  'crystal-water': z.int().gte(1).lte(12).optional(),
});

/** `data/additives.yaml`: id to additive. */
export const additivesSchema = z.record(
  z.string(),
  z.strictObject({
    name: line,
    inci: line,
    kind: z.enum([
      'acid',
      'salt',
      'sugar',
      'clay',
      'mineral',
      'colour',
      'fragrance',
      'botanical',
      'antioxidant',
      'chelator',
      'solvent',
      'other',
    ]),
    origin: z.enum(['plant', 'animal', 'mineral', 'synthetic']),
    allergens: z.array(z.enum(ALLERGENS)).optional(),
    label: additiveLabelSchema.optional(),
    substance: substance.optional(),
    values: z
      .strictObject({
        content: perHundred.optional(),
        water: perHundred.optional(),
        // of a fragrance: what its supplier allows in soap, and where its vapour catches fire
        'maximum-in-product': perHundred.optional(),
        'flash-point': valueIn('degC', 0, 250).optional(),
      })
      .optional(),
    notes: z.array(line).optional(),
  }),
);

/** `data/liquids.yaml`: id to liquid. */
export const liquidsSchema = z.record(
  z.string(),
  z.strictObject({
    name: line,
    inci: line,
    origin: z.enum(['plant', 'animal', 'mineral']),
    allergens: z.array(z.enum(ALLERGENS)).optional(),
    label: liquidLabelSchema.optional(),
    fat: z.string().optional(),
    acid: substance.optional(),
    values: z.strictObject({
      water: perHundred,
      fat: perHundred,
      sugar: perHundred,
      acid: perHundred.optional(),
    }),
    notes: z.array(line).optional(),
  }),
);
