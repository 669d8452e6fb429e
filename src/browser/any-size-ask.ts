import type { Sized } from '../chemistry/any-size.ts';
import { anySizeWords as text } from '../words/en/any-size.ts';
import type { AnySizeData } from './any-size-data.ts';
import { type WishFields, wishFields } from './any-size-fields.ts';
import { refusal } from './any-size-notes.ts';
import { refusalText } from './any-size-refusal.ts';
import { listedLike, sizeOf, wantedSize } from './any-size-wanted.ts';
import { part } from './find-dom.ts';

/** A size that was asked for, or that there is none. */
export interface Asked {
  readonly sized: Sized | null;
  readonly name: string;
  /** Whether it is one of the listed sizes. */
  readonly listed: boolean;
  readonly wish: ReturnType<WishFields['wish']>;
}

/** Reads the form, says what became of the wish, and hands the size on: now and at each change. */
export function askForSize(data: AnySizeData, show: (asked: Asked) => void): void {
  const fields = wishFields();
  const draw = () => {
    const wish = fields.wish();
    const wanted = wish && wantedSize(wish, data);
    const outcome = wanted?.ok ? sizeOf(wanted.size, data) : null;
    const sized = outcome?.ok ? outcome.value : null;
    const listed = sized ? listedLike(sized, data) : undefined;
    const name = listed?.label ?? (wanted?.ok ? wanted.name : '');
    part('any-size-result').hidden = sized === null;
    part('any-size-refused').replaceChildren(
      ...(outcome && !outcome.ok
        ? [refusal(text.refusedTitle, refusalText(outcome.breach), text.advice)]
        : []),
    );
    const found = sized && text.found(name, data.limits.listed[sized.as]?.label ?? '');
    const sentence = wanted && !wanted.ok ? wanted.sentence : found;
    part('any-size-said').textContent = listed ? text.listed(listed.label) : sentence;
    show({ sized, name, listed: listed !== undefined, wish });
  };
  part('any-size-off').hidden = true;
  part('any-size-form').hidden = false;
  fields.onChange(draw);
  draw();
}

/** Starts with the data of the formula, or says that they are missing. */
export function withData(start: (data: AnySizeData) => void): void {
  if (globalThis.handbookAnySize) start(globalThis.handbookAnySize);
  else part('any-size-off').textContent = text.broken;
}
