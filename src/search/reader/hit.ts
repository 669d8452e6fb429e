import type { IndexContents, IndexedWord } from './index-format.ts';
import type { QueryTerm } from './query.ts';

/** A term of the query with the words of the index that answer it. */
export interface TermWords {
  readonly term: QueryTerm;
  readonly words: readonly IndexedWord[];
}

/** A page that answers the query. */
export interface Hit {
  readonly page: number;
  readonly score: number;
  /** Worked out when they are asked for: only the pages that are shown need them. */
  readonly places: () => readonly HitPlace[];
}

/** A word of the page that was looked for, and how much it says. */
export interface HitPlace {
  readonly position: number;
  readonly score: number;
}

/** How much a hit in a metadata field counts. */
export const fieldWeight = ({ fields }: IndexContents, field: number): number =>
  fields[field] === 'title' ? 5 : 1;

/** Best first; equal scores in the order of the pages. */
export const inOrder = (hits: readonly Hit[]): readonly Hit[] =>
  hits.toSorted((a, b) => b.score - a.score || a.page - b.page);
