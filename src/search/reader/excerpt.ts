import type { HitPlace } from './hit.ts';

/** A stretch of a page's text with the words that were looked for told apart. */
export interface Excerpt {
  readonly parts: readonly { readonly text: string; readonly found: boolean }[];
  /** Text was left out before or after. */
  readonly cutBefore: boolean;
  readonly cutAfter: boolean;
}

const EXCERPT_WORDS = 30;

/** The words of a page's text, numbered as the index numbers them. */
export const wordsOfText = (content: string): readonly string[] => content.split(/[^\S\uFEFF]+/g);

/** The stretch of `length` words in which the places say most; the beginning where there are none. */
export function excerptOf(
  content: string,
  places: readonly HitPlace[],
  length = EXCERPT_WORDS,
): Excerpt {
  const words = wordsOfText(content);
  const size = Math.min(length, words.length);
  const start = Math.max(0, Math.min(densestStart(places, length), words.length - size));
  const found = new Set(places.map(({ position }) => position));
  return {
    parts: words
      .slice(start, start + size)
      .map((text, i) => ({ text, found: found.has(start + i) })),
    cutBefore: start > 0,
    cutAfter: start + size < words.length,
  };
}

/** Where the densest window starts, less the one word that leads up to it; the middle one of equals in a row. */
function densestStart(places: readonly HitPlace[], length: number): number {
  const scores = new Map<number, number>();
  for (const { position, score } of places) {
    scores.set(position, (scores.get(position) ?? 0) + score);
  }
  const last = Math.max(-1, ...scores.keys());
  if (last < length) return 0;
  const at = (position: number) => scores.get(position) ?? 0;
  let sum = 0;
  for (let position = 0; position < length; position++) sum += at(position);
  let densest = sum;
  let starts = [0];
  for (let start = 0; start <= last; start++) {
    sum += at(start + length) - at(start);
    if (sum > densest) {
      densest = sum;
      starts = [start];
    } else if (sum === densest && starts.at(-1) === start - 1) {
      starts.push(start);
    }
  }
  return starts[starts.length >> 1] ?? 0;
}
