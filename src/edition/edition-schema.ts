import { z } from 'zod';
import type { EditionDocument } from './edition-document.ts';
import type { WeightsPerKilogram } from './weights-per-kilogram.ts';

const weight = z.object({ id: z.string(), mass: z.number() });
const stagedWeight = z.object({ id: z.string(), mass: z.number(), at: z.string() });

/** Weights as editions and the ledger hold them. */
export const weightsSchema: z.ZodType<WeightsPerKilogram> = z.object({
  fats: z.array(weight),
  afterCookFats: z.array(weight),
  alkali: z.array(weight),
  water: z.number(),
  heldBack: z.number(),
  liquids: z.array(stagedWeight),
  additives: z.array(stagedWeight),
});

const interval = z.tuple([z.number(), z.number()]);

const entry = {
  code: z.string(),
  name: z.string(),
  kind: z.enum(['bar', 'paste', 'liquid']),
  revision: z.number(),
};

const current = z.object({
  ...entry,
  state: z.enum(['approved', 'changed-since-approval', 'review-date-passed', 'not-approved']),
  fingerprint: z.string(),
  approval: z.object({ by: z.string(), on: z.string(), reviewBy: z.string() }).nullable(),
  digests: z.record(z.string(), z.string().nullable()),
  lots: z.array(z.object({ material: z.string(), lot: z.string() })),
  weights: weightsSchema,
  shares: z.array(z.object({ id: z.string(), share: z.number() })),
  superfat: z.object({ written: z.number(), expanded: interval, worstCase: interval }),
  profile: z
    .object({
      saturated: z.number(),
      monounsaturated: z.number(),
      polyunsaturated: z.number(),
      saponificationValue: z.number(),
      iodineValue: z.number(),
      oxidisability: z.number(),
      meanChainLength: z.number(),
    })
    .nullable(),
});

const withdrawn = z.object({
  ...entry,
  state: z.literal('withdrawn'),
  withdrawn: z.object({ on: z.string(), reason: z.string(), by: z.string() }),
});

/** `edition.json` as it is read back; names that a later version adds are passed over. */
export const editionSchema: z.ZodType<EditionDocument> = z.object({
  schema: z.literal(1),
  shop: z.string(),
  id: z.string(),
  asOf: z.string(),
  proof: z.boolean(),
  models: z.number(),
  formulas: z.array(z.union([current, withdrawn])),
});
