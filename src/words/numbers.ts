import { voice } from './voice.ts';

/** Formats of numbers, one place for all pages. The shop's decimal sign, no digit grouping, true minus sign. */

/** Digits after the decimal point that a scale's step needs: 0.1 -> 1, 5 -> 0. */
export function decimalsOf(step: number): number {
  const text = String(step);
  if (text.includes('e-')) return Number(text.split('e-')[1]);
  return text.split('.')[1]?.length ?? 0;
}

/** A number to a fixed count of decimals; a value that rounds to nothing has no sign. */
export function fixed(value: number, decimals: number): string {
  const digits = Math.abs(value).toFixed(decimals);
  const text = withDecimalSign(digits);
  return value < 0 && Number(digits) !== 0 ? `\u2212${text}` : text;
}

/** A number written with a point, as the shop's locale writes it. */
export const withDecimalSign = (text: string): string => text.replace('.', voice().decimalSign);

/** A number with no more decimals than it has, at most `decimals`: 5 -> `5`, 5.25 -> `5.25`. */
export function plain(value: number, decimals = 3): string {
  return fixed(
    Number(value.toFixed(decimals)),
    decimalsOf(Number(Math.abs(value).toFixed(decimals))),
  );
}

/** `184 to 196`; one number where both ends are shown alike. */
export function range(low: number, high: number, decimals: number): string {
  return fromTo(fixed(low, decimals), fixed(high, decimals));
}

/** Two shown numbers as a range in the words' language; one where they are alike. */
export const fromTo = (from: string, to: string): string =>
  from === to ? from : `${from} ${TO[voice().language]} ${to}`;

const TO = { en: 'to', es: 'a' } as const;

/** The part before the decimal sign and the rest with it, so that a column can align on the sign. */
export function splitAtPoint(text: string): readonly [string, string] {
  const point = text.indexOf(voice().decimalSign);
  return point < 0 ? [text, ''] : [text.slice(0, point), text.slice(point)];
}
