import type {
  Fraction,
  GramsPerMillilitre,
  GramsPerMole,
  IodineValue,
  MgKohPerGram,
  MolesPerGram,
  Range,
} from './quantity.ts';

/** What the core needs to know of the things that go into a batch. Read from `data/` by `src/reference`. */

export interface FattyAcid {
  /** `C18:1`, `C18:1-OH`: carbons, double bonds, hydroxyl groups. */
  readonly id: string;
  readonly carbons: number;
  readonly doubleBonds: number;
  readonly hydroxyls: number;
  readonly molarMass: GramsPerMole;
  /** Iodine value of the pure triglyceride and of the pure free acid, per percent of the acid. */
  readonly iodineFactor: { readonly glyceride: number; readonly acid: number };
}

/** Percent by mass of total fatty acids as fractions; the shares sum to 1. */
export type Composition = readonly { readonly acid: FattyAcid; readonly share: Fraction }[];

/** How a fat meets alkali: glycerides give glycerol, free acids give water, wax esters give fatty alcohols. */
export type FatKind = 'glyceride' | 'free-acid' | 'wax';

export interface Fat {
  readonly id: string;
  readonly kind: FatKind;
  readonly saponificationValue: Range<MgKohPerGram>;
  /** Of a wax: what its free acids alone consume, which is all that is sure to react in cold process. */
  readonly acidValue: Range<MgKohPerGram>;
  /** Unsaponifiable matter, mass per mass of fat. Of a wax: hydrocarbons and free alcohols only. */
  readonly unsaponifiable: Fraction;
  /** `null` where no composition is known: then no profile is given. */
  readonly composition: Composition | null;
  /** Tabulated value, used where none can be computed (waxes, no composition). */
  readonly iodineValue: IodineValue | null;
  readonly density: GramsPerMillilitre | null;
}

export type Cation = 'Na' | 'K';

export interface AlkaliSupply {
  readonly id: string;
  readonly cation: Cation;
  readonly form: 'solid' | 'solution';
  /** Hydroxide alone, mass per mass as weighed. */
  readonly assay: Range<Fraction>;
  /** Carbonate, mass per mass as weighed. */
  readonly carbonate: Fraction;
  /** What the rest of the weighed mass is: water (flake, solution) or inert salts. */
  readonly remainder: 'water' | 'inert';
}

/** When something joins the batch. `lye`, `fats` and `trace` come before saponification. */
export type Stage = 'lye' | 'fats' | 'trace' | 'after-cook' | 'dilution';

export interface Additive {
  readonly id: string;
  /** Water brought along, mass per mass as supplied (crystal water counted). */
  readonly water: Fraction;
  /** Acid protons that alkali neutralises in soap, per gram as supplied; 0 for neutral things. */
  readonly acidity: MolesPerGram;
}

/** A liquid that stands in for part of the water. Mass fractions as supplied. */
export interface Liquid {
  readonly id: string;
  readonly water: Fraction;
  readonly fat: Fraction;
  readonly sugar: Fraction;
  readonly acidity: MolesPerGram;
  /** The fat it carries; required where `fat` is above zero. */
  readonly fatData: Fat | null;
}
