import { byCodePoint } from './code-points.ts';
import type { HitPlace } from './hit.ts';
import { eachPlace } from './index-format.ts';
import type { Match } from './rank.ts';

const LARGEST_WEIGHT = 255;

/**
 * The weight of each word on a page, added up over its places, in the order of the words' letters. Terms that meet in
 * one place (the parts of a compound) count together there.
 */
export function weightsOf(matches: readonly Match[]): ReadonlyMap<string, number> {
  const weights = new Map<string, number>();
  eachPosition(matches, (_, weight, terms) => {
    for (const { word } of terms) weights.set(word, (weights.get(word) ?? 0) + weight);
  });
  if (weights.size < 2) return weights;
  return new Map([...weights].sort(([a], [b]) => byCodePoint(a, b)));
}

/** Scores each place of a page where a term was found. */
export function scorePlaces(matches: readonly Match[]): readonly HitPlace[] {
  const places: HitPlace[] = [];
  eachPosition(matches, (position, weight, terms) => {
    const closeness = terms.reduce((sum, match) => sum + match.closeness, 0);
    places.push({ position, score: weight ** 2 * closeness });
  });
  return places;
}

/** Calls `take` for each position in ascending order with its weight and the first match of each term there. */
function eachPosition(
  matches: readonly Match[],
  take: (position: number, weight: number, terms: readonly Match[]) => void,
): void {
  const found: { readonly match: Match; readonly weight: number; readonly position: number }[] = [];
  for (const match of matches) {
    eachPlace(match.onPage, (weight, position) => {
      found.push({ match, weight, position });
    });
  }
  found.sort((a, b) => a.position - b.position);
  for (let start = 0, end = 0; start < found.length; start = end) {
    const position = found[start]?.position ?? 0;
    const terms: Match[] = [];
    let least = Number.POSITIVE_INFINITY;
    for (end = start; found[end]?.position === position; end++) {
      const each = found[end];
      if (!each || terms.some(({ term }) => term === each.match.term)) continue;
      terms.push(each.match);
      least = Math.min(least, each.weight);
    }
    take(position, Math.min(least * terms.length, LARGEST_WEIGHT), terms);
  }
}
