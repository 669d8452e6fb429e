import type { z } from 'zod';
import type { additiveLabelSchema, fatLabelSchema, liquidLabelSchema } from './schema/label.ts';
import { valueRecord } from './schema/value.ts';
import type { How, ValueRecord } from './values.ts';

/** What a label may say of a soap where everything in it allows it. */
export const CLAIMS = ['vegan', 'palm-free', 'nut-free'] as const;
export type Claim = (typeof CLAIMS)[number];

/** Names of what sodium and potassium hydroxide turn a material into, with their source. */
export interface SaltNames {
  readonly sodium: string;
  readonly potassium: string;
  readonly source: string;
  readonly at: string;
  readonly how: How;
}

/** What a label needs to know of a material beside its INCI name. */
export interface MaterialLabel {
  /** Name on a label of the United States, where it is another one. */
  readonly usName: string | null;
  /** Claims that the data cannot decide for it: the supplier has to. */
  readonly openClaims: readonly Claim[];
}

export interface FatLabel extends MaterialLabel {
  /** `null`: no name is known, and the declaration shows the gap. */
  readonly saponified: SaltNames | null;
}

export interface AdditiveLabel extends MaterialLabel {
  /** Of an acid: its salts. */
  readonly neutralised: SaltNames | null;
  /** Content as supplied, g per 100 g; `null` where no supplier's declaration is in the data. */
  readonly fragranceAllergens:
    | readonly { readonly name: string; readonly content: ValueRecord }[]
    | null;
}

type Raw<Schema extends z.ZodType> = z.infer<Schema> | undefined;

export const fatLabel = (raw: Raw<typeof fatLabelSchema>): FatLabel => ({
  ...materialLabel(raw),
  saponified: raw?.saponified ?? null,
});

export const additiveLabel = (raw: Raw<typeof additiveLabelSchema>): AdditiveLabel => ({
  ...materialLabel(raw),
  neutralised: raw?.neutralised ?? null,
  fragranceAllergens:
    raw?.['fragrance-allergens']?.map(({ name, content }) => ({
      name,
      content: valueRecord(content),
    })) ?? null,
});

export const materialLabel = (raw: Raw<typeof liquidLabelSchema>): MaterialLabel => ({
  usName: raw?.['us-name'] ?? null,
  openClaims: raw?.['open-claims'] ?? [],
});
