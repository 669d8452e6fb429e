import type { Hit } from '../search/reader/hit.ts';
import type { Search } from '../search/reader/search.ts';
import { openHandbookSearch } from './find-chunks.ts';

/** What the words found: pages, and among them rows of the finder, best first. */
export interface WordsFound {
  readonly words: string;
  readonly search: Search;
  readonly hits: readonly Hit[];
  readonly rows: readonly number[];
  readonly rowSet: ReadonlySet<number>;
  /** Row of a page; pages that are no formula have none. */
  readonly rowOf: ReadonlyMap<number, number>;
}

/** The search by words of one language. */
export interface WordSearch {
  /** Opens the search ahead of the first question. A failure is told by the question. */
  readonly open: () => void;
  /** Looks for words. Gives `null` where the text has no word in it; rejects where a file of the search is missing. */
  readonly find: (words: string) => Promise<WordsFound | null>;
}

export function wordSearch(language: string): WordSearch {
  let opened: ReturnType<typeof openFor> | null = null;
  const open = () => {
    if (opened) return opened;
    const opening = openFor(language);
    opening.catch(() => {
      opened = null;
    });
    opened = opening;
    return opening;
  };
  return {
    open,
    async find(words) {
      const { search, rowOf } = await open();
      const hits = await search.find(words);
      if (!hits) return null;
      const rows = hits.flatMap(({ page }) => rowOf.get(page) ?? []);
      return { words, search, hits, rows, rowSet: new Set(rows), rowOf };
    },
  };
}

async function openFor(language: string) {
  const { search, entry } = await openHandbookSearch(language);
  return { search, rowOf: new Map(entry.rows.map((page, row) => [page, row])) };
}
