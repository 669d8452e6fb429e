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
