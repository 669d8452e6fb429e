import type { Charge, Formulation } from '../chemistry/charge.ts';
import type { Fat } from '../chemistry/materials.ts';
import type { Range } from '../chemistry/quantity.ts';
import type { Formula } from '../formulary/formula.ts';
import { prepareFormulation } from '../formulary/formulation.ts';
import { withoutLots } from '../formulary/lots.ts';
import type { Reference } from '../reference/reference.ts';
import type { Canonical } from './canonical-text.ts';
import { normalisedText } from './normalised-text.ts';
import { publishedCharge } from './published-charge.ts';
import { sixDigits, weightsOfCharge } from './weights-per-kilogram.ts';

/** Raised by hand when a model changes its meaning without moving a weight by six digits. */
export const MODELS_VERSION = 1;

/**
 * What is approved, as the data whose canonical text is hashed; README.md beside this file describes every
 * key for somebody who computes it anew. What a file leaves out is left out here.
 */
export function approvedContent(formula: Formula, reference: Reference): Canonical {
  const prepared = prepareFormulation(formula, withoutLots(reference));
  const charge = publishedCharge(formula, reference);
  return {
    models: MODELS_VERSION,
    formula: formulaContent(formula),
    values: prepared.ok ? valuesUsed(prepared.formulation) : [],
    weights: charge.ok ? weightsContent(charge.value) : { refused: charge.breach.rule },
  };
}

function formulaContent(formula: Formula): Canonical {
  const { alkali, water, release } = formula;
  const mixed = alkali.sodium > 0 && alkali.potassium > 0;
  return {
    code: formula.code,
    name: normalisedText(formula.name),
    kind: formula.kind,
    process: formula.process,
    revision: formula.revision,
    fats: formula.fats.map(({ fat, share, blend }) => ({ fat, share, blend })),
    'after-cook-fats': unlessEmpty(
      formula.afterCookFats.map(({ fat, percentOfFats }) => ({
        fat,
        'percent-of-fats': percentOfFats,
      })),
    ),
    alkali: {
      sodium: unlessZero(alkali.sodium),
      potassium: unlessZero(alkali.potassium),
      basis: mixed ? alkali.basis : undefined,
    },
    superfat: formula.superfat,
    water: { [water.form]: water.value, 'hold-back': unlessZero(water.holdBack) },
    liquids: unlessEmpty(
      formula.liquids.map(({ liquid, replacesWater, at }) => ({
        liquid,
        'replaces-water': replacesWater,
        at,
      })),
    ),
    additives: unlessEmpty(
      formula.additives.map(({ additive, percentOfFats, at }) => ({
        additive,
        'percent-of-fats': percentOfFats,
        at,
      })),
    ),
    rework: formula.rework ?? undefined,
    targets: unlessBare(
      Object.fromEntries(
        Object.entries(formula.targets).map(([name, { min, max, unit }]) => [
          name,
          { min, max, unit },
        ]),
      ),
    ),
    release: unlessBare({
      'free-alkali': release.freeAlkali ?? undefined,
      ph: release.ph ?? undefined,
      moisture: release.moisture ?? undefined,
    }),
    batches: formula.batches?.toSorted(),
    concession: formula.concession
      ? {
          reason: normalisedText(formula.concession.reason),
          by: normalisedText(formula.concession.by),
          on: formula.concession.on,
        }
      : undefined,
    method: normalisedText(formula.methodText),
  };
}

/** The published values that the weights and their margin rest on. The approval window is their ranges. */
function valuesUsed(formulation: Formulation): Canonical {
  return {
    fats: [...formulation.fats, ...formulation.afterCookFats].map(({ fat }) => fatValues(fat)),
    alkali: formulation.alkali.map(({ supply }) => ({
      id: supply.id,
      assay: rangeValues(supply.assay),
    })),
    liquids: unlessEmpty(
      formulation.liquids.map(({ liquid }) => ({
        id: liquid.id,
        water: sixDigits(liquid.water),
        fat: sixDigits(liquid.fat),
        acidity: sixDigits(liquid.acidity),
        'fat-values': liquid.fatData ? fatValues(liquid.fatData) : undefined,
      })),
    ),
    additives: unlessEmpty(
      formulation.additives.map(({ additive }) => ({
        id: additive.id,
        water: sixDigits(additive.water),
        acidity: sixDigits(additive.acidity),
      })),
    ),
  };
}

function fatValues({ id, kind, saponificationValue, acidValue }: Fat): Canonical {
  return {
    id,
    kind,
    'saponification-value': rangeValues(saponificationValue),
    // only a wax's lower ends rest on it
    'acid-value': kind === 'wax' ? rangeValues(acidValue) : undefined,
  };
}

const rangeValues = <Q extends number>({ value, low, high }: Range<Q>): Canonical => ({
  value: sixDigits(value),
  low: sixDigits(low),
  high: sixDigits(high),
});

function weightsContent(charge: Charge): Canonical {
  const { fats, afterCookFats, alkali, water, heldBack, liquids, additives } =
    weightsOfCharge(charge);
  const masses = (weights: readonly { readonly id: string; readonly mass: number }[]) =>
    weights.map(({ id, mass }) => ({ id, mass }));
  return {
    fats: masses(fats),
    'after-cook-fats': unlessEmpty(masses(afterCookFats)),
    alkali: masses(alkali),
    water,
    'held-back': unlessZero(heldBack),
    liquids: unlessEmpty(masses(liquids)),
    additives: unlessEmpty(masses(additives)),
  };
}

const unlessZero = (value: number) => (value === 0 ? undefined : value);
const unlessEmpty = (list: readonly Canonical[]) => (list.length === 0 ? undefined : list);
const unlessBare = (members: { readonly [key: string]: Canonical | undefined }) =>
  Object.values(members).every((member) => member === undefined) ? undefined : members;
