import {
  type Document,
  isAlias,
  isNode,
  isPair,
  isScalar,
  type Node,
  type Scalar,
  visit,
} from 'yaml';
import { hiddenCharacters } from '../words/hidden-characters.ts';
import type { Place } from './yaml.ts';

/** Why a text could not be taken as it stands; the caller gives it its rule id. */
export interface YamlFault extends Place {
  readonly kind: 'syntax' | 'tab' | 'duplicate-key' | 'anchor' | 'hidden-character';
  readonly found: string;
  readonly expected: string;
  readonly advice: string;
}

/** What is wrong with a document as YAML, and what YAML allows and no file here needs. */
export function faultsOf(
  document: Document.Parsed,
  text: string,
  placeAt: (offset: number) => Place,
): readonly YamlFault[] {
  return [
    ...withoutConsequences(document.errors).map((error) => ({
      ...placeAt(error.pos[0]),
      ...describe(error),
    })),
    ...forbidden(document, text, placeAt),
  ];
}

/** Duplicate keys each count; of slips in the writing only the first, since the rest follow from it. */
function withoutConsequences<E extends { readonly code: string }>(
  errors: readonly E[],
): readonly E[] {
  const slip = errors.find(({ code }) => code !== 'DUPLICATE_KEY');
  return errors.filter((error) => error === slip || error.code === 'DUPLICATE_KEY');
}

function describe(error: {
  readonly code: string;
  readonly message: string;
}): Omit<YamlFault, 'line' | 'column'> {
  switch (error.code) {
    case 'RESOURCE_EXHAUSTION':
      return {
        kind: 'syntax',
        found: 'lists inside lists without end',
        expected: 'a few levels',
        advice: 'write the file as the others are written',
      };
    case 'MULTIPLE_DOCS':
      return {
        kind: 'syntax',
        found: 'a line "---" inside the file',
        expected: 'one document',
        advice: 'remove the line',
      };
    case 'DUPLICATE_KEY':
      return {
        kind: 'duplicate-key',
        found: 'a key that stands there twice',
        expected: 'each key once',
        advice: 'remove one of the two',
      };
    case 'TAB_AS_INDENT':
      return {
        kind: 'tab',
        found: 'a tab at the start of a line',
        expected: 'spaces',
        advice: 'replace the tab with two spaces',
      };
    default:
      return {
        kind: 'syntax',
        found: `text that cannot be read as YAML (${error.message.replace(/\s+/g, ' ')})`,
        expected: 'keys, values and lists',
        advice: 'look for a missing quote, bracket, colon or space just before this place',
      };
  }
}

/** What YAML allows and no file here needs. */
function forbidden(
  document: Document.Parsed,
  text: string,
  placeAt: (offset: number) => Place,
): YamlFault[] {
  const faults: YamlFault[] = [];
  const anchor = (node: Node, found: string) => {
    faults.push({
      ...placeAt(node.range?.[0] ?? 0),
      kind: 'anchor',
      found,
      expected: 'the value itself',
      advice: 'write the value out where it is needed',
    });
  };
  visit(document, (_, node) => {
    const escaped = isScalar(node) ? escapedCharacter(node, text) : undefined;
    if (escaped && isNode(node)) {
      faults.push({
        ...placeAt(node.range?.[0] ?? 0),
        kind: 'hidden-character',
        found: `an escape of the invisible character ${escaped}`,
        expected: 'text that can be seen',
        advice: 'take the escape out',
      });
    }
    if (isAlias(node)) anchor(node, `the alias "*${node.source}"`);
    else if (isPair(node)) {
      if (isScalar(node.key) && node.key.value === '<<') anchor(node.key, 'the merge key "<<"');
      else if (isNode(node.key) && !isScalar(node.key) && !isAlias(node.key)) {
        faults.push({
          ...placeAt(node.key.range?.[0] ?? 0),
          kind: 'syntax',
          found: 'a key that is a list',
          expected: 'a word',
          advice: 'write the key as one word before the colon',
        });
      }
    } else if (isNode(node) && 'anchor' in node && typeof node.anchor === 'string') {
      anchor(node, `the anchor "&${node.anchor}"`);
    }
  });
  return faults;
}

/** A character that cannot be seen and that the text of a file hides behind an escape, `"\\u202E"`. */
function escapedCharacter({ value, range }: Scalar, text: string): string | undefined {
  if (typeof value !== 'string' || !range) return undefined;
  const hidden = hiddenCharacters(value)[0]?.name;
  return hiddenCharacters(text.slice(range[0], range[1])).length > 0 ? undefined : hidden;
}
