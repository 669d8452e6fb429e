import { type IndexedWord, positionsOf, readFilter, readWords } from '../reader/index-format.ts';
import { type LoadPayload, openSearch, type SearchEntry } from '../reader/search.ts';

export interface WholeIndex {
  readonly urls: readonly string[];
  /** Texts of the pages by page number. */
  readonly texts: readonly string[];
  readonly words: readonly IndexedWord[];
}

/** Reads everything that one language's index holds. Throws where a file is missing, broken or contradicts another. */
export async function readWholeIndex(entry: SearchEntry, load: LoadPayload): Promise<WholeIndex> {
  const search = await openSearch(entry, load);
  const { pages, chunks, filters } = search.contents;
  const urls: string[] = [];
  const texts: string[] = [];
  for (const page of pages.keys()) {
    const { url, content } = await search.pageText(page);
    urls.push(url);
    texts.push(content);
  }
  const words: IndexedWord[] = [];
  for (const { hash } of chunks) words.push(...readWords(await load(`index/${hash}.pf_index`)));
  for (const { hash } of filters) readFilter(await load(`filter/${hash}.pf_filter`));
  for (const { word, forms } of words) {
    for (const onPage of forms.flatMap((form) => form.pages)) {
      const length = pages[onPage.page]?.words ?? 0;
      if (positionsOf(onPage).some((position) => position >= length)) {
        throw new Error(`The search index puts "${word}" where page ${onPage.page} has no word.`);
      }
    }
  }
  return { urls, texts, words };
}
