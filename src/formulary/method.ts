import type { Root } from 'mdast';
import { remark } from 'remark';
import remarkDirective from 'remark-directive';
import remarkGfm from 'remark-gfm';
import { visit } from 'unist-util-visit';

const processor = remark().use(remarkGfm).use(remarkDirective).freeze();

/**
 * Markdown with tables and text directives, as a tree whose places are places in `text`. A directive's name
 * begins with a letter, so that `10:30` and `1:1` stay what they are.
 */
export function parseMethod(text: string): Root {
  const root = processor.parse(text);
  visit(root, 'textDirective', (node, index, parent) => {
    if (!/^\d/.test(node.name) || !parent || index === undefined || !node.position) return;
    const { start, end } = node.position;
    parent.children[index] = {
      type: 'text',
      value: text.slice(start.offset, end.offset),
      position: node.position,
    };
  });
  return root;
}
