import { marginBreach, type Sized, type SizeLimits, sizedAs } from './any-size.ts';
import type { Charge } from './charge.ts';
import type { Constants } from './constants.ts';
import type { CorrectedLine } from './corrected-line.ts';
import { LARGEST_CORRECTION } from './largest-correction.ts';
import { madeLyeBreach } from './made-lye.ts';
import { superfatMargin } from './margin.ts';
import { type Grams, given, grams, type Outcome, refused } from './quantity.ts';
import { reckon } from './reckon.ts';
import { withSecondWeighings } from './second-weighings.ts';
import { stepOf, type WeighingLine, weighingsOf } from './weighings.ts';

/** What has happened at the bench. */
export interface AtTheBench {
  /** Lye and fats have met. */
  readonly combined: boolean;
  /** Alkali is in the water, all of it or some. */
  readonly dissolved: boolean;
  /** What the scale showed, where it was not what is written: by place in `weighingsOf`. */
  readonly shown: ReadonlyMap<number, Shown>;
}

export interface Shown {
  readonly mass: Grams;
  /** It is in with other things, so that nothing of it can be taken back. */
  readonly mixed: boolean;
}

export interface Correction {
  /** The batch that the lines add up to. Its margin counts the scale's error of everything that is weighed twice. */
  readonly sized: Sized;
  readonly lines: readonly CorrectedLine[];
}

/** Rounding may ask for a step or two more than the overshoot; more tries than this find nothing. */
const MOST_TRIES = 60;

/**
 * What the rest must become when something was weighed wrong, before the lye meets the fats.
 *
 * What stands alone in its cup is filled up or taken back. What is in with others cannot be taken back: then the whole
 * batch grows, in proportion, until the overshoot is right. The grown batch is weighed as any size is, so its
 * superfat is never below the one written. What nothing was said of is taken to be there as written and may not have to
 * become less where it may already be in.
 *
 * Refuses `lye-has-met-fats`; `correction-too-large`; `correction-not-found`; `made-lye-lacks-alkali`;
 * `made-lye-lacks-water`, `made-lye-lacks-acid` and `made-lye-near-saturation`, as water and acid never go onto alkali;
 * `grown-above-listed` where no vessel is known; and what `anySize` refuses.
 *
 * `strongestLye` is the most hydroxide that the lye may hold, mass per mass of hydroxide and water; `null` where it
 * is not known, and then a made lye may lack no water.
 */
export function correct(
  planned: Sized,
  bench: AtTheBench,
  strongestLye: number | null,
  limits: SizeLimits,
  constants: Constants,
): Outcome<Correction> {
  if (bench.combined) return refused('lye-has-met-fats');
  const { formulation } = planned.weighed.charge;
  const lines = weighingsOf(planned.weighed.charge).map((line, place) => {
    const shown = bench.shown.get(place);
    const mixed = shown ? isMixed(line, shown, bench) : MAY_BE_IN.includes(line.group);
    return { line, present: shown?.mass ?? line.mass, mixed };
  });

  let fats = planned.weighed.massOfFats as number;
  for (let tries = 0; tries < MOST_TRIES; tries++) {
    const growth = fats / planned.weighed.massOfFats - 1;
    if (growth > LARGEST_CORRECTION + 1e-9) {
      return refused('correction-too-large', {
        growth: 100 * growth,
        most: 100 * LARGEST_CORRECTION,
      });
    }
    const charge = reckon(formulation, grams(fats), constants);
    if (!charge.ok) return charge;
    const size = { by: 'fats', mass: grams(fats) } as const;
    const sized = sizedAs(charge.value, size, planned.as, limits, constants);
    if (!sized.ok) return sized;
    const factor = growthStillNeeded(sized.value, charge.value, lines);
    if (factor <= 1) {
      return finished(planned, sized.value, lines, { bench, strongestLye, limits, constants });
    }
    fats *= factor;
  }
  return refused('correction-not-found');
}

/** Masses that differ by less than this part of a step are the same reading; binary leaves such remainders. */
const PART_OF_STEP = 1e-6;

/** Where nothing was said of a line, it may be in with others as written. */
const MAY_BE_IN: readonly string[] = ['lye', 'fats'];

interface PresentLine {
  readonly line: WeighingLine;
  readonly present: Grams;
  /** Nothing of it can be taken back. */
  readonly mixed: boolean;
}

/** In a made lye nothing can be taken back; alkali that is not in the water stands alone. */
function isMixed({ group, what }: WeighingLine, { mixed }: Shown, { dissolved }: AtTheBench) {
  if (group === 'lye' && dissolved) return true;
  return what !== 'alkali' && mixed;
}

/** The line of another charge of the same formula; rounding may leave none of water to hold back. */
const sameLine = (lines: readonly WeighingLine[], { what, places: [place] }: WeighingLine) =>
  lines.find((line) => line.what === what && line.places[0] === place);

/** By how much the batch must still grow, 1 where every line holds what is in it. */
function growthStillNeeded(sized: Sized, exact: Charge, lines: readonly PresentLine[]): number {
  const unrounded = weighingsOf(exact);
  const rounded = weighingsOf(sized.weighed.charge);
  let factor = 1;
  for (const { line, present, mixed } of lines) {
    const target = sameLine(rounded, line);
    const step = target ? stepOf(sized.weighed, target) : 0;
    if (!mixed || present <= (target?.mass ?? 0) + step * PART_OF_STEP) continue;
    const now = sameLine(unrounded, line)?.mass ?? 0;
    // where only rounding keeps it below, half a step more
    const halfStep = 1 + step / (2 * now);
    factor = Math.max(factor, present > now * (1 + 1e-9) ? present / now : halfStep);
  }
  return factor;
}

interface Known {
  readonly bench: AtTheBench;
  readonly strongestLye: number | null;
  readonly limits: SizeLimits;
  readonly constants: Constants;
}

function finished(
  planned: Sized,
  grown: Sized,
  present: readonly PresentLine[],
  { bench, strongestLye, limits, constants }: Known,
): Outcome<Correction> {
  const listed = limits.listed[planned.as];
  if (!listed) throw new RangeError(`no listed size ${planned.as}`);
  const { massOfFats, charge } = grown.weighed;
  const grew = massOfFats > planned.weighed.massOfFats;
  if (grew && listed.vessel === null && massOfFats > listed.fats) {
    return refused('grown-above-listed', { fats: massOfFats, largest: listed.fats });
  }
  const rounded = weighingsOf(charge);
  const lines: CorrectedLine[] = [];
  for (const { line: written, present: mass, mixed } of present) {
    const line = sameLine(rounded, written);
    if (!line) return refused('correction-not-found');
    const step = stepOf(grown.weighed, line);
    const difference = Number((line.mass - mass).toPrecision(12));
    const change = Math.abs(difference) < step * PART_OF_STEP ? 0 : difference;
    lines.push({ line, written: written.mass, present: mass, mixed, change, step });
  }
  if (lines.length < rounded.length) return refused('correction-not-found');
  const breach = bench.dissolved ? madeLyeBreach(lines, charge, strongestLye) : null;
  if (breach) return { ok: false, breach };
  const weighing = withSecondWeighings(grown, lines, listed.scales);
  const found = superfatMargin(charge, constants, weighing);
  if (!found.ok) return found;
  const margin = found.value;
  const sized = { ...grown, margin, weighed: { ...grown.weighed, weighing } };
  return marginBreach(margin, limits) ?? given({ sized, lines });
}
