import type { z } from 'zod';
import type { DataRule } from '../words/en/problems-data.ts';
import { didYouMean } from './nearest.ts';
import type { DataReport, ProblemParts } from './report.ts';

/** What a check inside a schema says: put in the `params` of a custom issue. */
export interface SchemaRule extends ProblemParts {
  readonly rule: DataRule;
}

/** Parses with a schema and reports everything that does not fit. `null` where anything does not. */
export function fit<T>(schema: z.ZodType<T>, value: unknown, report: DataReport): T | null {
  const result = schema.safeParse(value, { reportInput: true });
  if (result.success) return result.data;
  for (const issue of result.error.issues) describe(issue, schema, report);
  return null;
}

function describe(issue: z.core.$ZodIssue, schema: z.ZodType, report: DataReport): void {
  const { path, input } = issue;
  switch (issue.code) {
    case 'unrecognized_keys':
      for (const key of issue.keys) {
        const known = keysAt(schema, path);
        report.inKey([...path, key], 'data/unknown-key', {
          found: `key ${shown(key)}`,
          expected: `one of ${known.join(', ')}`,
          // a comma ends a text inside braces, and what follows it looks like a key
          advice: key.includes(' ')
            ? 'put a text with a comma in quotes'
            : didYouMean(key, known, 'remove it'),
        });
      }
      return;
    case 'invalid_type': {
      if (input === undefined) {
        report.in(path.slice(0, -1), 'data/missing-key', {
          found: `no key "${String(path.at(-1))}"`,
          expected: issue.expected === 'array' ? 'a list' : phrase(issue.expected),
          advice: 'add it',
        });
        return;
      }
      report.in(path, 'data/wrong-type', {
        found: shown(input),
        expected: phrase(issue.expected),
        advice: 'write it in that form',
      });
      return;
    }
    case 'invalid_value': {
      const words = issue.values.map(String);
      if (input === undefined) {
        report.in(path.slice(0, -1), 'data/missing-key', {
          found: `no key "${String(path.at(-1))}"`,
          expected: `one of ${words.join(', ')}`,
          advice: 'add it',
        });
        return;
      }
      report.in(path, 'data/unknown-word', {
        found: shown(input),
        expected: words.length === 1 ? `${words[0]}` : `one of ${words.join(', ')}`,
        advice: didYouMean(String(input), words, 'use one of these'),
      });
      return;
    }
    case 'too_small':
    case 'too_big': {
      const end = issue.code === 'too_small' ? issue.minimum : issue.maximum;
      const word = issue.code === 'too_small' ? 'at least' : 'at most';
      const isNumber = typeof input === 'number';
      report.in(path, isNumber ? 'data/out-of-range' : 'data/text-form', {
        found: Array.isArray(input) ? `a list of ${input.length}` : shown(input),
        expected: `${issue.inclusive === false ? 'a number beyond' : word} ${end}${isNumber ? '' : Array.isArray(input) ? ' entries' : ' letters'}`,
        advice: isNumber ? 'check the digits and the unit' : 'check the length',
      });
      return;
    }
    case 'custom': {
      const { rule, ...parts } = issue.params as SchemaRule & Record<string, unknown>;
      report.in(path, rule, parts);
      return;
    }
    default:
      report.in(path, 'data/wrong-type', {
        found: shown(input),
        expected: 'another form',
        advice: issue.message,
      });
  }
}

/** The keys that the object at a path may have. */
function keysAt(schema: z.ZodType, path: readonly PropertyKey[]): readonly string[] {
  let at: unknown = schema;
  for (const step of ['', ...path]) {
    if (step !== '') at = child(at, step);
    at = unwrapped(at);
  }
  const shape = definition(at)?.shape;
  return typeof shape === 'object' && shape !== null ? Object.keys(shape) : [];
}

function child(schema: unknown, step: PropertyKey): unknown {
  const { shape, element, valueType } = definition(schema) ?? {};
  if (typeof shape === 'object' && shape !== null) return Reflect.get(shape, step);
  return element ?? valueType;
}

function unwrapped(schema: unknown): unknown {
  let at = schema;
  for (;;) {
    const inner = definition(at)?.innerType ?? definition(at)?.in;
    if (inner === undefined) return at;
    at = inner;
  }
}

function definition(schema: unknown): Readonly<Record<string, unknown>> | undefined {
  return (schema as { _zod?: { def: Readonly<Record<string, unknown>> } } | undefined)?._zod?.def;
}

const PHRASES: Readonly<Record<string, string>> = {
  string: 'a text',
  number: 'a number',
  int: 'a whole number',
  boolean: 'true or false',
  array: 'a list',
  object: 'keys with values',
  record: 'keys with values',
  tuple: 'a pair of numbers',
};
const phrase = (type: string) => PHRASES[type] ?? type;

function shown(input: unknown): string {
  if (typeof input === 'string') {
    return `"${input.length > 60 ? `${input.slice(0, 60)}…` : input}"`;
  }
  if (input === null || input === undefined) return 'nothing';
  if (Array.isArray(input)) return 'a list';
  return typeof input === 'object' ? 'keys with values' : String(input);
}
