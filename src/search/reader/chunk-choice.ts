import { byCodePoint } from './code-points.ts';
import type { WordChunk } from './index-format.ts';

/** The chunks that can hold a word which begins with `start`. */
export const chunksOf = (chunks: readonly WordChunk[], start: string): readonly WordChunk[] =>
  chunks.filter(({ from, to }) => compareCommon(from, start) <= 0 && compareCommon(start, to) <= 0);

/** The chunks that can hold `word` itself, or stand where it would stand. */
export function chunksAround(chunks: readonly WordChunk[], word: string): readonly WordChunk[] {
  const strict = chunks.filter(
    ({ from, to }) => byCodePoint(from, word) <= 0 && byCodePoint(word, to) <= 0,
  );
  return strict.length > 0 ? strict : chunksOf(chunks, word);
}

/** Ends of chunks are cut short, so only as many letters as both have can be compared. */
function compareCommon(a: string, b: string): number {
  const length = Math.min(a.length, b.length);
  return byCodePoint(a.slice(0, length), b.slice(0, length));
}
