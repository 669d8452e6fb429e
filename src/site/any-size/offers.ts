import type { AnySizeData } from '../../browser/any-size-data.ts';
import type { ComputedFormula } from '../../formulary/formulary.ts';
import type { SiteInput } from '../input.ts';
import { anySizeData } from './any-size-data.ts';

type From = Pick<SiteInput, 'edition' | 'formulary'>;

/** Why a formula page offers no other size; `not-turned-on` is not spoken of. */
export type NotOffered = 'not-turned-on' | 'not-approved' | 'no-weights';

/** What the page of a formula needs to reckon any size, or why it must not. */
export function anySizeOf(
  computed: ComputedFormula,
  { edition, formulary: { reference } }: From,
): AnySizeData | NotOffered {
  if (!reference.shop.anySize) return 'not-turned-on';
  if (edition.states.get(computed.document.code) !== 'approved') return 'not-approved';
  return anySizeData(computed, reference) ?? 'no-weights';
}

/** All formulas that offer other sizes. */
export function anySizeOffers(
  from: From,
): readonly { readonly computed: ComputedFormula; readonly data: AnySizeData }[] {
  return from.formulary.formulas.flatMap((computed) => {
    const data = anySizeOf(computed, from);
    return typeof data === 'string' ? [] : [{ computed, data }];
  });
}
