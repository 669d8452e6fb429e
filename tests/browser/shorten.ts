import type { Page } from 'playwright-core';

/** Rows of a table, steps of a reckoning and chapters of the document to print that are looked at; the others are like them. */
const ROWS = 8;
const CHAPTERS = 4;

/** Takes out of a long page what only repeats, so that looking at everything that is left takes no minute. */
export const shorten = (page: Page): Promise<void> =>
  page.evaluate(
    ({ rows, chapters }) => {
      const cut = (within: ParentNode, selector: string, most: number) => {
        for (const each of [...within.querySelectorAll(selector)].slice(most)) each.remove();
      };
      cut(document, '.chapter', chapters);
      for (const list of document.querySelectorAll('tbody, dl, ul, ol'))
        cut(list, ':scope > *', rows);
      for (const main of document.querySelectorAll('main')) cut(main, '.section', rows * 2);
    },
    { rows: ROWS, chapters: CHAPTERS },
  );
