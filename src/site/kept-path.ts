import { createHash } from 'node:crypto';
import { voice } from '../words/voice.ts';
import { commonInput } from './common-input.ts';
import { dataText } from './data-text.ts';

/** A path of a route whose page is kept from one build to the next. */
export interface KeptPath<Props> {
  readonly params: Readonly<Record<string, string>>;
  readonly props: Props;
  /** Hash of all that the page can read: its props, what every page may read, and how the handbook speaks. */
  readonly cacheKey: string;
}

/**
 * A path whose page need not be made again while all that it can read is the same. While such a page is made nothing
 * else can be read: `siteInput()` then throws.
 *
 * @param props Plain data that nothing changes any more.
 * @throws Error for props with a function in them, which no hash can stand for.
 */
export function keptPath<Props extends Readonly<Record<string, unknown>>>(
  params: Readonly<Record<string, string>>,
  props: Props,
): KeptPath<Props> {
  const hash = createHash('sha256').update(hashOf(commonInput())).update(hashOf(voice()));
  for (const [name, value] of Object.entries(props)) {
    hash.update(`${JSON.stringify(name)}:${hashOf(value)}\n`);
  }
  return { params, props, cacheKey: hash.digest('hex') };
}

/** Formulas and what they have in common are hashed once, though several pages are made from each. */
const known = new WeakMap<object, string>();

function hashOf(value: unknown): string {
  const isObject = typeof value === 'object' && value !== null;
  const before = isObject ? known.get(value) : undefined;
  if (before !== undefined) return before;
  const hash = createHash('sha256').update(dataText(value)).digest('hex');
  if (isObject) known.set(value, hash);
  return hash;
}
