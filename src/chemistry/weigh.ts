import { massWeighedWith } from './blend.ts';
import type { Charge } from './charge.ts';
import type { Constants } from './constants.ts';
import type { WeighingError } from './margin.ts';
import type { Stage } from './materials.ts';
import { type Grams, given, grams, moles, type Outcome, refused } from './quantity.ts';
import { isBeforeSaponification } from './saponification.ts';
import { AS_USED, equivalentsOf, superfatFrom } from './superfat.ts';

/** What the core needs of a scale. [g] */
export interface ScaleReading {
  readonly step: Grams;
  readonly error: Grams;
}

/** A charge whose weighings are all whole steps of a scale, the steps beside it, and its superfat. */
export interface WeighedCharge {
  readonly charge: Charge;
  /** The fats that the alkali is reckoned on, before rounding. */
  readonly massOfFats: Grams;
  readonly steps: {
    readonly fats: readonly number[];
    readonly afterCookFats: readonly number[];
    readonly alkali: readonly number[];
    readonly additives: readonly number[];
    readonly liquids: readonly number[];
    readonly water: number;
    readonly heldBack: number;
  };
  /** Superfat of the rounded weights by the values used. [1] */
  readonly superfat: number;
  readonly weighing: WeighingError;
}

/**
 * Rounds a charge to what a scale can show, on the side of less free alkali: fats (a blend as one), liquids and
 * water to the nearest step, acids that the alkali compensates up, alkali down, and then further down, step by step,
 * until the superfat of the rounded weights is not below the one written.
 *
 * Refuses `size-too-small-for-scale` where that moves the superfat by more than `largestShift` [1], and
 * `weight-below-scale-step` where something to weigh rounds to nothing.
 */
export function weigh(
  charge: Charge,
  scaleFor: (mass: Grams) => ScaleReading,
  largestShift: number,
  constants: Constants,
): Outcome<WeighedCharge> {
  const nearest = (mass: Grams) => round(mass, scaleFor(mass), Math.round);
  // the parts of a blend are on the scale together and share its rounding
  const fats = charge.fats.map((line) => {
    const together = massWeighedWith(line, charge.fats);
    return { line, part: line.mass / together, ...nearest(together) };
  });
  const afterCookFats = charge.afterCookFats.map((line) => ({ line, ...nearest(line.mass) }));
  const acidsUp = (acidity: number, at: Stage) =>
    acidity > 0 && isBeforeSaponification(at) ? ceilOfSteps : Math.round;
  const liquids = charge.liquids.map((line) => ({
    line,
    ...round(line.mass, scaleFor(line.mass), acidsUp(line.liquid.acidity, line.at)),
  }));
  const additives = charge.additives.map((line) => ({
    line,
    ...round(line.mass, scaleFor(line.mass), acidsUp(line.additive.acidity, line.at)),
  }));
  const alkali = charge.alkali.map((line) => ({
    line,
    ...round(line.weighedMass, scaleFor(line.weighedMass), floorOfSteps),
  }));
  const heldBack = nearest(charge.heldBack);
  const inLye = nearest(grams(charge.water - charge.heldBack));

  const all = [...fats, ...afterCookFats, ...liquids, ...additives, ...alkali, heldBack, inLye];
  const vanished = all.find(({ steps, exact }) => steps === 0 && exact > 0);
  if (vanished) {
    return refused('weight-below-scale-step', { mass: vanished.exact, step: vanished.step });
  }

  const rounded = (): Charge => ({
    ...charge,
    fats: fats.map((entry) => ({ ...entry.line, mass: partOf(entry) })),
    afterCookFats: afterCookFats.map((entry) => ({ ...entry.line, mass: massOf(entry) })),
    liquids: liquids.map((entry) => ({ ...entry.line, mass: massOf(entry) })),
    additives: additives.map((entry) => ({ ...entry.line, mass: massOf(entry) })),
    alkali: alkali.map((entry) => {
      const weighedMass = massOf(entry);
      const pureMass = grams(weighedMass * entry.line.supply.assay.value);
      return {
        ...entry.line,
        weighedMass,
        pureMass,
        moles: moles(pureMass / constants.hydroxide[entry.line.supply.cation]),
      };
    }),
    water: grams(massOf(inLye) + massOf(heldBack)),
    heldBack: massOf(heldBack),
  });

  const written = charge.formulation.superfat;
  let result = rounded();
  let superfat = superfatFrom(equivalentsOf(result, AS_USED, constants));
  while (superfat < written - 1e-9) {
    const smallest = alkali
      .filter(({ steps }) => steps > 1)
      .sort((a, b) => hydroxidePerStep(a, constants) - hydroxidePerStep(b, constants))[0];
    if (!smallest) return refused('size-too-small-for-scale', shiftNumbers(superfat, written));
    smallest.steps -= 1;
    result = rounded();
    superfat = superfatFrom(equivalentsOf(result, AS_USED, constants));
  }
  if (superfat - written > largestShift) {
    return refused('size-too-small-for-scale', {
      ...shiftNumbers(superfat, written),
      allowed: largestShift * 100,
    });
  }
  return given({
    charge: result,
    massOfFats: grams(charge.fats.reduce((sum, { mass }) => sum + mass, 0)),
    steps: {
      fats: fats.map(({ step }) => step),
      afterCookFats: afterCookFats.map(({ step }) => step),
      alkali: alkali.map(({ step }) => step),
      additives: additives.map(({ step }) => step),
      liquids: liquids.map(({ step }) => step),
      water: inLye.step,
      heldBack: heldBack.step,
    },
    superfat,
    weighing: {
      fats: fats.map(({ doubt, part }) => doubt * part),
      alkali: alkali.map(({ doubt }) => doubt),
      additives: additives.map(({ doubt }) => doubt),
      liquids: liquids.map(({ doubt }) => doubt),
    },
  });
}

interface Rounded {
  readonly exact: number;
  readonly step: number;
  /** Half a step of reading plus the scale's own error. [g] */
  readonly doubt: number;
  steps: number;
}

function round(exact: Grams, scale: ScaleReading, how: (steps: number) => number): Rounded {
  return {
    exact,
    step: scale.step,
    doubt: scale.step / 2 + scale.error,
    steps: how(exact / scale.step),
  };
}

/** 3 x 0.1 is 0.30000000000000004 in binary; the sheet says 0.3 and so does the mass. */
const massOf = ({ steps, step }: Rounded): Grams => grams(Number((steps * step).toPrecision(15)));

const partOf = (entry: Rounded & { readonly part: number }): Grams =>
  entry.part === 1 ? massOf(entry) : grams(Number((massOf(entry) * entry.part).toPrecision(12)));

// a mass that is a whole number of steps but for the last bit must not lose or gain one
const floorOfSteps = (steps: number) => Math.floor(steps + 1e-9);
const ceilOfSteps = (steps: number) => Math.ceil(steps - 1e-9);

const hydroxidePerStep = (
  entry: { step: number; line: Charge['alkali'][number] },
  constants: Constants,
) => (entry.step * entry.line.supply.assay.value) / constants.hydroxide[entry.line.supply.cation];

const shiftNumbers = (superfat: number, written: number) => ({
  weighed: superfat * 100,
  written: written * 100,
  shift: (superfat - written) * 100,
});
