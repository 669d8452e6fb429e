import { type CborValue, decodeCbor } from './cbor.ts';

/** The table of contents of one language's index. A page's number is its place in `pages`. */
export interface IndexContents {
  readonly pages: readonly IndexedPage[];
  readonly chunks: readonly WordChunk[];
  readonly filters: readonly { readonly filter: string; readonly hash: string }[];
  /** By sort key, the numbers of the pages that have it, in ascending order of its values. */
  readonly sorts: ReadonlyMap<string, readonly number[]>;
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
  /** Packed: see `placesOf` and `fieldPlacesOf`. */
  readonly places: readonly number[];
  readonly fieldPlaces: readonly number[];
}

/** One occurrence: its weight (24 is plain text) and the number of the word in the page. */
export interface Place {
  readonly weight: number;
  readonly position: number;
}

/** Reads a `pf_meta` payload. Throws a `RangeError` where it is not one. */
export function readContents(payload: Uint8Array): IndexContents {
  const [, pages, chunks, filters, sorts, fields] = listOf(decodeCbor(payload), 6);
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
    sorts: new Map(
      listOf(sorts).map((each) => {
        const [key, sorted] = listOf(each, 2);
        return [textOf(key), listOf(sorted).map(countOf)];
      }),
    ),
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

/** Unpacks the places of a word on a page, in the order stored: by weight, then position. */
export function placesOf({ places }: WordOnPage): readonly Place[] {
  return unpack(places, 25).map(([weight, position]) => ({ weight, position }));
}

/** Unpacks the places of a word in the page's metadata. */
export function fieldPlacesOf({ fieldPlaces }: WordOnPage) {
  return unpack(fieldPlaces, 0).map(([field, position]) => ({ field, position }));
}

/** A negative number switches the label (weight or field) and starts positions anew; others are steps. */
function unpack(packed: readonly number[], initial: number): readonly [number, number][] {
  const found: [number, number][] = [];
  let label = initial;
  let position = 0;
  for (const number of packed) {
    if (number < 0) {
      label = -number - 1;
      position = 0;
    } else {
      position += number;
      found.push([label, position]);
    }
  }
  return found;
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
  if (list.some((each) => typeof each !== 'number')) {
    throw new RangeError('Search index: expected numbers');
  }
  return list as readonly number[];
}
