import type { Hit } from '../search/reader/hit.ts';
import type { Search } from '../search/reader/search.ts';
import { openHandbookSearch } from './find-chunks.ts';

/** What the words found: pages, and among them rows of the finder, best first. */
export interface WordsFound {
  readonly words: string;
  readonly search: Search;
  readonly hits: readonly Hit[];
  readonly rows: readonly number[];
  /** Row of a page; pages that are no formula have none. */
  readonly rowOf: ReadonlyMap<number, number>;
}

/** Looks for words; opens the search at the first. Gives `null` where the text has no word in it. */
export function wordSearch(language: string): (words: string) => Promise<WordsFound | null> {
  let opened: ReturnType<typeof openHandbookSearch> | null = null;
  return async (words) => {
    opened ??= openHandbookSearch(language);
    const failed = () => {
      opened = null;
    };
    opened.catch(failed);
    const { search, entry } = await opened;
    const hits = await search.find(words);
    if (!hits) return null;
    const rowOf = new Map(entry.rows.map((page, row) => [page, row]));
    const rows = hits.flatMap(({ page }) => rowOf.get(page) ?? []);
    return { words, search, hits, rows, rowOf };
  };
}
