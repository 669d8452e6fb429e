import type { Sized } from './any-size.ts';
import type { CorrectedLine } from './corrected-line.ts';
import type { WeighingError } from './margin.ts';
import { grams } from './quantity.ts';
import { type Scales, scaleFor } from './weigh-size.ts';

/** The scale's errors, with a second one for what is added to a line that is in with others. [g] */
export function withSecondWeighings(
  { weighed: { charge, weighing } }: Sized,
  lines: readonly CorrectedLine[],
  scales: Scales,
): WeighingError {
  const more = {
    fats: [...weighing.fats],
    alkali: [...weighing.alkali],
    additives: [...weighing.additives],
    liquids: [...weighing.liquids],
  };
  for (const { line, change, mixed } of lines) {
    const { what, places, mass } = line;
    if (!mixed || change <= 0 || what === 'water' || what === 'held-back') continue;
    if (what === 'afterCookFats') continue;
    const { step, error } = scaleFor(grams(change), scales);
    for (const place of places) {
      // the parts of a blend are on the scale together and share its error
      const part = what === 'fats' ? (charge.fats[place]?.mass ?? 0) / mass : 1;
      more[what][place] = (more[what][place] ?? 0) + part * (step / 2 + error);
    }
  }
  return more;
}
