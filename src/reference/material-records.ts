import type { Additive, AlkaliSupply, Fat, FattyAcid, Liquid } from '../chemistry/materials.ts';
import type { AdditiveLabel, FatLabel, MaterialLabel } from './label.ts';
import type { CompositionRecord, ValueRecord } from './values.ts';

export interface FatRecord {
  readonly id: string;
  readonly file: string;
  readonly name: string;
  readonly inci: string;
  readonly kind: Fat['kind'];
  readonly origin: 'plant' | 'animal';
  /** Of the oil palm: what "palm-free" looks at. */
  readonly palm: boolean;
  /** Allergen source words for label and cautions: `tree nuts`, `peanut`, `soy`, `sesame`, `milk`, `wheat`. */
  readonly allergens: readonly string[];
  readonly label: FatLabel;
  readonly saponificationValues: readonly ValueRecord[];
  readonly acidValues: readonly ValueRecord[];
  readonly iodineValues: readonly ValueRecord[];
  readonly relativeDensities: readonly ValueRecord[];
  readonly unsaponifiableMatter: readonly ValueRecord[];
  readonly compositions: readonly CompositionRecord[];
  readonly notes: readonly string[];
  /** The records that won by the order of choice, to be named wherever the number is used. */
  readonly chosen: {
    readonly saponificationValue: ValueRecord | null;
    /** A documented mean of samples that lowers the value used below the middle of the range. */
    readonly loweredBy: ValueRecord | null;
    readonly iodineValue: ValueRecord | null;
    readonly composition: CompositionRecord | null;
    readonly unsaponifiable: ValueRecord | null;
    readonly density: ValueRecord | null;
  };
  /** What the core computes with; `null` where no saponification value with a range is known. */
  readonly core: Fat | null;
}

export interface AcidRecord {
  readonly acid: FattyAcid;
  readonly name: string;
  readonly systematicName: string;
  readonly formula: string;
  readonly iodineFactor: ValueRecord | null;
  readonly meltingPoint: ValueRecord | null;
}

export interface AlkaliRecord {
  readonly id: 'sodium-hydroxide' | 'potassium-hydroxide';
  readonly name: string;
  readonly inci: string;
  readonly formula: string;
  readonly cation: 'Na' | 'K';
  readonly assays: readonly ValueRecord[];
  /** Without a lot: reckoned at the top of the trade range. */
  readonly trade: AlkaliSupply;
  readonly notes: readonly string[];
}

export interface AdditiveRecord {
  readonly id: string;
  readonly name: string;
  readonly inci: string;
  readonly kind:
    | 'acid'
    | 'salt'
    | 'sugar'
    | 'clay'
    | 'mineral'
    | 'colour'
    | 'fragrance'
    | 'botanical'
    | 'antioxidant'
    | 'chelator'
    | 'solvent'
    | 'other';
  readonly origin: 'plant' | 'animal' | 'mineral' | 'synthetic';
  readonly allergens: readonly string[];
  readonly label: AdditiveLabel;
  readonly values: readonly (ValueRecord & { readonly name: string })[];
  readonly notes: readonly string[];
  /** What its acid or hydrate is made of; `null` for mixtures and neutral things. */
  readonly substance: {
    readonly formula: string;
    readonly crystalWater: number | null;
    readonly protons: number | null;
  } | null;
  readonly core: Additive;
}

export interface LiquidRecord {
  readonly id: string;
  readonly name: string;
  readonly inci: string;
  readonly origin: 'plant' | 'animal' | 'mineral';
  readonly allergens: readonly string[];
  readonly label: MaterialLabel;
  /** The fat's id, where it carries any. */
  readonly fat: string | null;
  /** `water`, `fat`, `sugar`, `acid`, in g per 100 g. */
  readonly values: readonly (ValueRecord & { readonly name: string })[];
  readonly notes: readonly string[];
  readonly core: Liquid;
}
