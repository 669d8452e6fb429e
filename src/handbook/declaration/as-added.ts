import type { Charge } from '../../chemistry/charge.ts';
import type { AdditiveRecord } from '../../reference/material-records.ts';
import type { Reference } from '../../reference/reference.ts';
import { words } from '../../words/catalogue.ts';
import { type Ingredient, ingredient } from './ingredient.ts';

/** Everything that goes in, under the name it has then. The masses are those of the charge. [g] */
export function asAdded(charge: Charge, reference: Reference): readonly Ingredient[] {
  const { names } = words.declaration;
  return [
    ...[...charge.fats, ...charge.afterCookFats].map(({ fat, mass }) =>
      fatIngredient(fat.id, mass, reference),
    ),
    ...charge.alkali.flatMap(({ supply, weighedMass, pureMass }) => {
      // of a solution the label names the alkali and the water, not the solution
      const dry = supply.form === 'solid' ? weighedMass : pureMass + weighedMass * supply.carbonate;
      const inci = reference.alkalis.get(supply.id as never)?.inci ?? supply.id;
      return [ingredient(inci, dry), water(weighedMass - dry)];
    }),
    water(charge.water),
    ...charge.liquids.map(({ liquid, mass }) => liquidIngredient(liquid.id, mass, reference)),
    ...charge.additives.flatMap(({ additive, mass }) => {
      const record = reference.additives.get(additive.id);
      if (!record) return [];
      const [name, rest] = record.inci.split(' (and) ');
      const inWater = rest === names.water.eu ? mass * additive.water : 0;
      return [additiveIngredient(record, name ?? record.inci, mass - inWater), water(inWater)];
    }),
  ];
}

export const water = (mass: number): Ingredient =>
  ingredient(words.declaration.names.water.eu, mass, { us: words.declaration.names.water.us });

export function fatIngredient(id: string, mass: number, { fats }: Reference): Ingredient {
  const record = fats.get(id);
  return ingredient(record?.inci ?? id, mass, { us: record?.label.usName ?? null });
}

export function liquidIngredient(id: string, mass: number, { liquids }: Reference): Ingredient {
  const record = liquids.get(id);
  return ingredient(record?.inci ?? id, mass, { us: record?.label.usName ?? null });
}

/** What scents is named by what it does: perfumes and their raw materials stand as one. */
export function additiveIngredient(
  { kind, label }: AdditiveRecord,
  name: string,
  mass: number,
): Ingredient {
  const { perfume } = words.declaration.names;
  if (kind === 'fragrance') return ingredient(perfume.eu, mass, { us: perfume.us });
  return ingredient(name, mass, { us: label.usName, colour: kind === 'colour' });
}
