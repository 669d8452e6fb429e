import { fieldWeight, type Hit, inAll, inOrder, type TermWords } from './hit.ts';
import { fieldPlacesOf, type IndexContents, placesOf, type WordOnPage } from './index-format.ts';

/** Pages on which the terms stand one after another, in the text or within one metadata field. */
export function findPhrase(contents: IndexContents, terms: readonly TermWords[]): readonly Hit[] {
  const byPage = terms.map(({ words }) => pagesOf(words));
  const hits: Hit[] = [];
  for (const page of inAll(byPage.map((pages) => new Set(pages.keys())))) {
    const onPage = byPage.map((pages) => pages.get(page) ?? []);
    const start = firstRun(onPage.map((each) => each.flatMap(placesOf)));
    if (start !== undefined) {
      const places = terms.map((_, i) => ({ position: start + i, score: 1 }));
      hits.push({ page, score: 1, places });
      continue;
    }
    const score = bestField(contents, onPage);
    if (score > 0) hits.push({ page, score, places: [] });
  }
  return inOrder(hits);
}

/** Weight of the heaviest field that has the whole phrase; 0 where none has. */
function bestField(contents: IndexContents, onPage: readonly (readonly WordOnPage[])[]): number {
  const places = onPage.map((each) => each.flatMap(fieldPlacesOf));
  const weights = contents.fields.map((_, field) =>
    firstRun(places.map((each) => each.filter((place) => place.field === field))) === undefined
      ? 0
      : fieldWeight(contents, field),
  );
  return Math.max(0, ...weights);
}

/** Position at which the first list's word starts a run through all lists. */
function firstRun(
  lists: readonly (readonly { readonly position: number }[])[],
): number | undefined {
  const sets = lists.map((list) => new Set(list.map(({ position }) => position)));
  return lists[0]?.find(({ position }) => sets.every((set, i) => set.has(position + i)))?.position;
}

function pagesOf(words: TermWords['words']): ReadonlyMap<number, readonly WordOnPage[]> {
  const byPage = new Map<number, WordOnPage[]>();
  for (const onPage of words.flatMap(({ forms }) => forms.flatMap(({ pages }) => pages))) {
    byPage.set(onPage.page, [...(byPage.get(onPage.page) ?? []), onPage]);
  }
  return byPage;
}
