import type { ComputedFormula } from '../../formulary/formulary.ts';
import type { Reference } from '../../reference/reference.ts';

/**
 * From this share of a product that is rinsed off a fragrance allergen is named. [percent by mass]
 * Source: Regulation (EU) 2023/1545, as reported by oxfordbiosciences.com, read 2026-12-01.
 */
export const RINSE_OFF_THRESHOLD = 0.01;

export interface FragranceAllergens {
  /** To be named, by falling share. Percent of the released soap, at most, by the suppliers' figures. */
  readonly named: readonly { readonly name: string; readonly percent: number }[];
  /** Fragrances without a supplier's figure in the data: nothing is known of them. */
  readonly unknown: readonly string[];
}

/** Fragrance allergens by the suppliers' declarations, added up over all that brings them. */
export function fragranceAllergens(
  { charge, document }: ComputedFormula,
  { additives }: Reference,
): FragranceAllergens {
  const sums = new Map<string, number>();
  const unknown = new Set<string>();
  for (const { additive, mass } of charge.additives) {
    const record = additives.get(additive.id);
    const figures = record?.label.fragranceAllergens ?? null;
    if (record?.kind === 'fragrance' && figures === null) unknown.add(record.name);
    for (const { name, content } of figures ?? []) {
      // the most that the supplier states
      const most = (content.max ?? content.value ?? content.min ?? 0) / 100;
      sums.set(name, (sums.get(name) ?? 0) + mass * most);
    }
  }
  const named = [...sums]
    .map(([name, mass]) => ({ name, percent: (100 * mass) / document.yield.releasedMass }))
    .filter(({ percent }) => percent > RINSE_OFF_THRESHOLD)
    .sort((a, b) => b.percent - a.percent || (a.name < b.name ? -1 : 1));
  return { named, unknown: [...unknown] };
}
