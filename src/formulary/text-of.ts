import type { Node } from 'mdast';
import { visit } from 'unist-util-visit';

/** The words of a node, without their marking. */
export function textOf(node: Node): string {
  let text = '';
  visit(node, (inner) => {
    if ('value' in inner && typeof inner.value === 'string') text += inner.value;
  });
  return text;
}
