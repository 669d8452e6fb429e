import type { Charge } from './charge.ts';
import type { CorrectedLine } from './corrected-line.ts';
import { LARGEST_CORRECTION } from './largest-correction.ts';
import { lyeOf } from './lye.ts';
import { type Breach, grams, refused } from './quantity.ts';
import type { WeighingLine } from './weighings.ts';

/**
 * What a lye that is made may lack. Missing water joins the batter, not the lye, so until then the lye is stronger
 * than written; missing acid would have to go onto alkali. Alkali that lacks more than a slip is a misread scale as
 * likely as not, and nothing in the jug could show it: added to what is there it would make a caustic batch.
 */
export function madeLyeBreach(
  lines: readonly CorrectedLine[],
  charge: Charge,
  strongestLye: number | null,
): Breach | null {
  let missing = 0;
  for (const { line, change } of lines) {
    if (line.group !== 'lye' || change <= 0) continue;
    const tooMuch = change > LARGEST_CORRECTION * line.mass + 1e-9;
    const numbers = { missing: (100 * change) / line.mass, most: 100 * LARGEST_CORRECTION };
    if (line.what === 'alkali') {
      if (tooMuch) return refused('made-lye-lacks-alkali', numbers).breach;
      continue;
    }
    if (acidityOf(charge, line) > 0) {
      return refused('made-lye-lacks-acid', { mass: change }).breach;
    }
    if (tooMuch) return refused('made-lye-lacks-water', numbers).breach;
    missing += change;
  }
  if (missing === 0) return null;
  // all that is missing is taken as water, which errs on the side of a stronger lye
  const heldBack = grams(charge.heldBack + missing);
  const strength = lyeOf({ ...charge, heldBack }).pureAsMade;
  if (strongestLye !== null && strength <= strongestLye) return null;
  return refused('made-lye-near-saturation', { strength: 100 * strength }).breach;
}

function acidityOf(charge: Charge, { what, places: [place = 0] }: WeighingLine): number {
  if (what === 'additives') return charge.additives[place]?.additive.acidity ?? 0;
  return what === 'liquids' ? (charge.liquids[place]?.liquid.acidity ?? 0) : 0;
}
