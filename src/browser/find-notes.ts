import { findWords } from '../words/en/find.ts';
import { ChunkError } from './find-chunks.ts';
import { part } from './find-dom.ts';

type Note = 'find-broken' | 'find-ignored' | 'find-words-note';

/** Puts a text into one of the page's places for notes; an empty one hides it. */
export function say(note: Note, text: string): void {
  const place = part(note);
  place.textContent = text;
  place.hidden = text === '';
}

/** Says which file of the search is missing or damaged; anything else is a fault of the page and is thrown on. */
export function sayBroken(error: unknown): void {
  if (!(error instanceof ChunkError)) throw error;
  say('find-broken', findWords.searchBroken(error.message));
}
