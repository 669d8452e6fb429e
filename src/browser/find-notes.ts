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

/** Says which file of the search is missing or damaged; anything else is told too, and thrown on to be mended. */
export function sayBroken(error: unknown): void {
  const known = error instanceof ChunkError;
  say('find-broken', findWords.searchBroken(known ? error.message : 'search/'));
  if (!known) throw error;
}
