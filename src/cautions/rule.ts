import type { Charge } from '../chemistry/charge.ts';
import type { FormulaDocument } from '../formulary/document.ts';
import type { Formula } from '../formulary/formula.ts';
import type {
  CautionThresholds,
  COMMON_PRACTICE,
  LimitName,
  MaterialListName,
} from '../reference/caution-thresholds.ts';
import type { Reference } from '../reference/reference.ts';
import type { CautionId, CautionNumbers } from '../words/en/cautions.ts';

/**
 * By the harm to the person, gravest first. danger: can burn or injure. warning: can injure if mishandled, or
 * makes an unsafe soap. care: spoils the batch or needs attention. note: good to know.
 */
export const SEVERITIES = ['danger', 'warning', 'care', 'note'] as const;
export type Severity = (typeof SEVERITIES)[number];

/** Follows from the formula's own numbers by the models of the methods page, which names their sources. */
export const RECKONED = 'reckoned here, see methods';

/** Where a rule comes from; a limit or a list of materials carries its own basis in the data. */
export type Basis =
  | typeof COMMON_PRACTICE
  | typeof RECKONED
  | { readonly limit: LimitName }
  | { readonly materials: MaterialListName }
  /** The source of the one set of a table that is used. */
  | { readonly table: keyof Reference['tables']['sets'] };

/** All that a rule may look at. */
export interface CautionContext {
  readonly formula: Formula;
  readonly document: FormulaDocument;
  /** Unrounded, for 1000 g of fats. */
  readonly charge: Charge;
  readonly reference: Reference;
  readonly thresholds: CautionThresholds;
  /** `YYYY-MM-DD`; `null` where no day is given, and then no rule speaks of dates. */
  readonly asOf: string | null;
}

/** When a caution applies. Its words are in `src/words/en`, under the same id. */
export interface CautionRule<Id extends CautionId> {
  readonly id: Id;
  readonly severity: Severity;
  readonly basis: Basis;
  /** The numbers that triggered it, once per batch or material where it speaks of one; none: silent. */
  readonly applies: (context: CautionContext) => readonly CautionNumbers[Id][];
}
