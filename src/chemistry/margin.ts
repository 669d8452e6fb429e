import { massByFat } from './blend.ts';
import type { Charge } from './charge.ts';
import type { Constants } from './constants.ts';
import type { Fat } from './materials.ts';
import { given, grams, type Outcome, type Range, refused } from './quantity.ts';
import {
  equivalentsPerGram,
  isBeforeSaponification,
  rangeThatCounts,
  valueAt,
} from './saponification.ts';
import { type Equivalents, equivalentsOf, type Reading, superfatFrom } from './superfat.ts';

/** What the scale may add to each weighing. [g] */
export interface WeighingError {
  /**
   * Largest error of one weighing, half-width, on top of half a step. Per line, in the charge's order; of a
   * blend each part has its share of the one error.
   */
  readonly fats: readonly number[];
  readonly alkali: readonly number[];
  readonly additives: readonly number[];
  readonly liquids: readonly number[];
}

/** One source of doubt: how far it moves the superfat at k = 2. */
export interface Contribution {
  /** `fat:olive`, `liquid:goat-milk` (its fat), `assay:sodium-hydroxide`, `scale`. */
  readonly id: string;
  /** [1] */
  readonly halfWidth: number;
}

/** How far the superfat can be from what is written. Fractions; `low <= high`. */
export interface Margin {
  readonly expanded: { readonly low: number; readonly high: number };
  readonly worstCase: { readonly low: number; readonly high: number };
  /** Largest first, of the lower end. */
  readonly budget: readonly Contribution[];
}

/**
 * Superfat margin of a charge: the expanded interval and the worst case.
 *
 * Expanded: JCGM 100:2008, first order, coverage factor 2, rectangular half-widths h / sqrt(3), a measured
 * value by its stated k = 2 half-width; contributions are taken as independent. Centred on the superfat of
 * the middles of all ranges and clipped to the worst case. Worst case: every fat at the low end of its
 * range, assay at its top, every weighing wrong against us (and the other way round for the upper end).
 * In cold process the lower ends count only the acid value of a wax. Without `weighing` the scale is left
 * out. Refuses `nothing-sure-to-saponify` where at the low ends nothing is left that alkali must react with, as in a
 * cold soap of waxes alone. Not covered: the acidity of additives and liquids, moisture taken up by the alkali after its assay.
 */
export function superfatMargin(
  charge: Charge,
  constants: Constants,
  weighing: WeighingError | null = null,
): Outcome<Margin> {
  const waxAsAcids = charge.formulation.process === 'cold';
  const lower = spreadAround(charge, waxAsAcids, constants, weighing);
  const upper =
    waxAsAcids && hasWax(charge) ? spreadAround(charge, false, constants, weighing) : lower;
  const worst = {
    low: extreme(charge, { fats: 'low', assay: 'high', waxAsAcids }, -1, constants, weighing),
    high: extreme(
      charge,
      { fats: 'high', assay: 'low', waxAsAcids: false },
      1,
      constants,
      weighing,
    ),
  };
  if (!Number.isFinite(worst.low)) return refused('nothing-sure-to-saponify');
  return given({
    expanded: {
      low: Math.max(lower.centre - lower.halfWidth, worst.low),
      high: Math.min(upper.centre + upper.halfWidth, worst.high),
    },
    worstCase: worst,
    budget: lower.budget,
  });
}

const hasWax = (charge: Charge) => charge.fats.some(({ fat }) => fat.kind === 'wax');

/** Twice the standard uncertainty of a quantity given by its range. */
export function expandedHalfWidth(range: Range<number>): number {
  const half = (range.high - range.low) / 2;
  return range.spread === 'expanded' ? half : (2 * half) / Math.sqrt(3);
}

function spreadAround(
  charge: Charge,
  waxAsAcids: boolean,
  constants: Constants,
  weighing: WeighingError | null,
): { centre: number; halfWidth: number; budget: Contribution[] } {
  const reading: Reading = { fats: 'middle', assay: 'middle', waxAsAcids };
  const at = equivalentsOf(charge, reading, constants);
  const budget: Contribution[] = [];
  const perEquivalent = (at.hydroxide - at.acid) / at.saponifiable ** 2;

  const addFat = (id: string, fat: Fat, mass: number) => {
    const equivalents =
      expandedHalfWidth(rangeThatCounts(fat, waxAsAcids)) / (1000 * constants.hydroxide.K);
    budget.push({ id, halfWidth: perEquivalent * mass * equivalents });
  };
  // a fat by itself and in a blend has one saponification value, so its lines err together
  for (const { fat, mass } of massByFat(charge.fats)) addFat(`fat:${fat.id}`, fat, mass);
  for (const { liquid, mass, at: stage } of charge.liquids) {
    if (liquid.fatData && isBeforeSaponification(stage)) {
      addFat(`liquid:${liquid.id}`, liquid.fatData, mass * liquid.fat);
    }
  }
  for (const { supply, weighedMass } of charge.alkali) {
    const hydroxide =
      (weighedMass * expandedHalfWidth(supply.assay)) / constants.hydroxide[supply.cation];
    budget.push({ id: `assay:${supply.id}`, halfWidth: hydroxide / at.saponifiable });
  }
  if (weighing) {
    budget.push({
      id: 'scale',
      halfWidth: scaleHalfWidth(charge, at, reading, constants, weighing),
    });
  }
  budget.sort((a, b) => b.halfWidth - a.halfWidth || (a.id < b.id ? -1 : 1));
  return {
    centre: superfatFrom(at),
    halfWidth: Math.sqrt(budget.reduce((sum, { halfWidth }) => sum + halfWidth ** 2, 0)),
    budget,
  };
}

/** All weighings together, in quadrature, at k = 2; each is rectangular. */
function scaleHalfWidth(
  charge: Charge,
  at: Equivalents,
  reading: Reading,
  constants: Constants,
  weighing: WeighingError,
): number {
  const keptBack = (at.hydroxide - at.acid) / at.saponifiable;
  let squares = 0;
  const add = (sensitivity: number, error: number) => {
    squares += (sensitivity * error) ** 2;
  };
  const blends = new Map<string, number>();
  charge.fats.forEach(({ fat, blend }, i) => {
    const e = equivalentsPerGram(valueAt(fat, 'middle', reading.waxAsAcids), constants);
    const moved = ((keptBack * e) / at.saponifiable) * (weighing.fats[i] ?? 0);
    if (blend === undefined) add(moved, 1);
    else blends.set(blend, (blends.get(blend) ?? 0) + moved);
  });
  for (const moved of blends.values()) add(moved, 1);
  charge.alkali.forEach(({ supply }, i) => {
    const assay = (supply.assay.low + supply.assay.high) / 2;
    add(assay / constants.hydroxide[supply.cation] / at.saponifiable, weighing.alkali[i] ?? 0);
  });
  charge.additives.forEach(({ additive, at: stage }, i) => {
    if (isBeforeSaponification(stage)) {
      add(additive.acidity / at.saponifiable, weighing.additives[i] ?? 0);
    }
  });
  charge.liquids.forEach(({ liquid, at: stage }, i) => {
    if (!isBeforeSaponification(stage)) return;
    const e = liquid.fatData
      ? liquid.fat * equivalentsPerGram(valueAt(liquid.fatData, 'middle', false), constants)
      : 0;
    add((keptBack * e + liquid.acidity) / at.saponifiable, weighing.liquids[i] ?? 0);
  });
  return (2 * Math.sqrt(squares)) / Math.sqrt(3);
}

/** The superfat with everything at one end; `side` -1 weighs fats and acids short and alkali over. */
function extreme(
  charge: Charge,
  reading: Reading,
  side: -1 | 1,
  constants: Constants,
  weighing: WeighingError | null,
): number {
  if (!weighing) return superfatFrom(equivalentsOf(charge, reading, constants));
  const shift = <T extends { readonly mass: number }>(line: T, error: number | undefined): T => ({
    ...line,
    mass: Math.max(0, line.mass + side * (error ?? 0)),
  });
  return superfatFrom(
    equivalentsOf(
      {
        fats: charge.fats.map((line, i) => shift(line, weighing.fats[i])),
        liquids: charge.liquids.map((line, i) => shift(line, weighing.liquids[i])),
        additives: charge.additives.map((line, i) => shift(line, weighing.additives[i])),
        alkali: charge.alkali.map((line, i) => ({
          ...line,
          weighedMass: grams(Math.max(0, line.weighedMass - side * (weighing.alkali[i] ?? 0))),
        })),
      },
      reading,
      constants,
    ),
  );
}
