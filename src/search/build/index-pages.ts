import { close, createIndex } from 'pagefind';
import { byCodePoint } from '../reader/code-points.ts';
import type { IndexFile } from './data-kinds.ts';

export interface Page {
  /** Path from the root of the site, `formulas/QY-001.html`. */
  readonly path: string;
  readonly html: string;
}

/** More pages than this share files, so that a large handbook does not become a folder of thousands of files. */
const MOST_TEXT_FILES = 200;

/**
 * Indexes the pages that carry `data-pagefind-body`, in the order of their paths, so that the same pages give the
 * same bytes. Gives all files that Pagefind makes, programs included. Throws with Pagefind's own words where a page cannot be indexed.
 */
export async function indexPages(pages: readonly Page[]): Promise<readonly IndexFile[]> {
  try {
    const { index, errors } = await createIndex({
      // drawings and equations have no words that anybody looks for
      excludeSelectors: ['svg', 'math'],
      keepIndexUrl: true,
      maxFragments: MOST_TEXT_FILES,
    });
    if (!index) throw new Error(`No search index: ${errors.join('; ')}`);
    for (const { path, html } of pages.toSorted((a, b) => byCodePoint(a.path, b.path))) {
      const { errors } = await index.addHTMLFile({ url: path, content: html });
      if (errors.length > 0) throw new Error(`${path} cannot be indexed: ${errors.join('; ')}`);
    }
    const { files, errors: late } = await index.getFiles();
    if (late.length > 0) throw new Error(`No search index: ${late.join('; ')}`);
    return files;
  } finally {
    await close();
  }
}
