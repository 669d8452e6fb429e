import { fatWeighings } from './blend.ts';
import type { Charge } from './charge.ts';
import type { Stage } from './materials.ts';
import { type Grams, grams } from './quantity.ts';
import type { WeighedCharge } from './weigh.ts';

/** One thing to weigh, and where it stands in its charge. */
export interface WeighingLine {
  /** Of the material or blend; `water` and `held-back` for the two parts of the water. */
  readonly id: string;
  readonly what:
    | 'water'
    | 'held-back'
    | 'fats'
    | 'afterCookFats'
    | 'liquids'
    | 'additives'
    | 'alkali';
  /** When it joins. */
  readonly group: Stage;
  readonly mass: Grams;
  /** Places in the charge's list of its kind; several for a blend, none for water. */
  readonly places: readonly number[];
}

const ORDER: readonly Stage[] = ['lye', 'fats', 'trace', 'after-cook', 'dilution'];

/**
 * What is weighed for a charge, in working order: water, what is dissolved in it and the alkali last, then the fats,
 * then what joins later. Water that is held back stands with what joins at trace. [g]
 */
export function weighingsOf(charge: Charge): readonly WeighingLine[] {
  const inLye = grams(Number((charge.water - charge.heldBack).toPrecision(12)));
  const lines: WeighingLine[] = [
    { id: 'water', what: 'water', group: 'lye', mass: inLye, places: [] },
    ...fatWeighings(charge.fats).map(
      ({ id, mass, lines: places }): WeighingLine => ({
        id,
        what: 'fats',
        group: 'fats',
        mass,
        places,
      }),
    ),
    ...(charge.heldBack > 0 ? [heldBack(charge.heldBack)] : []),
    ...charge.afterCookFats.map(
      ({ fat, mass }, place): WeighingLine => ({
        id: fat.id,
        what: 'afterCookFats',
        group: 'after-cook',
        mass,
        places: [place],
      }),
    ),
    ...charge.liquids.map(
      ({ liquid, mass, at }, place): WeighingLine => ({
        id: liquid.id,
        what: 'liquids',
        group: at,
        mass,
        places: [place],
      }),
    ),
    ...charge.additives.map(
      ({ additive, mass, at }, place): WeighingLine => ({
        id: additive.id,
        what: 'additives',
        group: at,
        mass,
        places: [place],
      }),
    ),
    // alkali goes into water, so it stands below everything that is in the jug before it
    ...charge.alkali.map(
      ({ supply, weighedMass }, place): WeighingLine => ({
        id: supply.id,
        what: 'alkali',
        group: 'lye',
        mass: weighedMass,
        places: [place],
      }),
    ),
  ];
  return ORDER.flatMap((group) => lines.filter((line) => line.group === group));
}

const heldBack = (mass: Grams): WeighingLine => ({
  id: 'held-back',
  what: 'held-back',
  group: 'trace',
  mass,
  places: [],
});

/** The scale's step that a weight was rounded to. [g] */
export function stepOf(
  { steps }: Pick<WeighedCharge, 'steps'>,
  { what, places: [first = 0] }: Pick<WeighingLine, 'what' | 'places'>,
): number {
  if (what === 'water') return steps.water;
  if (what === 'held-back') return steps.heldBack;
  return steps[what][first] ?? 0;
}
