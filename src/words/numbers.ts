/** Formats of numbers, one place for all pages. Decimal point, no digit grouping, true minus sign. */

/** Digits after the decimal point that a scale's step needs: 0.1 -> 1, 5 -> 0. */
export function decimalsOf(step: number): number {
  const text = String(step);
  if (text.includes('e-')) return Number(text.split('e-')[1]);
  return text.split('.')[1]?.length ?? 0;
}

/** A weight to its scale's step, without unit: `139.6`. [g] */
export const weight = (mass: number, step: number): string => fixed(mass, decimalsOf(step));

/** A number to a fixed count of decimals; a value that rounds to nothing has no sign. */
export function fixed(value: number, decimals: number): string {
  const text = Math.abs(value).toFixed(decimals);
  return value < 0 && Number(text) !== 0 ? `\u2212${text}` : text;
}

/** Kilograms to the gram, for totals only: `2.431`. Takes grams. */
export const kilograms = (grams: number): string => fixed(grams / 1000, 3);

/** A number with no more decimals than it has, at most `decimals`: 5 -> `5`, 5.25 -> `5.25`. */
export function plain(value: number, decimals = 3): string {
  return fixed(
    Number(value.toFixed(decimals)),
    decimalsOf(Number(Math.abs(value).toFixed(decimals))),
  );
}

/** `184 to 196`; one number where both ends are shown alike. */
export function range(low: number, high: number, decimals: number): string {
  const [a, b] = [fixed(low, decimals), fixed(high, decimals)];
  return a === b ? a : `${a} to ${b}`;
}

/** The part before the decimal point and the rest with it, so that a column can align on the point. */
export function splitAtPoint(text: string): readonly [string, string] {
  const point = text.indexOf('.');
  return point < 0 ? [text, ''] : [text.slice(0, point), text.slice(point)];
}
