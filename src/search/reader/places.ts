import { byCodePoint } from './code-points.ts';
import type { HitPlace } from './hit.ts';
import type { Place } from './index-format.ts';
import type { Match } from './rank.ts';

const LARGEST_WEIGHT = 255;

/**
 * Scores each place of a page where a term was found, and adds up the weight of each word, in the order of the words'
 * letters. Terms that meet in one place (the parts of a compound) count together there.
 */
export function scorePlaces(found: readonly { readonly match: Match; readonly place: Place }[]): {
  readonly places: readonly HitPlace[];
  readonly weights: ReadonlyMap<string, number>;
} {
  const weights = new Map<string, number>();
  const places: HitPlace[] = [];
  const sorted = found.toSorted((a, b) => a.place.position - b.place.position);
  for (let start = 0, end = 0; start < sorted.length; start = end) {
    const position = sorted[start]?.place.position ?? 0;
    const firsts = new Map<number, { readonly match: Match; readonly place: Place }>();
    for (end = start; sorted[end]?.place.position === position; end++) {
      const each = sorted[end];
      if (each && !firsts.has(each.match.term)) firsts.set(each.match.term, each);
    }
    const terms = [...firsts.values()];
    const least = Math.min(...terms.map(({ place }) => place.weight));
    const weight = Math.min(least * terms.length, LARGEST_WEIGHT);
    for (const { match } of terms) weights.set(match.word, (weights.get(match.word) ?? 0) + weight);
    const closeness = terms.reduce((sum, { match }) => sum + match.closeness, 0);
    places.push({ position, score: weight ** 2 * closeness });
  }
  return { places, weights: new Map([...weights].sort(([a], [b]) => byCodePoint(a, b))) };
}
