import type { Constants } from '../chemistry/constants.ts';
import type { Curve } from '../chemistry/interpolate.ts';
import type { LyeHeatTables } from '../chemistry/lye-heat.ts';
import type {
  Additive,
  AlkaliSupply,
  Cation,
  Fat,
  FattyAcid,
  Liquid,
} from '../chemistry/materials.ts';
import type { Grams } from '../chemistry/quantity.ts';
import type { CautionThresholds } from './caution-thresholds.ts';
import type { AdditiveLabel, FatLabel, MaterialLabel } from './label.ts';
import type { TableName } from './tables.ts';

/** How a value is known. `from memory` is said wherever the value is shown. */
export type How =
  | 'measured'
  | 'standard'
  | 'handbook'
  | 'supplier'
  | 'common practice'
  | 'from memory';

/** One publication or other origin of values, from `data/sources.yaml`. */
export interface Source {
  readonly id: string;
  readonly title: string;
  readonly author: string | null;
  readonly edition: string | null;
  readonly year: number | null;
  /** What sort of evidence; its place in `ORDER_OF_CHOICE` ranks it. */
  readonly kind: SourceKind;
  readonly address: string | null;
  readonly readOn: string | null;
}

/** The declared order of choice: an earlier kind is used before a later one. */
export const ORDER_OF_CHOICE = [
  'standard',
  'pharmacopoeia',
  'regulation',
  'handbook',
  'paper',
  'supplier',
  'practice',
] as const;
export type SourceKind = (typeof ORDER_OF_CHOICE)[number];

/** One value of one source. Either `value` or at least one of `min` and `max`. */
export interface ValueRecord {
  readonly value: number | null;
  readonly min: number | null;
  readonly max: number | null;
  readonly unit: string;
  readonly source: string;
  /** The place in the source: "Table 2, coconut oil". */
  readonly at: string;
  readonly how: How;
  /** `mean` of `samples` measured samples; `range` of a standard or of samples; `typical` otherwise. */
  readonly statistic: 'range' | 'mean' | 'typical';
  readonly samples: number | null;
  /** Temperature the value belongs to, where it matters. [degC] */
  readonly temperature: number | null;
  readonly note: string | null;
}

export interface CompositionRecord {
  readonly source: string;
  readonly at: string;
  readonly how: How;
  /** Percent of total fatty acids; `min` null means not stated (reckoned as 0). */
  readonly acids: readonly {
    readonly acid: string;
    readonly min: number | null;
    readonly max: number;
  }[];
  readonly note: string | null;
}

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

export interface Scale {
  readonly id: string;
  readonly name: string;
  readonly step: Grams;
  /** Largest error of one weighing, half-width. */
  readonly error: Grams;
  /** Largest weight it takes. */
  readonly capacity: Grams;
}

/** A size the shop pours. Exactly one of the four ways to state it. */
export interface BatchSize {
  readonly id: string;
  readonly label: string;
  readonly size:
    | { readonly by: 'fats'; readonly mass: Grams }
    | { readonly by: 'batter'; readonly mass: Grams }
    | { readonly by: 'bars'; readonly count: number; readonly wetMass: Grams }
    | { readonly by: 'mould'; readonly millilitres: number };
  /** Batter that stays in pots and moulds, as a fraction of what is made. */
  readonly losses: number;
  /** Scale ids; a weight within the fine scale's capacity is weighed there. */
  readonly scale: string;
  readonly fineScale: string | null;
  readonly kinds: readonly ('bar' | 'paste' | 'liquid')[];
  /** What the vessel holds in which this size is mixed or cooked, where the shop states it. [mL] */
  readonly vessel?: number;
}

export interface Shop {
  readonly name: string;
  readonly invented: boolean;
  /** Where the handbook is served, with a slash at its end; `null` where it has no address. */
  readonly siteAddress: string | null;
  readonly batches: readonly BatchSize[];
  readonly scales: readonly Scale[];
  /** Lye water and fats start from here. [degC] */
  readonly startTemperature: number;
  /** Water left in a released bar, percent by mass. */
  readonly releaseMoisture: number;
  /** How far rounding may move the superfat before a size is too small for the scale. [percentage points] */
  readonly largestSuperfatShift: number;
  readonly emergency: readonly { readonly label: string; readonly value: string }[];
  readonly rules: readonly string[];
  readonly releaseLimits: readonly ReleaseLimit[];
}

/** Which end of which interval must stay at or above which floor, for which formulas. The last match wins. */
export interface ReleaseLimit {
  readonly kind: 'bar' | 'paste' | 'liquid' | 'any';
  readonly process: 'cold' | 'hot' | 'any';
  readonly end: 'expanded' | 'worst-case';
  /** Percent superfat. */
  readonly floor: number;
}

/** Fats that the shop keeps mixed and weighs as one. */
export interface Blend {
  readonly id: string;
  readonly name: string;
  /** Percent by mass of the blend; they sum to 100. */
  readonly parts: readonly { readonly fat: string; readonly share: number }[];
  readonly notes: readonly string[];
}

export type LotStatus = 'quarantine' | 'released' | 'rejected';

/** Where an entry stands, for problems that are only found once formulas are read. */
export interface DataPlace {
  readonly file: string;
  readonly line: number;
  readonly column: number;
}

/** A value of a lot with the half-width of its k = 2 interval. */
export interface Measured {
  readonly value: number;
  readonly uncertainty: number;
  readonly method: string;
}

/** A lot of a fat. At least one of its two values was measured. */
export interface FatLot {
  readonly fat: string;
  readonly lot: string;
  /** [mg KOH/g] Decides the weights of a released lot. */
  readonly saponificationValue: Measured | null;
  /**
   * Free acidity. [mg KOH/g] A saponification value counts the free acids already, so this adds no alkali.
   * It is the saponification value of a free acid, and of a wax what is sure to react in cold process.
   */
  readonly acidValue: Measured | null;
  readonly status: LotStatus;
  readonly opened: string | null;
  readonly retestBy: string;
  readonly place: DataPlace;
}

export interface AlkaliLot {
  readonly alkali: string;
  readonly lot: string;
  readonly form: 'solid' | 'solution';
  /** Percent hydroxide by mass, and the half-width of its k = 2 interval. */
  readonly assay: number;
  readonly uncertainty: number;
  readonly carbonate: number;
  readonly status: LotStatus;
  readonly opened: string | null;
  readonly retestBy: string;
  readonly place: DataPlace;
}

/** One set of points that one source gives for one curve. */
export interface TableSet {
  readonly solute: 'sodium-hydroxide' | 'potassium-hydroxide' | 'potassium-carbonate';
  readonly source: string;
  readonly at: string;
  readonly how: How;
  readonly note: string | null;
  /** [degC] */
  readonly temperature: number | null;
  /** Beyond the range in which the source's fit holds: shown, never used. */
  readonly extrapolated: boolean;
  /** Of a heat of solution: its limit at infinite dilution. [kJ/mol] */
  readonly infiniteDilution: number | null;
  /** Empty where the source gives the limit alone. */
  readonly points: Curve;
  /** Whether a model reads it. */
  readonly used: boolean;
}

/** A grade of a published standard of toilet soap: what its total fatty matter must at least be. */
export interface SoapGrade {
  readonly name: string;
  readonly totalFattyMatter: ValueRecord;
}

/** Everything under `data/`, read, checked and turned into what the core takes. */
export interface Reference {
  /** Standard atomic weights with their source, by symbol. */
  readonly elements: ReadonlyMap<string, ValueRecord>;
  /** Derived from `elements.yaml` by `constantsFrom`. */
  readonly constants: Constants;
  /** From `data/tables/`, ready for the models. */
  readonly tables: {
    readonly lyeHeat: Readonly<Record<Cation, LyeHeatTables>>;
    /** Density at 20 degC [g/mL] by mass percent of hydroxide. */
    readonly lyeDensity: Readonly<Record<Cation, Curve>>;
    /** Temperature at which a stock lye begins to crystallise [degC] by mass percent; empty without data. */
    readonly crystallisation: Readonly<Record<Cation, Curve>>;
    /** Where the heats of solution and the heat capacities come from, in words for the working. */
    readonly lyeHeatSources: Readonly<Record<Cation, readonly string[]>>;
    readonly heatCapacitySources: Readonly<Record<Cation, readonly string[]>>;
    /** Every set of every table as its source gives it, the ones that no model uses among them. */
    readonly sets: Readonly<Record<TableName, readonly TableSet[]>>;
  };
  /** Grades of toilet soap by total fatty matter, the highest first. */
  readonly soapGrades: readonly SoapGrade[];
  readonly acids: ReadonlyMap<string, AcidRecord>;
  readonly fats: ReadonlyMap<string, FatRecord>;
  readonly alkalis: ReadonlyMap<string, AlkaliRecord>;
  readonly additives: ReadonlyMap<string, AdditiveRecord>;
  readonly liquids: ReadonlyMap<string, LiquidRecord>;
  readonly sources: ReadonlyMap<string, Source>;
  readonly shop: Shop;
  /** Empty where the shop keeps none. */
  readonly blends: ReadonlyMap<string, Blend>;
  readonly lots: { readonly fats: readonly FatLot[]; readonly alkalis: readonly AlkaliLot[] };
  /** From `cautions.yaml`, by `cautionsSchema` and `cautionThresholdsFrom`. */
  readonly cautionThresholds: CautionThresholds;
}
