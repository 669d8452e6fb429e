import type { FormulaDocument } from '../formulary/document.ts';
import type { Reference } from '../reference/reference.ts';
import { words } from '../words/catalogue.ts';
import { nameOf } from './names.ts';

/** The largest contributions to the expanded interval, named for people. Half-widths in percentage points. */
export function budgetLines(
  { superfat }: FormulaDocument,
  reference: Reference,
): readonly { readonly name: string; readonly halfWidth: number }[] {
  return superfat.budget
    .filter(({ halfWidth }) => halfWidth >= 0.005)
    .map(({ id, halfWidth }) => ({ name: contributionName(id, reference), halfWidth }));
}

function contributionName(id: string, reference: Reference): string {
  const [kind, of] = id.split(':');
  if ((kind === 'fat' || kind === 'liquid') && of) return nameOf(reference, of);
  if (kind === 'assay' && of) return words.marginWords.assay(nameOf(reference, of));
  return kind === 'scale' ? words.marginWords.scale : id;
}
