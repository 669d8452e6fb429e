import type { Hit } from './hit.ts';
import type { IndexContents } from './index-format.ts';

/** Values that a page must have, by filter. */
export type Filters = Readonly<Record<string, string>>;

/**
 * The hits whose pages have all the values, in the order they came in; a value that no page has leaves none.
 * `pagesOf` gives the pages of a filter's file by value. Rejects with a `RangeError` where the index has no such filter.
 */
export async function narrowed(
  { filters }: IndexContents,
  hits: readonly Hit[],
  wanted: Filters,
  pagesOf: (hash: string) => Promise<ReadonlyMap<string, readonly number[]>>,
): Promise<readonly Hit[]> {
  const sets = await Promise.all(
    Object.entries(wanted).map(async ([name, value]) => {
      const file = filters.find(({ filter }) => filter === name);
      if (!file) throw new RangeError(`Search index: there is no filter "${name}"`);
      return new Set((await pagesOf(file.hash)).get(value));
    }),
  );
  return hits.filter(({ page }) => sets.every((pages) => pages.has(page)));
}
