import type { Element, Root, RootContent } from 'hast';
import { fromHtml } from 'hast-util-from-html';

/** Attributes that are read out or shown. */
const SPOKEN = ['alt', 'ariaLabel', 'title', 'placeholder', 'dataHead', 'label'] as const;

/** Texts of a page that people read or hear, one for each piece; what is marked as English is left out. */
export function visibleTexts(html: string): readonly string[] {
  const found: string[] = [];
  const visit = (node: Root | RootContent): void => {
    if (node.type === 'text') found.push(node.value);
    if (node.type === 'element') {
      if (isHidden(node)) return;
      for (const name of SPOKEN) {
        const value = node.properties[name];
        if (typeof value === 'string') found.push(value);
      }
    }
    if ('children' in node) for (const child of node.children) visit(child as RootContent);
  };
  visit(fromHtml(html));
  return found.map((text) => text.replace(/\s+/g, ' ').trim()).filter((text) => text !== '');
}

const isHidden = ({ tagName, properties }: Element): boolean =>
  ['script', 'style', 'template'].includes(tagName) || properties.lang === 'en';
