import { distance } from 'fastest-levenshtein';

/** `did you mean "olive"?` where a candidate is a few letters away, otherwise `otherwise`. */
export function didYouMean(found: string, candidates: Iterable<string>, otherwise: string): string {
  const wanted = found.toLowerCase().replaceAll(/[ _]+/g, '-');
  let nearest: string | null = null;
  // a third of the letters may differ, two of five for letters that changed places; more is another word
  let limit = (wanted.length < 5 ? 1 : Math.max(2, Math.floor(wanted.length / 3))) + 1;
  for (const candidate of candidates) {
    const difference = distance(wanted, candidate.toLowerCase());
    if (difference < limit) {
      nearest = candidate;
      limit = difference;
    }
  }
  return nearest === null ? otherwise : `did you mean "${nearest}"?`;
}
