import { alkaliPerMole } from './alkali.ts';
import type { Charge, Formulation } from './charge.ts';
import type { Constants } from './constants.ts';
import { type Grams, given, grams, moles, type Outcome, refused } from './quantity.ts';
import { equivalentsPerGram, isBeforeSaponification } from './saponification.ts';

/**
 * All masses of a formulation for a mass of fats. [g]
 *
 * E = sum(m_i S_i) / (1000 M(KOH)); n(OH) = E (1 - s) + n(acid). Liquids that replace water bring fat and
 * acid, which need alkali, which needs water: the three are linear in n(OH) and solved at once, so there is
 * nothing to iterate. Additives and liquids that join after saponification get no alkali.
 *
 * Refuses: `stock-weaker-than-lye` where the stock lye alone holds more water than the formula asks for;
 * `liquids-need-more-alkali-than-they-leave-water-for` where the loop above has no positive solution.
 */
export function reckon(
  formulation: Formulation,
  massOfFats: Grams,
  constants: Constants,
): Outcome<Charge> {
  const { superfat, water: rule, liquids } = formulation;
  const fats = formulation.fats.map(({ share, ...line }) => ({
    ...line,
    mass: grams(massOfFats * share),
  }));
  const additives = formulation.additives.map(({ additive, perFats, at }) => ({
    additive,
    at,
    mass: grams(massOfFats * perFats),
  }));
  let equivalents = 0;
  for (const { fat, mass } of fats) {
    equivalents += mass * equivalentsPerGram(fat.saponificationValue.value, constants);
  }
  let acid = 0;
  for (const { additive, mass, at } of additives) {
    if (isBeforeSaponification(at)) acid += mass * additive.acidity;
  }

  const alkali = alkaliPerMole(formulation, constants);
  // total water = slope x n(OH) + constant
  const slope = rule.form === 'percent-of-fats' ? 0 : alkali.ruled * waterPerAlkali(rule);
  const constant = rule.form === 'percent-of-fats' ? massOfFats * rule.value : 0;
  let demandPerWater = 0;
  for (const { liquid, replacesWater, at } of liquids) {
    if (!isBeforeSaponification(at)) continue;
    const fatEquivalents = liquid.fatData
      ? liquid.fat * equivalentsPerGram(liquid.fatData.saponificationValue.value, constants)
      : 0;
    demandPerWater +=
      (replacesWater / liquid.water) * (fatEquivalents * (1 - superfat) + liquid.acidity);
  }
  const remaining = 1 - slope * demandPerWater;
  if (remaining <= 0) {
    return refused('liquids-need-more-alkali-than-they-leave-water-for', { remaining });
  }
  const hydroxide = (equivalents * (1 - superfat) + acid + constant * demandPerWater) / remaining;

  const totalWater = slope * hydroxide + constant;
  const replaced = liquids.reduce((sum, { replacesWater }) => sum + replacesWater, 0);
  const stockWater = alkali.stockWater * hydroxide;
  const water = totalWater * (1 - replaced) - stockWater;
  // a rounding residue of a stock that fits exactly is not a shortage
  if (water < -1e-9 * massOfFats) {
    return refused('stock-weaker-than-lye', {
      stockWater,
      waterAskedFor: totalWater * (1 - replaced),
    });
  }
  const toAdd = Math.max(0, water);
  return given({
    formulation,
    fats,
    afterCookFats: formulation.afterCookFats.map(({ fat, perFats }) => ({
      fat,
      mass: grams(massOfFats * perFats),
    })),
    alkali: formulation.alkali.map(({ supply }, index) => {
      const amount = hydroxide * (alkali.fractions[index] ?? 0);
      const pure = amount * constants.hydroxide[supply.cation];
      return {
        supply,
        moles: moles(amount),
        pureMass: grams(pure),
        weighedMass: grams(pure / supply.assay.value),
      };
    }),
    water: grams(toAdd),
    heldBack: grams(toAdd * formulation.holdBack),
    liquids: liquids.map(({ liquid, replacesWater, at }) => ({
      liquid,
      at,
      mass: grams((totalWater * replacesWater) / liquid.water),
    })),
    additives,
  });
}

function waterPerAlkali(rule: Formulation['water']): number {
  return rule.form === 'lye-concentration' ? (1 - rule.value) / rule.value : rule.value;
}
