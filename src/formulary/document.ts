import type { Schedule } from './schedule.ts';

/**
 * One computed formula as plain data: what `npm run compute` prints, what `data/formulas/CODE.json`
 * holds and what the pages are made from. Unrounded. Masses in g per 1000 g of the fats that the alkali
 * is reckoned on (in `batches`: in g of that batch); shares and superfats in percent; temperatures in
 * degrees Celsius. A number that cannot be given is `null`, with the breach beside it.
 */
export interface FormulaDocument {
  readonly schema: 1;
  readonly code: string;
  readonly name: string;
  readonly kind: 'bar' | 'paste' | 'liquid';
  readonly process: 'cold' | 'hot';
  readonly revision: number;
  readonly fingerprint: string | null;
  readonly fats: readonly FatLine[];
  readonly afterCookFats: readonly FatLine[];
  readonly alkali: readonly AlkaliLine[];
  /** To add; stock lye's own water and the water in liquids not counted. */
  readonly water: number;
  /** Part of `water` that is kept out of the lye and joins later. */
  readonly heldBack: number;
  readonly liquids: readonly {
    readonly id: string;
    readonly at: string;
    readonly mass: number;
    readonly water: number;
    readonly fat: number;
    readonly sugar: number;
  }[];
  readonly additives: readonly {
    readonly id: string;
    readonly at: string;
    readonly mass: number;
    readonly percentOfFats: number;
  }[];
  readonly lye: {
    /** Percent: alkali as weighed / (that + all water), by the design's definition. */
    readonly concentration: number;
    /** Percent: the same with held-back water and liquids that join later left out. */
    readonly asMade: number;
    readonly peakTemperature: number | null;
    /** Coolest and hottest data set. */
    readonly peakTemperatureSpread: readonly [number, number] | null;
    /** The shop's temperature of alkali and water, from which the peak is reckoned. */
    readonly startTemperature: number;
    /** The peak if no water were held back; `null` where none is, or where there is no number. */
    readonly peakWithAllWater: number | null;
    readonly boilingPoint: number | null;
    /** Percent hydroxide in a saturated lye, to be held against `pureAsMade`. */
    readonly saturation: { readonly atStart: number | null; readonly atPeak: number | null };
    /** Percent hydroxide in hydroxide and water, in the pot. */
    readonly pureAsMade: number;
  };
  readonly equivalents: {
    /** mol per 1000 g of fats. */
    readonly saponifiable: number;
    readonly acid: number;
    readonly hydroxide: number;
  };
  readonly superfat: {
    readonly written: number;
    /** Without scale: from fats' ranges and assay. */
    readonly expanded: readonly [number, number];
    readonly worstCase: readonly [number, number];
    /** With after-cook fats and later acids. */
    readonly final: number;
    /**
     * Reckoned anew by published and trade ranges, as if no lot were released; `null` where no lot decides
     * or where the formula could not be made so.
     */
    readonly withoutLots: {
      readonly expanded: readonly [number, number];
      readonly worstCase: readonly [number, number];
    } | null;
    /** Where alkali compensates an acid: the superfat with the acid left out. */
    readonly ifAcidForgotten: number | null;
    /** Contributions to the expanded interval, largest first; half-widths at k = 2 in percentage points. */
    readonly budget: readonly { readonly id: string; readonly halfWidth: number }[];
  };
  /** The shop's release limit for this kind and process, and whether formula and batches keep it. */
  readonly release: ReleaseCheck;
  readonly profile: Profile | null;
  readonly yield: Yield;
  readonly schedule: Schedule;
  readonly batches: readonly BatchDocument[];
  readonly cautions: readonly CautionDocument[];
  readonly breaches: readonly {
    readonly path: string;
    readonly rule: string;
    readonly numbers: Readonly<Record<string, number>>;
  }[];
}

export interface ReleaseCheck {
  readonly end: 'expanded' | 'worst-case';
  /** Percent superfat. */
  readonly floor: number;
  /** The lowest such end over the formula and its batches, and where it was found. */
  readonly lowest: number;
  readonly batch: string | null;
  readonly met: boolean;
  /** Permission to publish below the limit (ISO 9000 sense). */
  readonly concession: { readonly reason: string; readonly by: string; readonly on: string } | null;
}

export interface FatLine {
  readonly id: string;
  /** Of a part of a blend: the blend, which is weighed as one. The fat may stand here a second time. */
  readonly blend?: string;
  readonly mass: number;
  readonly share: number;
  readonly saponificationValue: {
    readonly value: number;
    readonly low: number;
    readonly high: number;
    readonly source: string;
    readonly lot?: string;
  };
}

export interface AlkaliLine {
  readonly id: string;
  readonly moles: number;
  readonly pureMass: number;
  readonly assay: {
    readonly value: number;
    readonly low: number;
    readonly high: number;
    readonly source?: string;
    readonly lot?: string;
  };
  readonly form: 'solid' | 'solution';
  readonly weighedMass: number;
}

export interface Profile {
  /** Percent of the fatty acids by mass. */
  readonly acids: Readonly<Record<string, number>>;
  readonly saturated: number;
  readonly monounsaturated: number;
  readonly polyunsaturated: number;
  readonly saponificationValue: number;
  readonly iodineValue: number;
  readonly oxidisability: number;
  /** Knothe 2002: 18:2 + 2 x 18:3. */
  readonly bisAllylicPositions: number;
  /** Carbons per fatty acid, number average. */
  readonly meanChainLength: number;
  /** Percent by mass per carbon number, `{ "12": 24.1 }`. */
  readonly chainLengths: Readonly<Record<string, number>>;
  readonly meanMolarMass: number;
}

/** Closed balance: `soap + glycerol + ... = total`, in g. */
export interface Yield {
  readonly soap: number;
  readonly glycerol: number;
  readonly unsaponifiedFat: number;
  readonly unsaponifiable: number;
  readonly freeAlkali: number;
  readonly water: number;
  readonly carbonateAndInert: number;
  readonly additives: number;
  readonly total: number;
  /** Percent by mass, fresh and dried to the shop's release moisture. */
  readonly totalFattyMatter: { readonly fresh: number; readonly released: number };
  readonly glycerolShare: { readonly fresh: number; readonly released: number };
  /** Mass when dried to the release moisture; equal to `total` for pastes and liquids. */
  readonly releasedMass: number;
  readonly moisture: { readonly fresh: number; readonly released: number };
}

export interface BatchDocument {
  readonly id: string;
  readonly label: string;
  readonly digest: string | null;
  /** g between two marks of the scale, per line below as `step`. A blend is one line, under its own id. */
  readonly fats: readonly WeighedLine[];
  readonly afterCookFats: readonly WeighedLine[];
  /** Of a stock lye `solution` is its percent of hydroxide: the weight is of the solution. */
  readonly alkali: readonly (WeighedLine & { readonly solution?: number })[];
  readonly weighedWater: number | null;
  readonly waterStep: number;
  /** Part of `weighedWater`; weighed on its own, so with a step of its own. */
  readonly weighedHeldBack: number | null;
  readonly heldBackStep: number;
  readonly liquids: readonly (WeighedLine & { readonly at: string })[];
  readonly additives: readonly (WeighedLine & { readonly at: string })[];
  /** Mass of the fats that the alkali is reckoned on, as weighed. */
  readonly massOfFats: number | null;
  /** Mass of all that is weighed. */
  readonly total: number | null;
  readonly superfat: {
    readonly weighed: number;
    readonly expanded: readonly [number, number];
    readonly worstCase: readonly [number, number];
  } | null;
  readonly bars: number | null;
  /** After the shop's losses for this size. [g] */
  readonly yield: {
    /** What reaches the moulds or the vat. */
    readonly poured: number;
    /** The same dried to the release moisture; equal to `poured` for pastes and liquids. */
    readonly releasedMass: number;
    /** Dry soap in it. */
    readonly soap: number;
  } | null;
  /** Why there are no weights: the breach. The arrays above are then empty. */
  readonly refused: {
    readonly rule: string;
    readonly numbers: Readonly<Record<string, number>>;
  } | null;
}

export interface WeighedLine {
  readonly id: string;
  readonly weighedMass: number;
  /** The scale's step that this weight was rounded to. */
  readonly step: number;
}

export interface CautionDocument {
  readonly id: string;
  readonly severity: 'danger' | 'warning' | 'care' | 'note';
  readonly numbers: Readonly<Record<string, number | string>>;
  readonly text: string;
  /** What to do. */
  readonly action: string;
  /** A source id, `common practice, no source`, or `reckoned here, see methods`. */
  readonly basis: string;
}
