import { massByFat } from '../../chemistry/blend.ts';
import type { Charge } from '../../chemistry/charge.ts';
import type { Equivalents } from '../../chemistry/superfat.ts';
import { AS_USED, equivalentsOf } from '../../chemistry/superfat.ts';
import type { ComputedFormula } from '../../formulary/formulary.ts';
import type { Reference } from '../../reference/reference.ts';
import type { ValueRecord } from '../../reference/values.ts';
import { words } from '../../words/catalogue.ts';
import { nameOf, sourceName } from '../names.ts';

/** What every section of the working reads from. */
export interface Working extends ComputedFormula {
  readonly reference: Reference;
  readonly equivalents: Equivalents;
  /** `charge` has each fat once; this has it as weighed, by itself and in blends. */
  readonly weighedCharge: Charge;
}

export const workingOf = (computed: ComputedFormula, reference: Reference): Working => ({
  ...computed,
  charge: { ...computed.charge, fats: massByFat(computed.charge.fats) },
  weighedCharge: computed.charge,
  reference,
  equivalents: equivalentsOf(computed.charge, AS_USED, reference.constants),
});

export const named = ({ reference }: Working, id: string) => nameOf(reference, id);

/** A source with its place and how the value is known, `from memory` said in words. */
export const cited = (
  reference: Reference,
  { source, at, how }: Pick<ValueRecord, 'source' | 'at' | 'how'>,
) => `${sourceName(reference, source)}, ${at} (${words.frame.how[how]})`;
