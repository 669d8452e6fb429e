import type { Chapter } from './chapters.ts';
import { type Attribute, attributesOf, htmlPieces, type Piece } from './html-tags.ts';

/** What can only be used on a screen, or only where its script runs. */
const LEFT_OUT = new Set(['script', 'noscript', 'template', 'form', 'search', 'button']);
const LEFT_OUT_CLASSES = /(?:^|\s)(?:screen|sizes)(?:\s|$)/;
/** Attributes that name ids. */
const NAMING_IDS = new Set(['for', 'headers', 'list', 'aria-labelledby', 'aria-describedby']);

/**
 * A page of the handbook as a chapter of the one document: what stands in its `main`, one rank of headings lower,
 * its ids made unique by the id of the chapter, its links turned to places in the document where there are such.
 *
 * @param html The whole page, its addresses still counted from the root.
 * @param chapters All chapters of the document by the name of their page.
 * @throws Error for a page without a `main`, or one that is not closed tag by tag.
 */
export function chapterHtml(
  html: string,
  chapter: Chapter,
  chapters: ReadonlyMap<string, Chapter>,
): string {
  const written: string[] = [];
  // how many elements of what is left out are open
  let leftOut = 0;
  for (const piece of htmlPieces(mainOf(html, chapter.page))) {
    if (leftOut > 0) {
      if (piece.kind === 'open' && !piece.empty) leftOut++;
      else if (piece.kind === 'close') leftOut--;
    } else if (piece.kind === 'open') {
      const tag = opened(piece, chapter, chapters);
      if (tag !== null) written.push(tag);
      else if (!piece.empty) leftOut = 1;
    } else written.push(piece.kind === 'close' ? `</${lowered(piece.name)}>` : piece.raw);
  }
  return written.join('');
}

type Opening = Extract<Piece, { readonly kind: 'open' }>;

function mainOf(html: string, page: string): string {
  const start = /<main[\s>]/.exec(html)?.index ?? -1;
  const end = html.lastIndexOf('</main>');
  if (start < 0 || end < start) throw new Error(`${page} has no <main> to print`);
  return html.slice(html.indexOf('>', start) + 1, end);
}

/** Attributes that decide anything here; all others stay as they are. */
const TELLING =
  /\s(?:id|href|for|headers|list|hidden|aria-(?:labelledby|describedby)|data-pagefind)|url\(#|\b(?:screen|sizes)\b/;

/** A start tag as the chapter has it; `null` where its element is left out. */
function opened(
  { name, attributes, empty, raw }: Opening,
  chapter: Chapter,
  chapters: ReadonlyMap<string, Chapter>,
): string | null {
  if (LEFT_OUT.has(name)) return null;
  const isFolded = name === 'details';
  const isHeading = /^h[1-5]$/.test(name);
  if (!isFolded && !isHeading && !TELLING.test(attributes)) return raw;
  const given = attributesOf(attributes);
  if (given.some(leavesOut)) return null;
  const kept = given
    .filter((attribute) => !isDropped(name, attribute))
    .map((attribute) => ({ ...attribute, value: moved(attribute, chapter, chapters) }));
  // what is folded away on a screen cannot be unfolded on paper
  if (isFolded && !kept.some((attribute) => attribute.name === 'open')) {
    kept.push({ name: 'open', value: null });
  }
  const written = kept.map((attribute) => ` ${attribute.name}${quoted(attribute.value)}`).join('');
  return `<${lowered(name)}${written}${empty && raw.endsWith('/>') ? '/' : ''}>`;
}

/** What the search reads; and three hundred regions of a few names would help nobody to find the way. */
const isDropped = (tag: string, { name }: Attribute) =>
  name.startsWith('data-pagefind') || (tag === 'section' && name === 'aria-labelledby');

const leavesOut = ({ name, value }: Attribute) =>
  (name === 'hidden' && value !== 'until-found') ||
  (name === 'class' && LEFT_OUT_CLASSES.test(value ?? ''));

function moved(
  { name, value }: Attribute,
  chapter: Chapter,
  chapters: ReadonlyMap<string, Chapter>,
): string | null {
  if (value === null) return null;
  const prefixed = (id: string) => `${chapter.id}--${id}`;
  if (name === 'id') return prefixed(value);
  if (name === 'href') return placeOf(value, chapter.page, chapters);
  if (NAMING_IDS.has(name)) return value.trim().split(/\s+/).map(prefixed).join(' ');
  return value.replace(/url\(#([^)]+)\)/g, (_, to: string) => `url(#${prefixed(to)})`);
}

const quoted = (value: string | null) =>
  value === null ? '' : value.includes('"') ? `='${value}'` : `="${value}"`;

/** The document has one first heading, and it is on the cover. */
const lowered = (name: string) => (/^h[1-5]$/.test(name) ? `h${Number(name[1]) + 1}` : name);

function placeOf(href: string, page: string, chapters: ReadonlyMap<string, Chapter>): string {
  const [path = '', anchor] = href.split('#');
  const target = path === '' ? page : path.replace(/^\//, '');
  const chapter = chapters.get(target);
  if (!chapter || anchor?.includes('=')) return href;
  return anchor ? `#${chapter.id}--${anchor}` : `#${chapter.id}`;
}
