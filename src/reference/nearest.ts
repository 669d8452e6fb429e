import { distance } from 'fastest-levenshtein';

/** Ids, each with the name people know it by. A map of records is one. */
export type Candidates = Iterable<readonly [string, { readonly name: string }]>;

/** `did you mean "olive"?` where a word is a few letters away, otherwise `otherwise`. */
export const didYouMean = (found: string, words: Iterable<string>, otherwise: string): string =>
  suggestion(
    found,
    [...words].map((word) => [word, { name: word }] as const),
    otherwise,
  );

/**
 * The same for ids that have names: an id in other letters, a name in place of an id ("Coconut Oil"), and a
 * slip of a few letters are recognised.
 */
export function suggestion(found: string, candidates: Candidates, otherwise: string): string {
  const nearest = nearestId(found, candidates);
  return nearest === null ? otherwise : `did you mean "${nearest}"?`;
}

/** The id that a slip was meant to be, or `null`. */
export function nearestId(found: string, candidates: Candidates): string | null {
  const wanted = plain(found);
  if (wanted === '') return null;
  let nearest: string | null = null;
  // a third of the letters may differ, two of five for letters that changed places; more is another word
  let limit = (wanted.length < 5 ? 1 : Math.max(2, Math.floor(wanted.length / 3))) + 1;
  for (const [id, { name }] of candidates) {
    for (const form of [plain(id), plain(name), plain(name).replace(/-(oil|butter|fat)\b.*/, '')]) {
      const difference = distance(wanted, form);
      if (difference < limit) {
        nearest = id;
        limit = difference;
      }
    }
  }
  return nearest;
}

function plain(text: string): string {
  return text
    .toLowerCase()
    .replaceAll(/[^\p{L}\p{N}]+/gu, '-')
    .replaceAll(/^-|-$/g, '');
}
