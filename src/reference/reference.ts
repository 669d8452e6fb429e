import type { Constants } from '../chemistry/constants.ts';
import type { Curve } from '../chemistry/interpolate.ts';
import type { LyeHeatTables } from '../chemistry/lye-heat.ts';
import type { Cation } from '../chemistry/materials.ts';
import type { CautionThresholds } from './caution-thresholds.ts';
import type { AlkaliLot, FatLot } from './lot-records.ts';
import type {
  AcidRecord,
  AdditiveRecord,
  AlkaliRecord,
  FatRecord,
  LiquidRecord,
} from './material-records.ts';
import type { Blend, Shop } from './shop-records.ts';
import type { TableName } from './tables.ts';
import type { How, Source, ValueRecord } from './values.ts';

/** A place in a source, and how what stands there is known. */
export type Cited = Pick<TableSet, 'source' | 'at' | 'how'>;

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
    /** Where the heats of solution and the heat capacities come from, for the working. */
    readonly lyeHeatSources: Readonly<Record<Cation, readonly Cited[]>>;
    readonly heatCapacitySources: Readonly<Record<Cation, readonly Cited[]>>;
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
  /** Prose of the packaged data in the language of the shop, by its English text; empty in English. */
  readonly phrases: Readonly<Record<string, string>>;
  readonly shop: Shop;
  /** Empty where the shop keeps none. */
  readonly blends: ReadonlyMap<string, Blend>;
  readonly lots: { readonly fats: readonly FatLot[]; readonly alkalis: readonly AlkaliLot[] };
  /** From `cautions.yaml`, by `cautionsSchema` and `cautionThresholdsFrom`. */
  readonly cautionThresholds: CautionThresholds;
}
