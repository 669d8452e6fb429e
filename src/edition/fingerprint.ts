import type { Formula } from '../formulary/formula.ts';
import type { Reference } from '../reference/reference.ts';
import { approvedContent } from './approved-content.ts';
import { digestOf } from './digest.ts';

/** The digest of exactly what is approved of a formula. */
export function fingerprintOf(formula: Formula, reference: Reference): string {
  return digestOf(approvedContent(formula, reference));
}
