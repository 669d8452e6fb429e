import type { Root } from 'mdast';
import { remark } from 'remark';
import remarkDirective from 'remark-directive';
import remarkGfm from 'remark-gfm';

const processor = remark().use(remarkGfm).use(remarkDirective).freeze();

/** Markdown with tables and text directives, as a tree whose places are places in `text`. */
export function parseMethod(text: string): Root {
  return processor.parse(text);
}
