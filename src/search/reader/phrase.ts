import { fieldWeight, type Hit, inOrder, type TermWords } from './hit.ts';
import {
  eachFieldPlace,
  type IndexContents,
  positionsOf,
  type WordOnPage,
} from './index-format.ts';

/** Pages on which the terms stand one after another, in the text or within one metadata field. */
export function findPhrase(contents: IndexContents, terms: readonly TermWords[]): readonly Hit[] {
  const [first = new Map<number, WordOnPage[]>(), ...rest] = terms.map(({ words }) =>
    pagesOf(words),
  );
  const hits: Hit[] = [];
  for (const [page, ofFirst] of first) {
    const ofRest = rest.flatMap((pages) => {
      const onPage = pages.get(page);
      return onPage ? [onPage] : [];
    });
    if (ofRest.length < rest.length) continue;
    const onPage = [ofFirst, ...ofRest];
    const start = firstRun(onPage.map((each) => each.flatMap(positionsOf)));
    if (start !== undefined) {
      const places = () => terms.map((_, i) => ({ position: start + i, score: 1 }));
      hits.push({ page, score: 1, places });
      continue;
    }
    const score = bestField(contents, onPage);
    if (score > 0) hits.push({ page, score, places: () => [] });
  }
  return inOrder(hits);
}

/** Weight of the heaviest field that has the whole phrase; 0 where none has. */
function bestField(contents: IndexContents, onPage: readonly (readonly WordOnPage[])[]): number {
  if (onPage.some((each) => each.every(({ fieldPlaces }) => fieldPlaces.length === 0))) return 0;
  const weights = contents.fields.map((_, field) =>
    firstRun(onPage.map((each) => each.flatMap((word) => positionsIn(word, field)))) === undefined
      ? 0
      : fieldWeight(contents, field),
  );
  return Math.max(0, ...weights);
}

function positionsIn(onPage: WordOnPage, wanted: number): readonly number[] {
  const positions: number[] = [];
  eachFieldPlace(onPage, (field, position) => {
    if (field === wanted) positions.push(position);
  });
  return positions;
}

/** The first position of the first list that starts a run through all lists. */
function firstRun([first = [], ...rest]: readonly (readonly number[])[]): number | undefined {
  const others = rest.map((list) => (list.length > FEW ? new Set(list) : list));
  return first.find((position) => {
    let next = position;
    for (const other of others) {
      next++;
      if (!('has' in other ? other.has(next) : other.includes(next))) return false;
    }
    return true;
  });
}

/** So short a list is looked through faster than a set of it is made. */
const FEW = 32;

function pagesOf(words: TermWords['words']): ReadonlyMap<number, readonly WordOnPage[]> {
  const byPage = new Map<number, WordOnPage[]>();
  for (const { forms } of words) {
    for (const { pages } of forms) {
      for (const onPage of pages) {
        const known = byPage.get(onPage.page);
        if (known) known.push(onPage);
        else byPage.set(onPage.page, [onPage]);
      }
    }
  }
  return byPage;
}
