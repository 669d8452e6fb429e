import { fieldWeight, type Hit, inOrder, type TermWords } from './hit.ts';
import { eachFieldPlace, type IndexContents, type WordOnPage } from './index-format.ts';
import { scorePlaces, weightsOf } from './places.ts';

/** A word of the index that answers a term of the query on one page. */
export interface Match {
  /** Number of the term in the query. */
  readonly term: number;
  readonly word: string;
  readonly onPage: WordOnPage;
  /** 0..1: how near the word's length is to the term's. */
  readonly closeness: number;
  /** 1, or more where the marks on the letters agree too. */
  readonly accent: number;
}

// Okapi BM25; values as in the stock client, so that both rank alike
const SATURATION = 1.4;
const LENGTH_SHARE = 0.75;
const PLAIN_WEIGHT = 24;
const ACCENT_BONUS = 0.8;

/** Ranks the pages that have all terms; a term that no word answers is passed over unless none is answered. */
export function rank(contents: IndexContents, terms: readonly TermWords[]): readonly Hit[] {
  const { pages } = contents;
  const having = terms.map(({ words }) => pagesWith(words, pages.length));
  const rarity = having.map(({ count }) => rarityOf(pages.length, count));
  const answered = having.filter((_, i) => terms[i]?.words.length);
  const isResult = (page: number) =>
    answered.length > 0 && answered.every(({ has }) => has[page] === 1);
  const meanLength = pages.reduce((sum, { words }) => sum + words, 0) / pages.length;
  const hits: Hit[] = [];
  for (const [page, matches] of matchesByPage(terms, pages.length, isResult).entries()) {
    if (!matches) continue;
    const length = (pages[page]?.words ?? 0) / meanLength;
    const score =
      textScore(matches, weightsOf(matches), rarity, length) +
      fieldScore(contents, matches, rarity);
    hits.push({ page, score, places: () => scorePlaces(matches) });
  }
  return inOrder(hits);
}

/** ln((N - n + 0.5) / (n + 0.5) + 1): the fewer pages have a word, the more it says. */
function rarityOf(pages: number, having: number): number {
  const ratio = Math.fround((pages - having + 0.5) / (having + 0.5));
  // in 32 bits as the stock client does: for a word on nearly every page the difference would show
  return Math.fround(Math.log(Math.fround(ratio + 1)));
}

function textScore(
  matches: readonly Match[],
  weights: ReadonlyMap<string, number>,
  rarity: readonly number[],
  length: number,
): number {
  let score = 0;
  // the first match of a word speaks for it; words come in the order of their letters
  for (const [word, weight] of weights) {
    const first = matches.find((match) => match.word === word);
    if (!first) continue;
    const frequency = (weight / PLAIN_WEIGHT) * first.closeness;
    const damping = SATURATION * (1 - LENGTH_SHARE + LENGTH_SHARE * length);
    const saturated = ((SATURATION + 1) * frequency) / (damping + frequency);
    score += (rarity[first.term] ?? 0) * saturated * first.accent;
  }
  return score;
}

/** Each field counts by the share of the query's rarity that it covers, squared. */
function fieldScore(contents: IndexContents, matches: readonly Match[], rarity: readonly number[]) {
  if (matches.every(({ onPage }) => onPage.fieldPlaces.length === 0)) return 0;
  const whole = rarity.reduce((sum, each) => sum + each, 0);
  const termsOfField = new Map<number, Set<number>>();
  for (const { term, onPage } of matches) {
    eachFieldPlace(onPage, (field) => {
      termsOfField.set(field, (termsOfField.get(field) ?? new Set()).add(term));
    });
  }
  let score = 0;
  for (const [field, terms] of termsOfField) {
    const covered = [...terms].reduce((sum, term) => sum + (rarity[term] ?? 0), 0);
    if (whole > 0) score += fieldWeight(contents, field) * covered * (covered / whole) ** 2;
  }
  return score;
}

/** The matches by page number; pages that are no result have none. */
function matchesByPage(
  terms: readonly TermWords[],
  pages: number,
  isResult: (page: number) => boolean,
): readonly (readonly Match[] | undefined)[] {
  const byPage = Array.from({ length: pages }, (_, page): Match[] | undefined =>
    isResult(page) ? [] : undefined,
  );
  for (const [number, { term, words }] of terms.entries()) {
    const typedBytes = bytesIn(term.stem);
    for (const { word, forms } of words) {
      const closeness = closenessOf(Math.abs(bytesIn(word) - typedBytes));
      for (const { form, pages } of forms) {
        const alike = form.startsWith(term.typed) || term.typed.startsWith(form);
        const accent = alike ? 1 + ACCENT_BONUS : 1;
        for (const onPage of pages) {
          byPage[onPage.page]?.push({ term: number, word, onPage, closeness, accent });
        }
      }
    }
  }
  return byPage;
}

/** 1 for no difference in bytes would be the peak; the stock client counts from 1, so 0.89 is the most. */
function closenessOf(difference: number): number {
  const steps = Math.min(difference + 1, 255);
  return Math.exp(Math.exp(-0.5 * (steps / 2) ** 2) - 1);
}

const encoder = new TextEncoder();
const bytesIn = (text: string) => encoder.encode(text).length;

/** Which pages have any of the words, by page number, and how many they are. */
function pagesWith(words: TermWords['words'], length: number) {
  const has = new Uint8Array(length);
  let count = 0;
  for (const { forms } of words) {
    for (const { pages } of forms) {
      for (const { page } of pages) {
        if (has[page]) continue;
        has[page] = 1;
        count++;
      }
    }
  }
  return { has, count };
}
