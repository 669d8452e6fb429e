import type { Breach } from '../chemistry/quantity.ts';
import { anySizeWords } from '../words/en/any-size.ts';
import { weightBreaches } from '../words/en/weight-breaches.ts';

type Sentence = (numbers: Breach['numbers']) => string;

/**
 * Why there are no weights, in a sentence; what the build refuses too has the same words as there. `more` has the words
 * of rules that only the caller's page knows.
 */
export function refusalText(
  { rule, numbers }: Breach,
  more: Readonly<Record<string, Sentence>> = {},
): string {
  const sentences: Readonly<Record<string, Sentence>> = {
    ...weightBreaches,
    ...anySizeWords.refusals,
    ...more,
  };
  return sentences[rule]?.(numbers) ?? rule;
}
