import type { AnySizeData } from '../../browser/any-size-data.ts';
import type { StateInUse } from '../../edition/approval.ts';
import type { Edition } from '../../edition/edition.ts';
import type { ComputedFormula } from '../../formulary/formulary.ts';
import type { Reference } from '../../reference/reference.ts';
import { anySizeData } from './any-size-data.ts';

/** Why a formula page offers no other size; `not-turned-on` is not spoken of. */
export type NotOffered = 'not-turned-on' | 'not-approved' | 'no-weights';

/** What the page of a formula needs to reckon any size, or why it must not. */
export function anySizeOf(
  computed: ComputedFormula,
  state: StateInUse,
  reference: Reference,
): AnySizeData | NotOffered {
  if (!reference.shop.anySize) return 'not-turned-on';
  if (state !== 'approved') return 'not-approved';
  return anySizeData(computed, reference) ?? 'no-weights';
}

/** All formulas that offer other sizes. */
export function anySizeOffers({
  formulary,
  states,
}: Pick<Edition, 'formulary' | 'states'>): readonly {
  readonly computed: ComputedFormula;
  readonly data: AnySizeData;
}[] {
  return formulary.formulas.flatMap((computed) => {
    const state = states.get(computed.document.code) ?? 'not-approved';
    const data = anySizeOf(computed, state, formulary.reference);
    return typeof data === 'string' ? [] : [{ computed, data }];
  });
}
