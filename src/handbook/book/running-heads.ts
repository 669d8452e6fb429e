import type { Chapter } from './chapters.ts';

export interface HeadWords {
  /** On the outer edge of every head. */
  readonly shop: string;
  /** At the foot of every page. */
  readonly edition: string;
  /** Between the number of a page and that of all. */
  readonly of: string;
}

/**
 * Style sheet with a named page for every chapter, because browsers print no named strings: the head of each page
 * then says which chapter it belongs to, and a chapter begins on a page of its own.
 */
export function runningHeads(
  chapters: readonly Pick<Chapter, 'id' | 'title' | 'across'>[],
  { shop, edition, of }: HeadWords,
): string {
  const general = `@page{@top-right{content:${quoted(shop)}}@bottom-left{content:${quoted(edition)}}@bottom-right{content:counter(page) ${quoted(` ${of} `)} counter(pages)}}`;
  const own = chapters.map(
    ({ id, title, across }, index) =>
      `@page chapter-${index + 1}{${across ? 'size:landscape;' : ''}@top-left{content:${quoted(title)}}}\n#${escaped(id)}{page:chapter-${index + 1}}`,
  );
  return `${[general, ...own].join('\n')}\n`;
}

/** A CSS string of any text: everything but plain letters and digits as its code point. */
const quoted = (text: string) => `"${text.replace(/[^\p{L}\p{N} .,]/gu, code)}"`;

/** A CSS identifier of an id, which can begin with anything. */
const escaped = (id: string) => id.replace(/^\d|[^\p{L}\p{N}-]/gu, code);

const code = (character: string) => `\\${character.codePointAt(0)?.toString(16)} `;
