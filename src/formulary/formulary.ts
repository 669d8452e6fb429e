import type { Charge } from '../chemistry/charge.ts';
import type { Reference } from '../reference/reference.ts';
import type { Problem } from '../words/problem.ts';
import type { FormulaDocument } from './document.ts';
import type { Formula } from './formula.ts';

/** A formula with everything computed from it. */
export interface ComputedFormula {
  readonly formula: Formula;
  readonly document: FormulaDocument;
  /** Unrounded masses for 1000 g of fats. */
  readonly charge: Charge;
}

/** All formulas and the data they were computed with: the one object that pages are made from. */
export interface Formulary {
  readonly reference: Reference;
  /** Sorted by code, by code point. */
  readonly formulas: readonly ComputedFormula[];
}

/** Where a shop keeps its files. Nothing reads the demo shop by name. */
export interface ShopFolders {
  readonly formulas: string;
  /** The shop's own data; lies over the packaged reference data. */
  readonly data: string;
}

/** Either a whole formulary or all of its problems, never part of one. Warnings come with both. */
export type Loaded =
  | { readonly ok: true; readonly formulary: Formulary; readonly problems: readonly Problem[] }
  | { readonly ok: false; readonly problems: readonly Problem[] };
