/**
 * What a catalogue in another language must look like: the same keys, functions of the same numbers, lists of the
 * same length, and any text in the place of a text. What stands under `id`, the code of a hazard statement and a
 * choice between ids are no texts and stay as they are.
 */
export type SameShape<T> = [T] extends [string]
  ? Text<T>
  : T extends (...given: infer Given) => infer Result
    ? (...given: Given) => Result extends string ? string : SameShape<Result>
    : T extends object
      ? { readonly [Key in keyof T]: Key extends 'id' ? T[Key] : SameShape<T[Key]> }
      : T;

type Text<T extends string> = T extends StatementCode ? T : IsChoice<T> extends true ? T : string;

type StatementCode = `${'H' | 'P'}${number}${string}`;

type IsChoice<T, Each = T> = Each extends unknown ? ([T] extends [Each] ? false : true) : never;
