import type { Charge } from './charge.ts';
import type { Constants } from './constants.ts';
import { meanMolarMass } from './fatty-acids.ts';
import type { Fat } from './materials.ts';
import { equivalentsPerGram, isBeforeSaponification } from './saponification.ts';
import { AS_USED, equivalentsOf } from './superfat.ts';

/** What one fat has become once the alkali has done its work. [g], amounts in [mol] */
export interface FatFate {
  readonly fat: Fat;
  /** The liquid that brought the fat; `null` where it was weighed as a fat. */
  readonly carrier: string | null;
  /** Acid bound in soap, by amount and as fatty acid by mass. */
  readonly boundAcid: number;
  readonly boundAcidMass: number;
  readonly glycerol: number;
  /** With the acid that later acids set free from the soap again. */
  readonly unsaponifiedFat: number;
  /** Of the fat, and the alcohols that a wax ester leaves. */
  readonly unsaponifiable: number;
  readonly waterFormed: number;
}

export interface Fates {
  readonly fats: readonly FatFate[];
  /** Hydroxide neutralised by acids that join before saponification. [mol] */
  readonly neutralised: number;
  /** Soap turned back by acids that join later. [mol] */
  readonly freed: number;
  /** Hydroxide that found nothing to react with. [mol] */
  readonly leftOver: number;
}

/**
 * What becomes of each fat of a charge.
 *
 * Free fatty acids react first, to soap and water; then glycerides, to soap and glycerol, and wax esters, to
 * soap and fatty alcohols, all to the same extent. What the acid part of a glyceride weighs follows from its
 * saponification value, M = (1 - u) / e - 38.049 / 3 per equivalent, so that mass closes whatever value is
 * used; the composition is the cross-check, not the basis. Acid that joins later turns soap back into
 * fatty acid, from every soap in proportion. Ignored: free acids inside natural fats, carbonation by air.
 */
export function fatesOfFats(charge: Charge, constants: Constants): Fates {
  const { hydroxide, acid } = equivalentsOf(charge, AS_USED, constants);
  const brought = charge.liquids.flatMap(({ liquid, mass, at }) =>
    liquid.fatData
      ? [{ fat: liquid.fatData, mass: mass * liquid.fat, at, carrier: liquid.id }]
      : [],
  );
  const reacting = [
    ...charge.fats.map(({ fat, mass }) => ({ fat, mass, carrier: null })),
    ...brought.filter(({ at }) => isBeforeSaponification(at)),
  ].map(({ fat, mass, carrier }) => ({ ...part(fat, mass, constants), carrier }));
  const bystanders = [
    ...charge.afterCookFats.map(({ fat, mass }) => ({ fat, mass, carrier: null })),
    ...brought.filter(({ at }) => !isBeforeSaponification(at)),
  ];

  const sumOf = (kind: (kind: Fat['kind']) => boolean) =>
    reacting.reduce((sum, { fat, amount }) => sum + (kind(fat.kind) ? amount : 0), 0);
  const available = Math.max(0, hydroxide - acid);
  const freeAcids = sumOf((kind) => kind === 'free-acid');
  const esters = sumOf((kind) => kind !== 'free-acid');
  const toFreeAcids = Math.min(available, freeAcids);
  const toEsters = Math.min(available - toFreeAcids, esters);
  const soap = toFreeAcids + toEsters;
  const freed = Math.min(lateAcid(charge), soap);
  const kept = soap > 0 ? 1 - freed / soap : 0;

  const reacted = reacting.map(({ fat, carrier, mass, amount, acidMass }): FatFate => {
    const extent =
      fat.kind === 'free-acid' ? freeAcids && toFreeAcids / freeAcids : esters && toEsters / esters;
    const moles = amount * extent;
    const saponifiable = mass * (1 - fat.unsaponifiable);
    // a wax ester splits into acid and alcohol; what the acid does not take is alcohol
    const alcohols =
      fat.kind === 'wax' ? saponifiable * extent + moles * (constants.water - acidMass) : 0;
    return {
      fat,
      carrier,
      boundAcid: moles * kept,
      boundAcidMass: moles * kept * acidMass,
      glycerol: fat.kind === 'glyceride' ? (moles / 3) * constants.glycerol : 0,
      unsaponifiedFat: saponifiable * (1 - extent) + moles * (1 - kept) * acidMass,
      unsaponifiable: mass * fat.unsaponifiable + alcohols,
      waterFormed: fat.kind === 'free-acid' ? moles * constants.water : 0,
    };
  });
  const untouched = bystanders.map(
    ({ fat, carrier, mass }): FatFate => ({
      fat,
      carrier,
      boundAcid: 0,
      boundAcidMass: 0,
      glycerol: 0,
      unsaponifiedFat: mass * (1 - fat.unsaponifiable),
      unsaponifiable: mass * fat.unsaponifiable,
      waterFormed: 0,
    }),
  );
  return {
    fats: [...reacted, ...untouched],
    neutralised: Math.min(acid, hydroxide),
    freed,
    leftOver: available - soap,
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
