import { excerptOf } from '../search/reader/excerpt.ts';
import type { Hit } from '../search/reader/hit.ts';
import type { Search } from '../search/reader/search.ts';
import { findWords } from '../words/en/find.ts';
import { addressOf } from './find-chunks.ts';
import { element } from './find-dom.ts';

/** The pages that have the words, each with the stretch of its text that says most. Rejects where a text is missing. */
export async function pageList(
  search: Search,
  hits: readonly Hit[],
  shown: number,
): Promise<{ readonly list: HTMLElement; readonly left: number }> {
  const entries = await Promise.all(
    hits.slice(0, shown).map(async (hit) => {
      const { url, content, meta } = await search.pageText(hit.page);
      return element(
        'li',
        {},
        element('a', { href: addressOf(url) }, meta.title ?? url),
        meta.code ? element('span', { class: 'code' }, ` ${meta.code}`) : null,
        excerpt(content, hit),
      );
    }),
  );
  return {
    list: element('ol', { class: 'find-pages' }, ...entries),
    left: hits.length - entries.length,
  };
}

function excerpt(content: string, { places }: Hit) {
  const { parts, cutBefore, cutAfter } = excerptOf(content, places());
  const words = parts.flatMap(({ text, found }) => [found ? element('mark', {}, text) : text, ' ']);
  return element(
    'p',
    {},
    cutBefore ? `${findWords.cut} ` : null,
    ...words,
    cutAfter ? findWords.cut : null,
  );
}
