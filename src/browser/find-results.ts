import { answer, inOrder } from '../search/finder/answer.ts';
import type { FinderData } from '../search/finder/finder-data.ts';
import { limitsOf } from '../search/finder/limits.ts';
import { PAGE_FILTER, type PageType } from '../search/finder/page-types.ts';
import type { FinderState } from '../search/finder/state.ts';
import { findWords } from '../words/en/find.ts';
import { element, part } from './find-dom.ts';
import { limitList } from './find-limits.ts';
import { drawList } from './find-list.ts';
import { sayBroken } from './find-notes.ts';
import { pageList } from './find-pages.ts';
import type { WordsFound } from './find-words.ts';

/** What is drawn beside the form. */
export interface Results {
  readonly rows: readonly number[];
  /** For each limit in force, what is asked without it. */
  readonly dropped: readonly FinderState[];
}

export interface Shown {
  /** How many at most. */
  readonly rows: number;
  readonly pages: number;
}

/** Draws count, limits, table and pages of a state. */
export function drawResults(
  data: FinderData,
  state: FinderState,
  found: WordsFound | null,
  shown: Shown,
): Results {
  const limits = limitsOf(state, data, found?.rowSet ?? null);
  const { rows, withoutLimit } = answer(data, limits);
  part('find-count').textContent = findWords.found(rows.length, data.codes.length);
  part('find-limits').replaceChildren(...limitList(limits, rows.length, withoutLimit));
  drawList(data, state, inOrder(rows, data, state.sort, found?.rows ?? null), shown.rows);
  const limited = limits.length > (found ? 1 : 0);
  drawPages(found, limited ? new Set(rows) : null, state.where, shown.pages).catch(sayBroken);
  return { rows, dropped: limits.map((limit) => limit.dropped) };
}

let turn = 0;

/**
 * With other limits than words only the rows that keep them are listed, unless pages of another type than formulas
 * are asked for: limits say nothing about those.
 */
async function drawPages(
  found: WordsFound | null,
  limitedTo: ReadonlySet<number> | null,
  where: PageType | null,
  shown: number,
): Promise<void> {
  const mine = ++turn;
  part('find-pages').hidden = !found;
  if (!found) return;
  const { words, search, hits, rowOf } = found;
  const onlyRows = where === null || where === 'formulas' ? limitedTo : null;
  const placed = where ? await search.narrow(hits, { [PAGE_FILTER]: where }) : hits;
  const kept = onlyRows ? placed.filter(({ page }) => onlyRows.has(rowOf.get(page) ?? -1)) : placed;
  const { list, left } = await pageList(search, kept, shown);
  if (mine !== turn) return;
  list.dataset.words = words;
  const note = kept.length === 0 ? findWords.noPages : onlyRows ? findWords.outsideLimits : '';
  part('find-pages-list').replaceChildren(
    element('p', { class: 'label' }, note),
    list,
    ...(left > 0 ? [element('button', { type: 'button' }, findWords.morePages(left))] : []),
  );
}
