import type { Constants } from './constants.ts';
import {
  fattyAcidContent,
  freeAcidIodineValue,
  glycerideIodineValue,
  meanMolarMass,
} from './fatty-acids.ts';
import type { Fat, FattyAcid } from './materials.ts';
import { given, type Outcome, refused } from './quantity.ts';

/** What the fats of a formula are made of, by measures that can be checked in a laboratory. */
export interface AcidProfile {
  /** Fractions by mass of the fatty acids; sum to 1. In the order of chain length, then double bonds. */
  readonly acids: readonly { readonly acid: FattyAcid; readonly share: number }[];
  readonly saturated: number;
  readonly monounsaturated: number;
  readonly polyunsaturated: number;
  /** [mg KOH/g], mass-weighted over the fats by the values used. */
  readonly saponificationValue: number;
  /** [g I2/100 g], computed from the acids; of waxes the tabulated value. */
  readonly iodineValue: number;
  /** COX, Fatemi and Hammond 1980: (18:1 + 10.3 x 18:2 + 21.6 x 18:3) / 100, percents of the acids. */
  readonly oxidisability: number;
  /** BAPE, Knothe 2002: 18:2 + 2 x 18:3, percents of the acids. */
  readonly bisAllylicPositions: number;
  /** Carbons per fatty acid, number average. */
  readonly meanChainLength: number;
  /** Number average. [g/mol] */
  readonly meanMolarMass: number;
  /** Fractions by mass, by carbon number. */
  readonly chainLengths: ReadonlyMap<number, number>;
}

/**
 * Acid profile of a blend of fats given by mass, after-cook fats included if they are passed in.
 *
 * Shares are by mass of total fatty acids: each fat counts with the acids it holds, 3M / (3M + 38.049) of its
 * saponifiable part for glycerides. Refuses `composition-not-known` where a fat has none, and
 * `iodine-value-not-known` where a wax has no tabulated one; partial profiles are never given.
 */
export function acidProfile(
  fats: readonly { readonly fat: Fat; readonly mass: number }[],
  constants: Constants,
): Outcome<AcidProfile> {
  const byAcid = new Map<string, { acid: FattyAcid; mass: number }>();
  let fatMass = 0;
  let unknown = 0;
  let saponification = 0;
  let iodine = 0;
  for (const { fat, mass } of fats) {
    fatMass += mass;
    saponification += mass * fat.saponificationValue.value;
    if (!fat.composition) {
      unknown += mass;
      continue;
    }
    const value = iodineValueOf(fat);
    if (value === null) return refused('iodine-value-not-known', { mass });
    iodine += mass * value;
    const acids = mass * (1 - fat.unsaponifiable) * acidShare(fat, constants);
    for (const { acid, share } of fat.composition) {
      const entry = byAcid.get(acid.id);
      if (entry) entry.mass += acids * share;
      else byAcid.set(acid.id, { acid, mass: acids * share });
    }
  }
  if (unknown > 0)
    return refused('composition-not-known', { percentOfFats: (100 * unknown) / fatMass });

  const parts = [...byAcid.values()].sort(
    (a, b) =>
      a.acid.carbons - b.acid.carbons ||
      a.acid.doubleBonds - b.acid.doubleBonds ||
      a.acid.hydroxyls - b.acid.hydroxyls,
  );
  const total = parts.reduce((sum, { mass }) => sum + mass, 0);
  const acids = parts.map(({ acid, mass }) => ({ acid, share: mass / total }));
  const where = (test: (acid: FattyAcid) => boolean) =>
    acids.reduce((sum, { acid, share }) => sum + (test(acid) ? share : 0), 0);
  const percent = (id: string) => 100 * where((acid) => acid.id === id);
  const chainLengths = new Map<number, number>();
  let molesPerGram = 0;
  let carbonsPerGram = 0;
  for (const { acid, share } of acids) {
    chainLengths.set(acid.carbons, (chainLengths.get(acid.carbons) ?? 0) + share);
    molesPerGram += share / acid.molarMass;
    carbonsPerGram += (share / acid.molarMass) * acid.carbons;
  }
  return given({
    acids,
    saturated: where(({ doubleBonds }) => doubleBonds === 0),
    monounsaturated: where(({ doubleBonds }) => doubleBonds === 1),
    polyunsaturated: where(({ doubleBonds }) => doubleBonds > 1),
    saponificationValue: saponification / fatMass,
    iodineValue: iodine / fatMass,
    oxidisability: (percent('C18:1') + 10.3 * percent('C18:2') + 21.6 * percent('C18:3')) / 100,
    bisAllylicPositions: percent('C18:2') + 2 * percent('C18:3'),
    meanChainLength: carbonsPerGram / molesPerGram,
    meanMolarMass: 1 / molesPerGram,
    chainLengths,
  });
}

function iodineValueOf(fat: Fat): number | null {
  if (fat.kind === 'wax' || !fat.composition) return fat.iodineValue;
  return fat.kind === 'glyceride'
    ? glycerideIodineValue(fat.composition)
    : freeAcidIodineValue(fat.composition);
}

function acidShare(fat: Fat, constants: Constants): number {
  if (!fat.composition || fat.kind === 'free-acid') return 1;
  const mean = meanMolarMass(fat.composition);
  if (fat.kind === 'glyceride') return fattyAcidContent(mean, constants);
  return (fat.saponificationValue.value / (1000 * constants.hydroxide.K)) * mean;
}
