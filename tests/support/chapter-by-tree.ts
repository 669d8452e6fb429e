import type { Element, ElementContent, Root } from 'hast';
import { fromHtml } from 'hast-util-from-html';
import { toHtml } from 'hast-util-to-html';
import { SKIP, visit } from 'unist-util-visit';
import type { Chapter } from '../../src/handbook/book/chapters.ts';

const LEFT_OUT = new Set(['script', 'noscript', 'template', 'form', 'search', 'button']);
const NAMING_IDS = ['htmlFor', 'headers', 'list', 'ariaLabelledBy', 'ariaDescribedBy'] as const;

/** What `chapterHtml` should say, by way of the tree that a browser would make of the page. */
export function chapterByTree(
  html: string,
  { page, id }: Chapter,
  chapters: ReadonlyMap<string, Chapter>,
): string {
  const main = mainOf(fromHtml(html));
  const prefixed = (name: unknown) => `${id}--${name}`;
  visit(main, 'element', (node, index, parent) => {
    const { properties } = node;
    const classes = Array.isArray(properties.className) ? properties.className : [];
    const isLeftOut =
      LEFT_OUT.has(node.tagName) ||
      properties.hidden === true ||
      classes.includes('screen') ||
      classes.includes('sizes');
    if (isLeftOut && parent && index !== undefined) {
      parent.children.splice(index, 1);
      return [SKIP, index];
    }
    node.tagName = node.tagName.replace(/^h([1-5])$/, (_, rank) => `h${Number(rank) + 1}`);
    if (node.tagName === 'section') delete properties.ariaLabelledBy;
    if (node.tagName === 'details') properties.open = true;
    if (properties.id !== undefined) properties.id = prefixed(properties.id);
    if (typeof properties.href === 'string') {
      const [path = '', anchor] = properties.href.split('#');
      const chapter = chapters.get(path === '' ? page : path.replace(/^\//, ''));
      if (chapter && !anchor?.includes('=')) {
        properties.href = anchor ? `#${chapter.id}--${anchor}` : `#${chapter.id}`;
      }
    }
    for (const name of NAMING_IDS) {
      const value = properties[name];
      if (value === undefined || value === null) continue;
      const ids = Array.isArray(value) ? value : String(value).split(/\s+/);
      Object.assign(properties, { [name]: ids.map(prefixed).join(' ') });
    }
    for (const [name, value] of Object.entries(properties)) {
      if (name.startsWith('dataPagefind')) delete properties[name];
      else if (typeof value === 'string') {
        properties[name] = value.replace(/url\(#([^)]+)\)/g, (_, to) => `url(#${prefixed(to)})`);
      }
    }
    return undefined;
  });
  return asTree(toHtml(main.children as ElementContent[]));
}

/** One way to write what a browser reads; comments are not read. */
export function asTree(html: string): string {
  const tree = fromHtml(html, { fragment: true });
  visit(tree, 'comment', (_, index, parent) => {
    if (!parent || index === undefined) return undefined;
    parent.children.splice(index, 1);
    return [SKIP, index];
  });
  return toHtml(tree);
}

function mainOf(root: Root): Element {
  let found: Element | undefined;
  visit(root, 'element', (node) => {
    if (node.tagName === 'main') found = node;
  });
  if (!found) throw new Error('no <main>');
  return found;
}
