import type { Reference } from '../reference/reference.ts';

/** The ids that a formula may name. A `Reference` gives them; tests give a few of their own. */
export interface Known {
  readonly fats: ReadonlyMap<string, { readonly name: string; readonly core: object | null }>;
  readonly blends: ReadonlyMap<
    string,
    {
      readonly name: string;
      /** Percent by mass of the blend. */
      readonly parts: readonly { readonly fat: string; readonly share: number }[];
    }
  >;
  readonly additives: ReadonlyMap<string, { readonly name: string }>;
  readonly liquids: ReadonlyMap<string, { readonly name: string }>;
  readonly batches: ReadonlyMap<
    string,
    { readonly name: string; readonly kinds: readonly string[] }
  >;
}

/** The ids of a shop's data. */
export function knownFrom({ fats, blends, additives, liquids, shop }: Reference): Known {
  return {
    fats,
    blends,
    additives,
    liquids,
    batches: new Map(shop.batches.map(({ id, label, kinds }) => [id, { name: label, kinds }])),
  };
}
