import { moleFractions } from './alkali.ts';
import type { Charge } from './charge.ts';
import type { Constants } from './constants.ts';
import { meanMolarMass } from './fatty-acids.ts';
import type { Fat } from './materials.ts';
import { equivalentsPerGram, isBeforeSaponification } from './saponification.ts';
import { AS_USED, equivalentsOf } from './superfat.ts';

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
 * Closed mass balance of a charge once the alkali has done its work.
 *
 * Free fatty acids react first, to soap and water; then glycerides, to soap and glycerol, and wax esters, to
 * soap and fatty alcohols, all to the same extent. What the acid part of a glyceride weighs follows from its
 * saponification value, M = (1 - u) / e - 38.049 / 3 per equivalent, so that mass closes whatever value is
 * used; the composition is the cross-check, not the basis. Acid that joins later turns soap back into
 * fatty acid. Ignored: free acids inside natural fats, water driven off by heat, carbonation by air.
 */
export function massBalance(charge: Charge, constants: Constants): Balance {
  const { hydroxide, acid } = equivalentsOf(charge, AS_USED, constants);
  const fractions = moleFractions(charge.formulation, constants);
  const mean = (pick: 'metal' | 'hydroxide') =>
    charge.formulation.alkali.reduce(
      (sum, { supply }, i) => sum + (fractions[i] ?? 0) * constants[pick][supply.cation],
      0,
    );
  const metal = mean('metal');
  const gain = metal - constants.hydrogen;

  const reacting = [
    ...charge.fats,
    ...charge.liquids.flatMap(({ liquid, mass, at }) =>
      liquid.fatData && isBeforeSaponification(at)
        ? [{ fat: liquid.fatData, mass: mass * liquid.fat }]
        : [],
    ),
  ].map(({ fat, mass }) => part(fat, mass, constants));
  const bystanders = [
    ...charge.afterCookFats,
    ...charge.liquids.flatMap(({ liquid, mass, at }) =>
      liquid.fatData && !isBeforeSaponification(at)
        ? [{ fat: liquid.fatData, mass: mass * liquid.fat }]
        : [],
    ),
  ];

  const sumOf = (kind: (kind: Fat['kind']) => boolean) =>
    reacting.reduce((sum, { fat, amount }) => sum + (kind(fat.kind) ? amount : 0), 0);
  const available = Math.max(0, hydroxide - acid);
  const freeAcids = sumOf((kind) => kind === 'free-acid');
  const esters = sumOf((kind) => kind !== 'free-acid');
  const toFreeAcids = Math.min(available, freeAcids);
  const toEsters = Math.min(available - toFreeAcids, esters);
  const leftOver = available - toFreeAcids - toEsters;

  let soap = 0;
  let acidsInSoap = 0;
  let glycerol = 0;
  let unsaponifiedFat = 0;
  let unsaponifiable = 0;
  let waterFormed = 0;
  for (const { fat, mass, amount, acidMass } of reacting) {
    const extent =
      fat.kind === 'free-acid' ? freeAcids && toFreeAcids / freeAcids : esters && toEsters / esters;
    const reacted = amount * extent;
    const saponifiableMass = mass * (1 - fat.unsaponifiable);
    soap += reacted * (acidMass + gain);
    acidsInSoap += reacted * acidMass;
    unsaponifiedFat += saponifiableMass * (1 - extent);
    unsaponifiable += mass * fat.unsaponifiable;
    if (fat.kind === 'glyceride') glycerol += (reacted / 3) * constants.glycerol;
    else if (fat.kind === 'free-acid') waterFormed += reacted * constants.water;
    // a wax ester splits into acid and alcohol; what the acid does not take is alcohol
    else unsaponifiable += saponifiableMass * extent + reacted * (constants.water - acidMass);
  }
  for (const { fat, mass } of bystanders) {
    unsaponifiedFat += mass * (1 - fat.unsaponifiable);
    unsaponifiable += mass * fat.unsaponifiable;
  }

  const early = Math.min(acid, hydroxide);
  const late = lateAcid(charge);
  const soapMoles = toFreeAcids + toEsters;
  const freed = Math.min(late, soapMoles);
  if (soapMoles > 0) {
    const meanAcid = acidsInSoap / soapMoles;
    soap -= freed * (meanAcid + gain);
    acidsInSoap -= freed * meanAcid;
    unsaponifiedFat += freed * meanAcid;
  }

  let carbonateAndInert = 0;
  let water = charge.water + waterFormed + early * constants.water;
  for (const { supply, weighedMass, pureMass } of charge.alkali) {
    const rest = weighedMass - pureMass - weighedMass * supply.carbonate;
    carbonateAndInert += weighedMass * supply.carbonate;
    if (supply.remainder === 'water') water += rest;
    else carbonateAndInert += rest;
  }
  let additives = (early + freed) * gain;
  for (const { additive, mass } of charge.additives) {
    water += mass * additive.water;
    additives += mass * (1 - additive.water);
  }
  for (const { liquid, mass } of charge.liquids) {
    water += mass * liquid.water;
    additives += mass * (1 - liquid.water - liquid.fat);
  }
  const freeAlkali = leftOver * mean('hydroxide');
  const total =
    soap +
    glycerol +
    unsaponifiedFat +
    unsaponifiable +
    freeAlkali +
    water +
    carbonateAndInert +
    additives;
  return {
    soap,
    glycerol,
    unsaponifiedFat,
    unsaponifiable,
    freeAlkali,
    water,
    carbonateAndInert,
    additives,
    total,
    acidsInSoap,
  };
}

/** Equivalents of one fat and what its acid part weighs per equivalent. */
function part(fat: Fat, mass: number, constants: Constants) {
  const e = equivalentsPerGram(fat.saponificationValue.value, constants);
  const perEquivalent = (1 - fat.unsaponifiable) / e;
  return { fat, mass, amount: mass * e, acidMass: acidPart(fat, perEquivalent, constants) };
}

function acidPart(fat: Fat, perEquivalent: number, constants: Constants): number {
  if (fat.kind === 'glyceride') return perEquivalent - constants.glycerylResidue / 3;
  if (fat.kind === 'free-acid') return perEquivalent;
  // where a wax has no composition, acid and alcohol are taken to weigh the same
  return fat.composition ? meanMolarMass(fat.composition) : (perEquivalent + constants.water) / 2;
}

function lateAcid(charge: Charge): number {
  let sum = 0;
  for (const { additive, mass, at } of charge.additives) {
    if (!isBeforeSaponification(at)) sum += mass * additive.acidity;
  }
  for (const { liquid, mass, at } of charge.liquids) {
    if (!isBeforeSaponification(at)) sum += mass * liquid.acidity;
  }
  return sum;
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
