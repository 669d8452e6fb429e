import type { Element, ElementContent, Properties, Root } from 'hast';
import { fromHtml } from 'hast-util-from-html';
import { toHtml } from 'hast-util-to-html';
import { SKIP, visit } from 'unist-util-visit';
import type { Chapter } from './chapters.ts';

/** What can only be used on a screen, or only where its script runs. */
const LEFT_OUT = new Set(['script', 'noscript', 'template', 'form', 'search', 'button']);
/** Attributes that name ids, by their names in hast. */
const NAMING_IDS = ['htmlFor', 'headers', 'list', 'ariaLabelledBy', 'ariaDescribedBy'] as const;

/**
 * A page of the handbook as a chapter of the one document: what stands in its `main`, one rank of headings lower,
 * its ids made unique by the id of the chapter, its links turned to places in the document where there are such.
 *
 * @param html The whole page, its addresses still counted from the root.
 * @param chapters All chapters of the document by the name of their page.
 * @throws Error for a page without a `main`.
 */
export function chapterHtml(
  html: string,
  { page, id }: Chapter,
  chapters: ReadonlyMap<string, Chapter>,
): string {
  const main = mainOf(fromHtml(html));
  if (!main) throw new Error(`${page} has no <main> to print`);
  const prefixed = (name: string) => `${id}--${name}`;
  visit(main, 'element', (node, index, parent) => {
    if (isLeftOut(node) && parent && index !== undefined) {
      parent.children.splice(index, 1);
      return [SKIP, index];
    }
    node.tagName = lowered(node.tagName);
    const { properties } = node;
    // three hundred regions of a few names would help nobody to find the way
    if (node.tagName === 'section') delete properties.ariaLabelledBy;
    // what is folded away on a screen cannot be unfolded on paper
    if (node.tagName === 'details') properties.open = true;
    if (typeof properties.id === 'string') properties.id = prefixed(properties.id);
    if (typeof properties.href === 'string') {
      properties.href = placeOf(properties.href, page, chapters);
    }
    for (const name of NAMING_IDS) prefixAll(properties, name, prefixed);
    for (const [name, value] of Object.entries(properties)) {
      if (name.startsWith('dataPagefind')) delete properties[name];
      else if (typeof value === 'string') {
        properties[name] = value.replace(/url\(#([^)]+)\)/g, (_, to) => `url(#${prefixed(to)})`);
      }
    }
    return undefined;
  });
  return toHtml(main.children as ElementContent[], { allowDangerousHtml: false });
}

function mainOf(root: Root): Element | null {
  let found: Element | null = null;
  visit(root, 'element', (node) => {
    if (node.tagName === 'main') found = node;
  });
  return found;
}

function isLeftOut({ tagName, properties }: Element): boolean {
  const classes = Array.isArray(properties.className) ? properties.className : [];
  return (
    LEFT_OUT.has(tagName) ||
    properties.hidden === true ||
    classes.includes('screen') ||
    classes.includes('sizes')
  );
}

/** The document has one first heading, and it is on the cover. */
const lowered = (tag: string) =>
  tag.replace(/^h([1-5])$/, (_, rank: string) => `h${Number(rank) + 1}`);

function placeOf(href: string, page: string, chapters: ReadonlyMap<string, Chapter>): string {
  const [path = '', anchor] = href.split('#');
  const target = path === '' ? page : path.replace(/^\//, '');
  const chapter = chapters.get(target);
  if (!chapter || anchor?.includes('=')) return href;
  return anchor ? `#${chapter.id}--${anchor}` : `#${chapter.id}`;
}

function prefixAll(properties: Properties, name: string, prefixed: (id: string) => string): void {
  const value = properties[name];
  if (typeof value === 'string') properties[name] = value.split(/\s+/).map(prefixed).join(' ');
  else if (Array.isArray(value)) properties[name] = value.map((id) => prefixed(String(id)));
}
