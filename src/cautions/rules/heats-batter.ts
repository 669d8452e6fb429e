import { isBeforeSaponification } from '../../chemistry/saponification.ts';
import { materialNames } from '../material-names.ts';
import type { CautionContext, CautionRule } from '../rule.ts';

/** Sugars and alcohol that are in the batter while it saponifies. */
export const rule: CautionRule<'heats-batter'> = {
  id: 'heats-batter',
  severity: 'care',
  basis: { limit: 'sugar-share' },
  applies: (context) => {
    const { charge, reference, thresholds } = context;
    const parts = heating(context);
    const fats = charge.fats.reduce((sum, { mass }) => sum + mass, 0);
    const sugar = (100 * parts.reduce((sum, part) => sum + part.sugar, 0)) / fats;
    const alcohol = parts.some(({ id }) => thresholds.materials.alcohols.ids.includes(id));
    if (sugar < thresholds.limits['sugar-share'].value && !alcohol) return [];
    return [
      {
        sugar,
        materials: materialNames(
          reference,
          parts.map(({ id }) => id),
        ),
      },
    ];
  },
};

/** What brings sugar or alcohol before saponification, and how much sugar. [g] */
function heating({ charge, reference, thresholds }: CautionContext) {
  const alcohols = thresholds.materials.alcohols.ids;
  const liquids = charge.liquids.map(({ liquid, mass, at }) => ({
    id: liquid.id,
    at,
    sugar: mass * liquid.sugar,
  }));
  const additives = charge.additives.map(({ additive, mass, at }) => ({
    id: additive.id,
    at,
    sugar: reference.additives.get(additive.id)?.kind === 'sugar' ? mass * (1 - additive.water) : 0,
  }));
  return [...liquids, ...additives].filter(
    ({ id, at, sugar }) => isBeforeSaponification(at) && (sugar > 0 || alcohols.includes(id)),
  );
}
