import type { Grams } from './quantity.ts';
import type { WeighingLine } from './weighings.ts';

/** What one line must become. */
export interface CorrectedLine {
  readonly line: WeighingLine;
  /** As written for the size that was asked for. [g] */
  readonly written: Grams;
  /** As the scale showed it; as written where nothing else was said. [g] */
  readonly present: Grams;
  /** Nothing of it can be taken back. */
  readonly mixed: boolean;
  /** What to add, or with a minus to take back. [g] */
  readonly change: number;
  readonly step: number;
}
