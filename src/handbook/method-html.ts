import type { Element, Root as HastRoot, Nodes } from 'hast';
import { defaultSchema, type Schema, sanitize } from 'hast-util-sanitize';
import { toHtml } from 'hast-util-to-html';
import { remark } from 'remark';
import remarkRehype, { type Options } from 'remark-rehype';
import { visit } from 'unist-util-visit';
import type { BatchDocument } from '../formulary/document.ts';
import type { Formula } from '../formulary/formula.ts';
import { isMethodHeading } from '../formulary/method-heading.ts';
import { amountText } from './amounts.ts';

interface TextDirective {
  readonly name: string;
  readonly children: readonly { readonly value?: string }[];
}

/** Only what a bench text needs; everything else is dropped, should the reader ever let it through. */
const ALLOWED: Schema = {
  ...defaultSchema,
  attributes: {
    a: ['href'],
    b: [['className', 'amount']],
    img: ['src', 'alt'],
    ol: ['start'],
    li: ['value'],
    th: ['align'],
    td: ['align'],
  },
  protocols: { href: ['http', 'https', 'mailto'], src: [] },
  clobberPrefix: '',
};

/**
 * The text of a formula as safe HTML, with its directives turned into the amounts of one batch and its
 * headings one level down; without a batch they become the words `unstated`. Raw HTML is never passed through. Throws where a directive names nothing of the
 * formula: the reader has refused those, so one here is a fault of the program.
 */
export function methodHtml(
  formula: Formula,
  batch: BatchDocument | null,
  unstated?: string,
): string {
  const text = (node: TextDirective) => {
    const label = node.children.map(({ value }) => value ?? '').join('');
    const amount = amountText(node.name, label, formula, batch, unstated);
    if (amount === null) throw new Error(`${formula.file}: nothing to print for :${node.name}`);
    return amount;
  };
  const textDirective = (_state: unknown, node: TextDirective): Element => ({
    type: 'element',
    tagName: 'b',
    properties: { className: ['amount'] },
    children: [{ type: 'text', value: text(node) }],
  });
  // the plugin's types list only the nodes of plain Markdown
  const options: Options = { handlers: { textDirective } as Options['handlers'] & object };
  const tree: HastRoot = remark().use(remarkRehype, options).runSync(formula.method);
  dropMethodHeading(tree);
  visit(tree, 'element', (element: Element) => {
    adjust(element);
  });
  return toHtml(sanitize(tree as Nodes, ALLOWED));
}

/** The page has a heading of its own for the method. */
function dropMethodHeading(tree: HastRoot): void {
  const at = tree.children.findIndex(({ type }) => type === 'element');
  const first = tree.children[at];
  if (first?.type !== 'element' || first.tagName !== 'h2') return;
  const [text] = first.children;
  if (text?.type === 'text' && isMethodHeading(text.value)) tree.children.splice(at, 1);
}

function adjust(element: Element): void {
  const { properties } = element;
  if (element.tagName === 'a' && String(properties.href).startsWith('formula:')) {
    properties.href = `/formulas/${String(properties.href).slice('formula:'.length)}.html`;
  }
  if (element.tagName === 'img') properties.src = `/formulas/${String(properties.src)}`;
  // the page's own headings are h1 and h2, so the text starts at h3
  const level = /^h([2-5])$/.exec(element.tagName)?.[1];
  if (level) element.tagName = `h${Number(level) + 1}`;
}

/** Addresses of the pictures that formula texts show, relative to the formulas folder. */
export function picturesOf(formula: Formula): readonly string[] {
  const found: string[] = [];
  visit(formula.method, 'image', ({ url }) => {
    found.push(url);
  });
  return found;
}
