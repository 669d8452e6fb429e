import { z } from 'zod';
import { didYouMean } from '../reference/nearest.ts';
import type { Path, Report } from './report.ts';
import { type Frontmatter, type FrontmatterKey, frontmatterSchema } from './schema.ts';
import type { Refusal } from './schema-values.ts';

/**
 * Holds each key of the frontmatter against the schema by itself, so that a slip in one does not hide what
 * is wrong in another. Returns the keys that are sound.
 */
export function checkSchema(
  value: Readonly<Record<string, unknown>>,
  report: Report,
): Partial<Frontmatter> {
  const sound: Record<string, unknown> = {};
  for (const key of Object.keys(value)) {
    if (!Object.hasOwn(frontmatterSchema.shape, key))
      reportUnknownKey([key], frontmatterSchema, report);
  }
  for (const key of Object.keys(frontmatterSchema.shape) as FrontmatterKey[]) {
    const result = frontmatterSchema.shape[key].safeParse(value[key]);
    if (result.success) {
      if (result.data !== undefined) sound[key] = result.data;
    } else {
      for (const issue of result.error.issues)
        reportIssue(issue, [key, ...issue.path], value, report);
    }
  }
  return sound;
}

function reportIssue(
  issue: z.core.$ZodIssue,
  issuePath: readonly PropertyKey[],
  root: unknown,
  report: Report,
) {
  const path = issuePath as Path;
  const input = valueAt(root, path);
  const last = path.at(-1);
  const key = typeof last === 'number' ? `entry ${last + 1}` : String(last);
  if (issue.code === 'custom') {
    const refusal = issue.params?.refusal as Refusal;
    report.in(path, refusal.rule, refusal);
  } else if (issue.code === 'unrecognized_keys') {
    for (const name of issue.keys) reportUnknownKey([...path, name], schemaAt(path), report);
  } else if (input === undefined || input === null) {
    const rows = typeof path.at(-2) === 'number';
    report.in(path, 'formula/missing-key', {
      found:
        input === null ? `${key} without a value` : `no "${key}"${rows ? ' in this entry' : ''}`,
      expected: expectedAt(issue),
      advice: input === null ? 'give it a value or take it out' : `add "${key}"`,
    });
  } else if (typeof input === 'number' && !Number.isFinite(input)) {
    // told by the check of how numbers are written
  } else if (issue.code === 'invalid_value') {
    const choices = issue.values.map(String);
    report.in(path, 'formula/unknown-word', {
      found: `${key} "${String(input)}"`,
      expected: `one of ${choices.join(', ')}`,
      advice: typeof input === 'string' ? didYouMean(input, choices, '') : '',
    });
  } else {
    report.in(path, 'formula/wrong-type', {
      found: `${key} ${describe(input)}`,
      expected: expectedAt(issue),
      advice: adviceForType(input, issue),
    });
  }
}

function reportUnknownKey(path: Path, schema: z.ZodType, report: Report) {
  const name = String(path.at(-1));
  const keys = schema instanceof z.ZodObject ? Object.keys(schema.shape) : [];
  report.inKey(path, 'formula/unknown-key', {
    found: `key "${name}"`,
    expected: `one of ${keys.join(', ')}`,
    advice: adviceForKey(name, keys),
  });
}

/** Inside braces a comma ends a value, and what follows it becomes a key. */
function adviceForKey(name: string, keys: readonly string[]): string {
  if (/^\d+$/.test(name)) return 'write decimals with a point, 2.5';
  if (name.includes(' ')) return 'put a text with a comma in quotes';
  return didYouMean(name, keys, '');
}

function schemaAt(path: Path): z.ZodType {
  let schema: z.ZodType = frontmatterSchema;
  for (const step of path) {
    while (schema instanceof z.ZodOptional) schema = schema.unwrap() as z.ZodType;
    if (schema instanceof z.ZodObject) schema = schema.shape[step] as z.ZodType;
    else if (schema instanceof z.ZodArray) schema = schema.element as z.ZodType;
  }
  while (schema instanceof z.ZodOptional) schema = schema.unwrap() as z.ZodType;
  return schema;
}

function valueAt(root: unknown, path: Path): unknown {
  return path.reduce<unknown>(
    (value, step) => (value as Record<string | number, unknown> | undefined)?.[step],
    root,
  );
}

const TYPE_WORDS: Readonly<Record<string, string>> = {
  string: 'text',
  number: 'a number',
  array: 'a list',
  object: 'keys with values, as { key: value }',
};

function expectedAt(issue: z.core.$ZodIssue): string {
  if (issue.code === 'invalid_value') return `one of ${issue.values.map(String).join(', ')}`;
  return issue.code === 'invalid_type' ? (TYPE_WORDS[issue.expected] ?? issue.expected) : 'a value';
}

function describe(input: unknown): string {
  if (Array.isArray(input)) return 'with a list';
  if (typeof input === 'object') return 'with keys of its own';
  return typeof input === 'string' ? `"${input}" (text)` : `${String(input)} (${typeof input})`;
}

function adviceForType(input: unknown, issue: z.core.$ZodIssue): string {
  if (issue.code !== 'invalid_type') return '';
  if (issue.expected === 'string' && typeof input !== 'object')
    return `put it in quotes, "${String(input)}"`;
  if (issue.expected === 'number' && typeof input === 'string') {
    const number = /-?\d+(?:\.\d+)?/.exec(input.replace(',', '.'));
    return number ? `write ${number[0]}, without quotes or unit` : '';
  }
  return '';
}
