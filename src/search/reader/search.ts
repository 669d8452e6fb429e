import { chunksAround, chunksOf } from './chunk-choice.ts';
import type { Hit, TermWords } from './hit.ts';
import {
  type IndexContents,
  type IndexedWord,
  readContents,
  readFilter,
  readWords,
  type WordChunk,
} from './index-format.ts';
import { exactWord, wordsStarting } from './lookup.ts';
import { type Filters, narrowed } from './narrow.ts';
import { findPhrase } from './phrase.ts';
import { type QueryTerm, readQuery } from './query.ts';
import { rank } from './rank.ts';
import { stemmerFor } from './stemmer.ts';

/** What a reader must know before it loads anything else. */
export interface SearchEntry {
  readonly language: string;
  /** Name of the table of contents. */
  readonly contents: string;
  /** Punctuation that counts as letters. */
  readonly includeCharacters: readonly string[];
  /** Words whose stem is another than the stemmer gives. */
  readonly stemExceptions: Readonly<Record<string, string>>;
  /** Page numbers of the pages that another list of the handbook counts in rows, in its order. */
  readonly rows: readonly number[];
}

/** The text of a page as it was indexed. */
export interface PageText {
  readonly url: string;
  readonly content: string;
  readonly meta: Readonly<Record<string, string>>;
}

/** Gives a file of the index by name, inflated and without its mark. */
export type LoadPayload = (name: string) => Promise<Uint8Array>;

export interface Search {
  readonly contents: IndexContents;
  /** Pages that answer, best first; `null` where the query has no word in it. */
  find(typed: string): Promise<readonly Hit[] | null>;
  /** The hits whose pages have the values of the filters. */
  narrow(hits: readonly Hit[], filters: Filters): Promise<readonly Hit[]>;
  pageText(page: number): Promise<PageText>;
}

export interface SearchOptions {
  /** Shorter terms do not load all chunks that they begin: one letter would load a good part of the index. */
  readonly shortestBeginning?: number;
}

/** Opens an index. Everything is loaded when it is first needed and kept; a failed load is tried again next time. */
export async function openSearch(
  entry: SearchEntry,
  load: LoadPayload,
  { shortestBeginning = 2 }: SearchOptions = {},
): Promise<Search> {
  const contents = readContents(await load(entry.contents));
  const include = new Set(entry.includeCharacters);
  const stem = stemmerFor(entry.language, entry.stemExceptions);
  const chunkWords = once(async (hash) => readWords(await load(`index/${hash}.pf_index`)));
  const filterPages = once(async (hash) => readFilter(await load(`filter/${hash}.pf_filter`)));
  const texts = once(
    async (hash): Promise<unknown> =>
      JSON.parse(new TextDecoder().decode(await load(`fragment/${hash}.pf_fragment`))),
  );

  const inChunks = async (
    chunks: readonly WordChunk[],
    choose: (words: readonly IndexedWord[]) => readonly IndexedWord[],
  ) => (await Promise.all(chunks.map(({ hash }) => chunkWords(hash)))).flatMap(choose);

  const exactly = (word: string) =>
    inChunks(chunksAround(contents.chunks, word), (words) => {
      const found = exactWord(words, word);
      return found ? [found] : [];
    });

  const beginning = (start: string) => {
    const chunks = start.length < shortestBeginning ? chunksAround : chunksOf;
    return inChunks(chunks(contents.chunks, start), (words) => wordsStarting(words, start));
  };

  const answering = async (stem: string): Promise<readonly IndexedWord[]> => {
    const longer = await beginning(stem);
    if (longer.length > 0) return longer;
    for (let length = stem.length - 1; length > 0; length--) {
      const shorter = await exactly(stem.slice(0, length));
      if (shorter.length > 0) return shorter;
    }
    return [];
  };

  const asIndexed = async (term: QueryTerm): Promise<QueryTerm> =>
    term.withoutSymbols !== null && (await beginning(term.stem)).length === 0
      ? { ...term, stem: term.withoutSymbols }
      : term;

  return {
    contents,
    async find(typed) {
      const query = readQuery(typed, include, stem);
      if (query.terms.length === 0) return null;
      const look = query.phrase ? exactly : answering;
      const terms: readonly TermWords[] = await Promise.all(
        query.terms.map(async (typed) => {
          const term = await asIndexed(typed);
          return { term, words: await look(term.stem) };
        }),
      );
      return query.phrase ? findPhrase(contents, terms) : rank(contents, terms);
    },
    narrow: (hits, filters) => narrowed(contents, hits, filters, filterPages),
    async pageText(page) {
      const indexed = contents.pages[page];
      if (!indexed) throw new RangeError(`Search index: there is no page ${page}`);
      const text = await texts(indexed.group || indexed.hash);
      const own = indexed.group ? (text as Record<string, unknown>)[indexed.hash] : text;
      if (!isPageText(own)) throw new RangeError(`Search index: page ${page} has no text`);
      return own;
    },
  };
}

const isPageText = (value: unknown): value is PageText =>
  typeof value === 'object' && value !== null && 'url' in value && 'content' in value;

/** Calls `get` once per key and keeps its answer, unless it fails. */
function once<T>(get: (key: string) => Promise<T>): (key: string) => Promise<T> {
  const kept = new Map<string, Promise<T>>();
  return (key) => {
    const known = kept.get(key);
    if (known) return known;
    const asked = get(key);
    kept.set(key, asked);
    asked.catch(() => kept.delete(key));
    return asked;
  };
}
