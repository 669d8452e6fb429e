import { moleFractions } from '../../chemistry/alkali.ts';
import { type FatFate, fatesOfFats } from '../../chemistry/fates.ts';
import type { Cation } from '../../chemistry/materials.ts';
import type { ComputedFormula } from '../../formulary/formulary.ts';
import type { SaltNames } from '../../reference/label.ts';
import type { Reference } from '../../reference/reference.ts';
import { words } from '../../words/catalogue.ts';
import { additiveIngredient, fatIngredient, liquidIngredient, water } from './as-added.ts';
import { type Ingredient, ingredient } from './ingredient.ts';

const METAL = { Na: 'sodium', K: 'potassium' } as const;

/**
 * What the finished soap holds at release, for the mass of fats of the charge. [g] Together with the
 * carbonate and the inert part of the alkali, which are no ingredients, it weighs what is released.
 *
 * What alkali leaves of a fat, its unsaponifiable matter and the alcohols of a wax count under the fat's own
 * name; of a liquid's fat, under the liquid's. Additives and liquids count without their water.
 */
export function asFormed(
  { charge, document }: ComputedFormula,
  reference: Reference,
): readonly Ingredient[] {
  const { constants } = reference;
  const fractions = moleFractions(charge.formulation, constants);
  const cations = charge.formulation.alkali.map(({ supply }, i) => ({
    metal: METAL[supply.cation],
    fraction: fractions[i] ?? 0,
    gain: constants.metal[supply.cation] - constants.hydrogen,
    hydroxide: constants.hydroxide[supply.cation],
    id: supply.id,
  }));
  const { fats, leftOver } = fatesOfFats(charge, constants);

  /** One acid, shared between the metals. `mass` is of the acid itself. */
  const salts = (mass: number, moles: number, name: (metal: 'sodium' | 'potassium') => Named) =>
    cations.map(({ metal, fraction, gain }) => {
      const { text, nameless } = name(metal);
      return ingredient(text, fraction * (mass + moles * gain), { nameless });
    });
  const ofSoap = (fate: FatFate) => {
    const { boundAcid, boundAcidMass, carrier } = fate;
    const names = reference.fats.get(fate.fat.id)?.label.saponified ?? null;
    if (names === null && carrier !== null) {
      const gains = cations.reduce((sum, { fraction, gain }) => sum + fraction * gain, 0);
      return [liquidIngredient(carrier, boundAcidMass + boundAcid * gains, reference)];
    }
    const fat = reference.fats.get(fate.fat.id)?.name ?? fate.fat.id;
    return salts(boundAcidMass, boundAcid, (metal) => saltName(names, metal, fat));
  };

  const { releasedMass, moisture } = document.yield;
  return [
    ...fats.flatMap(ofSoap),
    ...fats.map(({ fat, carrier, unsaponifiedFat, unsaponifiable }) => {
      const mass = unsaponifiedFat + unsaponifiable;
      return carrier === null
        ? fatIngredient(fat.id, mass, reference)
        : liquidIngredient(carrier, mass, reference);
    }),
    ingredient(
      words.declaration.names.glycerol,
      fats.reduce((sum, { glycerol }) => sum + glycerol, 0),
    ),
    ...cations.map(({ id, fraction, hydroxide }) =>
      ingredient(
        reference.alkalis.get(id as never)?.inci ?? id,
        leftOver > 1e-9 ? leftOver * fraction * hydroxide : 0,
      ),
    ),
    water((releasedMass * moisture.released) / 100),
    ...charge.additives.flatMap(({ additive, mass }) => {
      const record = reference.additives.get(additive.id);
      if (!record) return [];
      const dry = mass * (1 - additive.water);
      if (additive.acidity > 0) {
        const names = record.label.neutralised;
        return salts(dry, mass * additive.acidity, (metal) => saltName(names, metal, record.name));
      }
      return [additiveIngredient(record, record.inci.split(' (and) ')[0] ?? record.inci, dry)];
    }),
    ...charge.liquids.map(({ liquid, mass }) => {
      const solids = mass * (1 - liquid.water - liquid.fat);
      const gain = cations.reduce((sum, each) => sum + each.fraction * each.gain, 0);
      return liquidIngredient(liquid.id, solids + mass * liquid.acidity * gain, reference);
    }),
  ];
}

interface Named {
  readonly text: string;
  readonly nameless: boolean;
}

function saltName(names: SaltNames | null, metal: (typeof METAL)[Cation], material: string): Named {
  return names === null
    ? { text: words.declaration.noName(metal, material), nameless: true }
    : { text: names[metal], nameless: false };
}
