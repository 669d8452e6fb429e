import type { CautionDocument, FormulaDocument } from '../formulary/document.ts';

/**
 * The first `count` cautions of a document for a card or a heading, and how many more there are. A danger is
 * never among the rest: where more than `count` cautions are dangers, all of them are given.
 */
export function gravest(
  { cautions }: Pick<FormulaDocument, 'cautions'>,
  count: number,
): { readonly shown: readonly CautionDocument[]; readonly more: number } {
  const dangers = cautions.filter(({ severity }) => severity === 'danger').length;
  const shown = cautions.slice(0, Math.max(count, dangers));
  return { shown, more: cautions.length - shown.length };
}
