import { byCodePoint } from './code-points.ts';
import type { IndexedWord } from './index-format.ts';

/** The words of one chunk that begin with `start`. `words` is in the order of code points. */
export function wordsStarting(
  words: readonly IndexedWord[],
  start: string,
): readonly IndexedWord[] {
  const first = placeOf(words, start);
  let end = first;
  while (words[end]?.word.startsWith(start)) end++;
  return words.slice(first, end);
}

/** The word itself, if the chunk has it. */
export function exactWord(words: readonly IndexedWord[], word: string): IndexedWord | undefined {
  const found = words[placeOf(words, word)];
  return found?.word === word ? found : undefined;
}

/** Place of the first word that is not before `word`. */
function placeOf(words: readonly IndexedWord[], word: string): number {
  let low = 0;
  let high = words.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (byCodePoint(words[middle]?.word ?? '', word) < 0) low = middle + 1;
    else high = middle;
  }
  return low;
}
