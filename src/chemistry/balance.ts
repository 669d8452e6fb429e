import { moleFractions } from './alkali.ts';
import type { Charge } from './charge.ts';
import type { Constants } from './constants.ts';
import { type FatFate, fatesOfFats } from './fates.ts';

/** Where every gram of a batch ends up. Sums to the mass that went in. [g] */
export interface Balance {
  readonly soap: number;
  readonly glycerol: number;
  readonly unsaponifiedFat: number;
  /** Of the fats, and the alcohols that wax esters leave. */
  readonly unsaponifiable: number;
  readonly freeAlkali: number;
  readonly water: number;
  /** Carbonate and whatever else the alkali brings that is neither hydroxide nor water. */
  readonly carbonateAndInert: number;
  /** Additives and solids of liquids, dry, with acids as their salts. */
  readonly additives: number;
  readonly total: number;
  /** Fatty acids bound in the soap, for the total fatty matter. */
  readonly acidsInSoap: number;
}

/**
 * Closed mass balance of a charge once the alkali has done its work: what `fatesOfFats` says of each fat,
 * summed, and all that stands beside the fats. Ignored: water driven off by heat, carbonation by air.
 */
export function massBalance(charge: Charge, constants: Constants): Balance {
  const { fats, neutralised, freed, leftOver } = fatesOfFats(charge, constants);
  const fractions = moleFractions(charge.formulation, constants);
  const mean = (pick: 'metal' | 'hydroxide') =>
    charge.formulation.alkali.reduce(
      (sum, { supply }, i) => sum + (fractions[i] ?? 0) * constants[pick][supply.cation],
      0,
    );
  const gain = mean('metal') - constants.hydrogen;
  const total = (pick: (fate: FatFate) => number) =>
    fats.reduce((sum, fate) => sum + pick(fate), 0);

  const acidsInSoap = total(({ boundAcidMass }) => boundAcidMass);
  const soap = acidsInSoap + gain * total(({ boundAcid }) => boundAcid);
  const glycerol = total((fate) => fate.glycerol);
  const unsaponifiedFat = total((fate) => fate.unsaponifiedFat);
  const unsaponifiable = total((fate) => fate.unsaponifiable);

  let carbonateAndInert = 0;
  let water =
    charge.water + total(({ waterFormed }) => waterFormed) + neutralised * constants.water;
  for (const { supply, weighedMass, pureMass } of charge.alkali) {
    const rest = weighedMass - pureMass - weighedMass * supply.carbonate;
    carbonateAndInert += weighedMass * supply.carbonate;
    if (supply.remainder === 'water') water += rest;
    else carbonateAndInert += rest;
  }
  let additives = (neutralised + freed) * gain;
  for (const { additive, mass } of charge.additives) {
    water += mass * additive.water;
    additives += mass * (1 - additive.water);
  }
  for (const { liquid, mass } of charge.liquids) {
    water += mass * liquid.water;
    additives += mass * (1 - liquid.water - liquid.fat);
  }
  const freeAlkali = leftOver * mean('hydroxide');
  return {
    soap,
    glycerol,
    unsaponifiedFat,
    unsaponifiable,
    freeAlkali,
    water,
    carbonateAndInert,
    additives,
    total:
      soap +
      glycerol +
      unsaponifiedFat +
      unsaponifiable +
      freeAlkali +
      water +
      carbonateAndInert +
      additives,
    acidsInSoap,
  };
}

/** Mass of everything that goes in, to hold the balance against. [g] */
export function massIn(charge: Charge): number {
  const sum = (lines: readonly { readonly mass: number }[]) =>
    lines.reduce((total, { mass }) => total + mass, 0);
  return (
    sum(charge.fats) +
    sum(charge.afterCookFats) +
    sum(charge.liquids) +
    sum(charge.additives) +
    charge.alkali.reduce((total, { weighedMass }) => total + weighedMass, 0) +
    charge.water
  );
}
