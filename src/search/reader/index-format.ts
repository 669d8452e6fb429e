import { type CborValue, decodeCbor } from './cbor.ts';

/** The table of contents of one language's index. A page's number is its place in `pages`. */
export interface IndexContents {
  readonly pages: readonly IndexedPage[];
  readonly chunks: readonly WordChunk[];
  readonly filters: readonly { readonly filter: string; readonly hash: string }[];
  /** Names of the metadata fields; fields are numbered by their place here. */
  readonly fields: readonly string[];
}

export interface IndexedPage {
  readonly hash: string;
  readonly words: number;
  /** Name of the file that holds the page's text with others, or empty where it has its own. */
  readonly group: string;
}

/** Words from `from` to `to`, both cut to the shortest beginning that tells neighbours apart. */
export interface WordChunk {
  readonly from: string;
  readonly to: string;
  readonly hash: string;
}

export interface IndexedWord {
  /** Lower case, without marks, stemmed. */
  readonly word: string;
  /** Where it stands as it is, and where its spelling had marks. */
  readonly forms: readonly { readonly form: string; readonly pages: readonly WordOnPage[] }[];
}

export interface WordOnPage {
  readonly page: number;
  /** Packed: see `eachPlace` and `eachFieldPlace`; 24 is the weight of plain text, a position the number of the word in the page. */
  readonly places: readonly number[];
  readonly fieldPlaces: readonly number[];
}

/** Reads a `pf_meta` payload. Throws a `RangeError` where it is not one. */
export function readContents(payload: Uint8Array): IndexContents {
  // the fifth are orders of pages, which the finder takes from its own data
  const [, pages, chunks, filters, , fields] = listOf(decodeCbor(payload), 6);
  return {
    pages: listOf(pages).map((each) => {
      const [hash, words, group] = listOf(each, 3);
      return { hash: textOf(hash), words: countOf(words), group: textOf(group) };
    }),
    chunks: listOf(chunks).map((each) => {
      const [from, to, hash] = listOf(each, 3);
      return { from: textOf(from), to: textOf(to), hash: textOf(hash) };
    }),
    filters: listOf(filters).map((each) => {
      const [filter, hash] = listOf(each, 2);
      return { filter: textOf(filter), hash: textOf(hash) };
    }),
    fields: listOf(fields).map(textOf),
  };
}

/** Reads a `pf_index` payload: words in the order of their code points. */
export function readWords(payload: Uint8Array): readonly IndexedWord[] {
  const [words] = listOf(decodeCbor(payload), 1);
  return listOf(words).map((each) => {
    const [packed, pages, variants] = listOf(each, 3);
    const word = textOf(packed);
    const marked = listOf(variants).map((variant) => {
      const [form, formPages] = listOf(variant, 2);
      return { form: textOf(form), pages: pagesOf(formPages) };
    });
    return { word, forms: [{ form: word, pages: pagesOf(pages) }, ...marked] };
  });
}

/** Reads a `pf_filter` payload: page numbers by value. */
export function readFilter(payload: Uint8Array): ReadonlyMap<string, readonly number[]> {
  const [, values] = listOf(decodeCbor(payload), 2);
  return new Map(
    listOf(values).map((each) => {
      const [value, pages] = listOf(each, 2);
      return [textOf(value), listOf(pages).map(countOf)];
    }),
  );
}

/** Calls `take` with weight and position of each place of a word on a page, in the order stored: by weight, then position. */
export const eachPlace = (
  { places }: WordOnPage,
  take: (weight: number, position: number) => void,
): void => unpack(places, 25, take);

/** The positions alone, in the same order. */
export function positionsOf({ places }: WordOnPage): readonly number[] {
  const positions: number[] = [];
  let position = 0;
  for (const number of places) {
    position = number < 0 ? 0 : position + number;
    if (number >= 0) positions.push(position);
  }
  return positions;
}

/** Calls `take` with field and position of each place of a word in the page's metadata. */
export const eachFieldPlace = (
  { fieldPlaces }: WordOnPage,
  take: (field: number, position: number) => void,
): void => unpack(fieldPlaces, 0, take);

/** A negative number switches the label (weight or field) and starts positions anew; others are steps. */
function unpack(
  packed: readonly number[],
  initial: number,
  take: (label: number, position: number) => void,
): void {
  let label = initial;
  let position = 0;
  for (const number of packed) {
    if (number < 0) {
      label = -number - 1;
      position = 0;
    } else {
      position += number;
      take(label, position);
    }
  }
}

function pagesOf(value: CborValue | undefined): readonly WordOnPage[] {
  let page = 0;
  return listOf(value).map((each) => {
    const [step, places, fieldPlaces] = listOf(each, 3);
    page += countOf(step);
    return { page, places: numbersOf(places), fieldPlaces: numbersOf(fieldPlaces) };
  });
}

function listOf(value: CborValue | undefined, length?: number): readonly CborValue[] {
  if (!Array.isArray(value) || (length !== undefined && value.length !== length)) {
    throw new RangeError(`Search index: expected a list${length ? ` of ${length}` : ''}`);
  }
  return value;
}

function textOf(value: CborValue | undefined): string {
  if (typeof value !== 'string') throw new RangeError('Search index: expected a text');
  return value;
}

function countOf(value: CborValue | undefined): number {
  if (typeof value !== 'number' || value < 0)
    throw new RangeError('Search index: expected a count');
  return value;
}

function numbersOf(value: CborValue | undefined): readonly number[] {
  const list = listOf(value);
  for (const each of list) {
    if (typeof each !== 'number') throw new RangeError('Search index: expected numbers');
  }
  return list as readonly number[];
}
