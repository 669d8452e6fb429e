import { isMap, isNode, isScalar, LineCounter, parseDocument } from 'yaml';
import { faultsOf, type YamlFault } from './yaml-faults.ts';

/** 1-based, in the whole file. */
export interface Place {
  readonly line: number;
  readonly column: number;
}

/** `['fats', 0, 'share']`. */
export type YamlPath = readonly PropertyKey[];

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
  const faults = faultsOf(document, text, placeAt);
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
