import { isMap, isScalar, parseDocument } from 'yaml';
import type { Formula } from '../formulary/formula.ts';
import { splitFrontmatter } from '../formulary/frontmatter.ts';

type Approval = NonNullable<Formula['approval']>;

const KEYS = ['by', 'on', 'review-by', 'fingerprint'] as const;

/**
 * The text of a formula file with another approval in it. Every other character stays: where there is an
 * approval only its four values change, otherwise one line is added at the end of the frontmatter, with the
 * line end that the file uses. `null` where the frontmatter has no place for it.
 */
export function writeApproval(text: string, approval: Approval): string | null {
  const parts = splitFrontmatter(text);
  if (!parts.ok) return null;
  const start = offsetOfLine(text, parts.yamlLine);
  const { contents } = parseDocument(parts.yaml);
  if (!isMap(contents) || contents.flow) return null;
  const values = [approval.by, approval.on, approval.reviewBy, approval.fingerprint].map(scalar);
  if (!contents.has('approval')) {
    const lineEnd = parts.yaml.endsWith('\r\n') ? '\r\n' : '\n';
    const members = KEYS.map((key, index) => `${key}: ${values[index]}`).join(', ');
    const end = start + parts.yaml.length;
    return `${text.slice(0, end)}approval: { ${members} }${lineEnd}${text.slice(end)}`;
  }
  const block = contents.get('approval');
  const splices = KEYS.map((key, index) => {
    const node = isMap(block) ? block.get(key, true) : null;
    return isScalar(node) && node.range
      ? { from: start + node.range[0], to: start + node.range[1], value: values[index] }
      : null;
  });
  let next = text;
  for (const splice of splices.toSorted((a, b) => (b?.from ?? 0) - (a?.from ?? 0))) {
    if (!splice) return null;
    next = next.slice(0, splice.from) + splice.value + next.slice(splice.to);
  }
  return next;
}

/** Plain where any reader of YAML takes it for the same text, otherwise in double quotes. */
function scalar(value: string): string {
  const plain = /^[\p{L}\d][\p{L}\d .'-]*$/u.test(value) && value.trim() === value;
  const other = /^(true|false|null|yes|no|on|off|y|n|\d[\d.e]*)$/i.test(value);
  return plain && !other ? value : JSON.stringify(value);
}

/** Of a 1-based line in the whole file, with a byte order mark counted. */
function offsetOfLine(text: string, line: number): number {
  const lines = text.split(/(?<=\n)/);
  return lines.slice(0, line - 1).reduce((sum, { length }) => sum + length, 0);
}
