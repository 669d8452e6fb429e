/** Small builders for MathML; names are plain text, every other argument is MathML already. */
import { withDecimalSign } from '../words/numbers.ts';

export const variable = (name: string) => `<mi>${escaped(name)}</mi>`;
/** A name of several letters, set upright. */
export const named = (name: string) => `<mi mathvariant="normal">${escaped(name)}</mi>`;
/** A number written with a point; it is shown with the shop's decimal sign. */
export const number = (value: string | number) => `<mn>${withDecimalSign(String(value))}</mn>`;
export const sign = (operator: string) => `<mo>${operator}</mo>`;
export const row = (...parts: string[]) => `<mrow>${parts.join('')}</mrow>`;
export const over = (top: string, bottom: string) => `<mfrac>${top}${bottom}</mfrac>`;
export const sub = (base: string, index: string) => `<msub>${base}${index}</msub>`;
export const squared = (base: string) => `<msup>${base}<mn>2</mn></msup>`;
export const root = (body: string) => `<msqrt>${body}</msqrt>`;
export const sum = (index: string, body: string) =>
  row(`<munder><mo>&#x2211;</mo>${variable(index)}</munder>`, body);
export const brackets = (...body: string[]) => row(sign('('), ...body, sign(')'));
export const equals = (left: string, right: string) => row(left, sign('='), right);

/** A displayed equation. */
export const display = (body: string) =>
  `<math xmlns="http://www.w3.org/1998/Math/MathML" display="block">${body}</math>`;

function escaped(text: string): string {
  return text.replaceAll('&', '&amp;').replaceAll('<', '&lt;');
}
