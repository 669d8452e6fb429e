import type { CautionId, CautionNumbers } from '../../src/words/en/cautions.ts';
import type { Wish } from './context.ts';

/** A formula on which a rule speaks, what it then says, and its neighbour on which it is silent. */
export interface Case<Id extends CautionId> {
  readonly fires: Wish;
  readonly numbers: Partial<CautionNumbers[Id]>;
  /** Must stand in the text or in what to do. */
  readonly says: readonly string[];
  /** `null` for what holds for every formula. */
  readonly silent: Wish | null;
}

export type Cases<Id extends CautionId> = { readonly [Key in Id]: Case<Key> };
