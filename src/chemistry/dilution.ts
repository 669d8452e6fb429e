import { type Fraction, type Grams, given, grams, type Outcome, refused } from './quantity.ts';

/**
 * Water to add to a paste of a known soap content to reach a lower one: w = m (c0 / c1 - 1). [g]
 *
 * `paste` is the paste as weighed, not as reckoned: a cook loses water that no calculation knows.
 * Refuses `dilution-not-weaker` unless 0 < target <= content < 1.
 */
export function dilutionWater(paste: Grams, content: Fraction, target: Fraction): Outcome<Grams> {
  if (!(target > 0 && target <= content && content < 1)) {
    return refused('dilution-not-weaker', { content: content * 100, target: target * 100 });
  }
  return given(grams(paste * (content / target - 1)));
}
