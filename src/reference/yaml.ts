import {
  type Document,
  isAlias,
  isMap,
  isNode,
  isPair,
  isScalar,
  LineCounter,
  type Node,
  parseDocument,
  visit,
} from 'yaml';

/** 1-based, in the whole file. */
export interface Place {
  readonly line: number;
  readonly column: number;
}

/** `['fats', 0, 'share']`. */
export type YamlPath = readonly PropertyKey[];

/** Why a text could not be taken as it stands; the caller gives it its rule id. */
export interface YamlFault extends Place {
  readonly kind: 'syntax' | 'tab' | 'duplicate-key' | 'anchor';
  readonly found: string;
  readonly expected: string;
  readonly advice: string;
}

export interface ReadYaml {
  /** Plain value; `null` where there are faults. */
  readonly value: unknown;
  readonly faults: readonly YamlFault[];
  /** Where the value of a path stands; where it is absent, the nearest that holds it. */
  readonly placeOf: (path: YamlPath) => Place;
  /** Where the key at the end of a path stands; as `placeOf` where there is none. */
  readonly placeOfKey: (path: YamlPath) => Place;
  /** The characters that the scalar at a path was written with: `0x10`, `"5"`, `1e3`. */
  readonly writtenAt: (path: YamlPath) => string | null;
}

/**
 * Reads one YAML 1.2 document and remembers where everything stands. Never throws.
 *
 * `firstLine` is the line of the file on which `text` begins, for frontmatter. Anchors, aliases and merge
 * keys are faults: no file needs them, and a few lines of them can unfold into gigabytes.
 */
export function parseYaml(text: string, { firstLine = 1 }: { firstLine?: number } = {}): ReadYaml {
  const lines = new LineCounter();
  const placeAt = (offset: number): Place => {
    const { line, col } = lines.linePos(offset);
    return { line: Math.max(1, line) + firstLine - 1, column: Math.max(1, col) };
  };
  const document = parseDocument(text, {
    lineCounter: lines,
    prettyErrors: false,
    version: '1.2',
  });
  const faults = [
    ...firstOfEachKind(document.errors).map((error) => ({
      ...placeAt(error.pos[0]),
      ...describe(error),
    })),
    ...forbidden(document, placeAt),
  ];
  const start = placeAt(isNode(document.contents) ? (document.contents.range?.[0] ?? 0) : 0);
  if (faults.length > 0) return failed(faults, start);
  const offsetOf = (node: unknown) => (isNode(node) && node.range ? node.range[0] : null);
  const placeOf = (path: YamlPath): Place => {
    for (let length = path.length; length > 0; length--) {
      const part = path.slice(0, length);
      const node = document.getIn(part, true);
      // an empty value has no place of its own: its key has, but an empty entry of a list has no key
      const inMap = isMap(document.getIn(part.slice(0, -1), true));
      if (isScalar(node) && node.source === '' && inMap) return placeOfKey(part);
      const offset = offsetOf(node);
      if (offset !== null) return placeAt(offset);
    }
    return start;
  };
  const placeOfKey = (path: YamlPath): Place => {
    const parent = document.getIn(path.slice(0, -1), true);
    const key = path.at(-1);
    const pair = isMap(parent)
      ? parent.items.find((item) => isScalar(item.key) && String(item.key.value) === String(key))
      : undefined;
    const offset = offsetOf(pair?.key);
    return offset === null ? placeOf(path) : placeAt(offset);
  };
  return {
    value: document.toJS(),
    faults,
    placeOf,
    placeOfKey,
    writtenAt: (path) => {
      const node = document.getIn(path, true);
      const [from, to] = isScalar(node) && node.range ? node.range : [0, 0];
      return to > from ? text.slice(from, to) : null;
    },
  };
}

function failed(faults: readonly YamlFault[], start: Place): ReadYaml {
  return {
    value: null,
    faults,
    placeOf: () => start,
    placeOfKey: () => start,
    writtenAt: () => null,
  };
}

/** Duplicate keys each count; of slips in the writing only the first, since the rest follow from it. */
function firstOfEachKind<E extends { readonly code: string }>(errors: readonly E[]): readonly E[] {
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
function forbidden(document: Document.Parsed, placeAt: (offset: number) => Place): YamlFault[] {
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
