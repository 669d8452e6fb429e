import { anySize, type Sized, type WantedSize } from '../chemistry/any-size.ts';
import { grams, type Outcome } from '../chemistry/quantity.ts';
import { anySizeWords as text } from '../words/en/any-size.ts';
import { statedMass } from '../words/measures.ts';
import { voice } from '../words/voice.ts';
import type { AnySizeData } from './any-size-data.ts';
import { typedCount, typedMass } from './any-size-typed.ts';

/** A way to state a size, as the address and the fields name it: `fats`, `batter`, `bars-0`, `listed`. */
export interface Wish {
  readonly way: string;
  readonly text: string;
}

/** The size that is wished for with its own words, or a sentence why there is none. */
export type Wanted =
  | { readonly ok: true; readonly size: WantedSize; readonly name: string }
  | { readonly ok: false; readonly sentence: string };

export function wantedSize(wish: Wish, { bars, limits }: AnySizeData): Wanted {
  const fail = (fault: keyof typeof text.typed): Wanted => {
    const sentence = text.typed[fault];
    return {
      ok: false,
      sentence: typeof sentence === 'string' ? sentence : sentence(voice().decimalSign),
    };
  };
  if (wish.way === 'listed') {
    const listed = limits.listed.find(({ id }) => id === wish.text);
    if (!listed) return fail('empty');
    return { ok: true, size: { by: 'fats', mass: listed.fats }, name: listed.label };
  }
  const bar = bars[Number(/^bars-(\d)$/.exec(wish.way)?.[1] ?? Number.NaN)];
  if (bar) {
    const count = typedCount(wish.text);
    if (!count.ok) return fail(count.fault);
    const name = text.size.bars(count.value, statedMass(bar.wetMass));
    return { ok: true, size: { by: 'bars', count: count.value, wetMass: bar.wetMass }, name };
  }
  if (wish.way !== 'fats' && wish.way !== 'batter') return fail('empty');
  const mass = typedMass(wish.text, voice());
  if (!mass.ok) return fail(mass.fault);
  const name = text.size[wish.way](statedMass(mass.value));
  return { ok: true, size: { by: wish.way, mass: grams(mass.value) }, name };
}

/** Weights of a size, or the rule that it breaks. */
export const sizeOf = (
  size: WantedSize,
  { formulation, limits, constants }: AnySizeData,
): Outcome<Sized> => anySize(formulation, size, limits, constants);

/** The listed size with the same mass of fats, if there is one. */
export const listedLike = (
  { weighed }: Pick<Sized, 'weighed'>,
  { limits }: AnySizeData,
): AnySizeData['limits']['listed'][number] | undefined =>
  limits.listed.find(({ fats }) => Math.abs(fats - weighed.massOfFats) <= 1e-9 * fats);
