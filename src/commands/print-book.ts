import type { Page } from 'playwright-core';
import { getDocumentProxy } from 'unpdf';

export const PAPERS = ['A4', 'Letter'] as const;
export type Paper = (typeof PAPERS)[number];

/** How often the contents may push the chapters on before the numbers count as restless. */
const MOST_ROUNDS = 3;

/**
 * The opened `print.html` as a PDF file whose contents name pages. Browsers cannot count the page of a link while
 * they lay it out, so it is printed, the numbers are read from the file, written into the contents, and it is
 * printed again, until the numbers are those of the file that they stand in.
 *
 * @throws Error where a chapter has no page or the numbers never agree.
 */
export async function printBook(page: Page, paper: Paper): Promise<Uint8Array> {
  let written: readonly string[] = [];
  for (let round = 0; round <= MOST_ROUNDS; round += 1) {
    const file = await page.pdf({
      format: paper,
      preferCSSPageSize: true,
      printBackground: true,
      outline: true,
      tagged: true,
    });
    const chapters = await page
      .locator('.leaf')
      .evaluateAll((leaves) => leaves.map((leaf) => leaf.getAttribute('data-chapter') ?? ''));
    const numbers = await pageNumbers(file, chapters);
    if (numbers.every((number, index) => number === written[index])) return file;
    await page.evaluate((found) => {
      document.getElementById('no-numbers')?.remove();
      for (const [index, leaf] of [...document.querySelectorAll('.leaf')].entries()) {
        leaf.textContent = found[index] ?? '';
      }
    }, numbers);
    written = numbers;
  }
  throw new Error('the page numbers of the contents did not come to rest');
}

/** The page that each chapter begins on, counted from 1. */
async function pageNumbers(file: Uint8Array, chapters: readonly string[]): Promise<string[]> {
  // the reader takes the bytes for itself
  const document = await getDocumentProxy(Uint8Array.from(file));
  try {
    const numbers: string[] = [];
    for (const chapter of chapters) {
      const place = await document.getDestination(chapter);
      if (!place) throw new Error(`no page of the file is where ${chapter} begins`);
      numbers.push(String((await document.getPageIndex(place[0])) + 1));
    }
    return numbers;
  } finally {
    await document.destroy();
  }
}
