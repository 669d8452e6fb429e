import type { Reference } from '../reference/reference.ts';

/** The names of materials for a caution's text, in the order given: `Honey, Goat milk`. */
export function materialNames(reference: Reference, ids: readonly string[]): string {
  const { fats, alkalis, additives, liquids } = reference;
  return [...new Set(ids)]
    .map(
      (id) => (fats.get(id) ?? alkalis.get(id) ?? additives.get(id) ?? liquids.get(id))?.name ?? id,
    )
    .join(', ');
}
