import { readdirSync } from 'node:fs';
import { describe, expect, test } from 'vitest';

const folder = new URL('../../src/words/', import.meta.url);
const topics = readdirSync(new URL('es/', folder)).filter((name) => name.endsWith('.ts'));

describe.each(topics)('es/%s', (topic) => {
  test('has every phrase of the English topic, with its figures and its symbols', async () => {
    const english = await import(new URL(`en/${topic}`, folder).href);
    const spanish = await import(new URL(`es/${topic}`, folder).href);
    const compared = Object.keys(spanish).flatMap((name) =>
      differences(english[name], spanish[name], name),
    );
    expect(compared).toEqual([]);
  });
});

/** What differs between two phrases, or two collections of phrases, of two languages. */
function differences(english: unknown, spanish: unknown, path: string): readonly string[] {
  if (typeof english !== typeof spanish) return [`${path}: ${english} | ${spanish}`];
  if (typeof english === 'string') {
    if (SAYS_MORE.includes(path)) return [];
    return figures(english) === figures(spanish) ? [] : [`${path}: ${english} | ${spanish}`];
  }
  if (typeof english === 'function') return spoken(english as Phrase, spanish as Phrase, path);
  if (typeof english !== 'object' || english === null) {
    return Object.is(english, spanish) ? [] : [path];
  }
  const [ours, theirs] = [keysOf(english), keysOf(spanish)];
  if (ours.join() !== theirs.join()) return [`${path}: ${ours} | ${theirs}`];
  return [
    ...(path.endsWith('.symbols') ? symbolsDiffer(english, spanish, path) : []),
    ...ours.flatMap((key) => differences(at(english, key), at(spanish, key), `${path}.${key}`)),
  ];
}

type Phrase = (...given: readonly unknown[]) => unknown;

const keysOf = (value: unknown) => Object.keys(value as object).sort();
const at = (value: unknown, key: string) => (value as Record<string, unknown>)[key];

const figures = (text: unknown) => (String(text).match(/\d+(?:\.\d+)?/g) ?? []).sort().join(' ');

function symbolsDiffer(english: unknown, spanish: unknown, path: string): readonly string[] {
  const first = (rows: unknown) => (rows as readonly string[][]).map(([symbol]) => symbol).join();
  return first(english) === first(spanish) ? [] : [`${path}: ${first(spanish)}`];
}

const DAY = '2026-11-30';

const PENDING = {
  formula: { code: 'QY-014', name: 'Harbour Lamp', revision: 3 },
  fingerprint: '4f2a-91c0-7be3',
  stateBefore: 'changed-since-approval',
  last: { revision: 2, fingerprint: '7be3-4f2a-91c0', by: 'QA lead', on: DAY },
  moves: [{ part: 'water', id: 'water', at: null, before: 290.5, after: 296.75 }],
};

/** The numbers and dates of a caution, each number of its own. */
const facts = new Proxy(
  {},
  {
    get: (_, name) => (name === 'on' || name === 'retestBy' ? DAY : 3 + String(name).length),
  },
);

// one of these is what a phrase takes in the place
const PLAIN: readonly ((place: number) => unknown)[] = [
  (place) => 2 + place * 7,
  () => 1,
  () => DAY,
  (place) => [`L${place}`, `M${place}`],
];
const KINDS = [
  ...PLAIN,
  () => [0.5],
  () => [0.5, 5],
  () => [{ name: 'olive', share: 62.5 }],
  () => facts,
  () => PENDING,
];

/** Phrases that say more in Spanish: a slip in the source of their wording is mended and named there. */
const SAYS_MORE = ['hazardWords.source'];

/** Says both phrases with all that the English one can be said with, and compares what comes out. */
function spoken(english: Phrase, spanish: Phrase, path: string): readonly string[] {
  const tried = samples(english.length).flatMap((given) => {
    const said = attempt(english, given);
    return said === null ? [] : [differences(said, attempt(spanish, given), path)];
  });
  if (tried.length === 0) return [`${path}: cannot be said with any of the samples`];
  return tried.find((found) => found.length > 0) ?? [];
}

function samples(places: number): readonly (readonly unknown[])[] {
  const sizes: readonly (readonly unknown[])[] = [[]];
  const kinds = places > 2 ? PLAIN : KINDS;
  return Array.from({ length: places }).reduce<readonly (readonly unknown[])[]>(
    (begun, _, place) => begun.flatMap((given) => kinds.map((kind) => [...given, kind(place)])),
    sizes,
  );
}

function attempt(phrase: Phrase, given: readonly unknown[]): unknown {
  try {
    return phrase(...given);
  } catch {
    return null;
  }
}
