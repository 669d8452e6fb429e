import {
  brackets,
  named,
  number,
  over,
  root,
  row,
  sign,
  squared,
  sub,
  variable,
} from '../mathml.ts';

/** An expression as it is printed: numbers keep the digits that the page shows, and nothing else. */
export type Term =
  | { readonly is: 'number'; readonly text: string; readonly unit: string | null }
  | { readonly is: 'symbol'; readonly base: string; readonly index: string | null }
  | { readonly is: 'sum' | 'product'; readonly of: readonly Term[] }
  | { readonly is: 'difference'; readonly of: readonly [Term, Term] }
  | { readonly is: 'fraction'; readonly top: Term; readonly bottom: Term }
  | { readonly is: 'root' | 'square'; readonly of: Term };

/** A number printed to `digits` significant ones; the working goes on with what is printed. */
export const figure = (value: number, digits = 6, unit: string | null = null): Term => ({
  is: 'number',
  text: significant(value, digits),
  unit,
});
/** A number that is exact as it stands: a share, a count, a weight on a scale. */
export const exact = (value: number, unit: string | null = null): Term => ({
  is: 'number',
  text: significant(value, 12),
  unit,
});
export const symbol = (base: string, index: string | null = null): Term => ({
  is: 'symbol',
  base,
  index,
});
export const sumOf = (...of: readonly Term[]): Term => ({ is: 'sum', of });
export const product = (...of: readonly Term[]): Term => ({ is: 'product', of });
export const minus = (a: Term, b: Term): Term => ({ is: 'difference', of: [a, b] });
export const fractionOf = (top: Term, bottom: Term): Term => ({ is: 'fraction', top, bottom });
export const rootOf = (of: Term): Term => ({ is: 'root', of });
export const squareOf = (of: Term): Term => ({ is: 'square', of });

/** `digits` significant digits without exponent or trailing zeros, so that a calculator can take it. */
export function significant(value: number, digits: number): string {
  if (value === 0) return '0';
  const places = Math.min(12, Math.max(0, digits - 1 - Math.floor(Math.log10(Math.abs(value)))));
  const text = value.toFixed(places);
  return text.includes('.') ? text.replace(/\.?0+$/, '') : text;
}

/** What a reader with a calculator gets from the printed numbers. `NaN` where a symbol is left. */
export function evaluate(term: Term): number {
  switch (term.is) {
    case 'number':
      return Number(term.text);
    case 'symbol':
      return Number.NaN;
    case 'sum':
      return term.of.reduce((total, part) => total + evaluate(part), 0);
    case 'product':
      return term.of.reduce((total, part) => total * evaluate(part), 1);
    case 'difference':
      return evaluate(term.of[0]) - evaluate(term.of[1]);
    case 'fraction':
      return evaluate(term.top) / evaluate(term.bottom);
    case 'root':
      return Math.sqrt(evaluate(term.of));
    case 'square':
      return evaluate(term.of) ** 2;
  }
}

/** The term as MathML. Brackets go round sums and differences inside products and after a minus. */
export function termMathml(term: Term): string {
  switch (term.is) {
    case 'number':
      return numberMathml(term.text);
    case 'symbol':
      return term.index === null
        ? symbolMathml(term.base)
        : sub(symbolMathml(term.base), symbolMathml(term.index));
    case 'sum':
      return row(...joined(term.of.map(termMathml), '+'));
    case 'product':
      return row(...joined(term.of.map(bracketed), '·'));
    case 'difference':
      return row(termMathml(term.of[0]), sign('−'), bracketed(term.of[1]));
    case 'fraction':
      return over(row(termMathml(term.top)), row(termMathml(term.bottom)));
    case 'root':
      return root(termMathml(term.of));
    case 'square':
      return squared(bracketed(term.of));
  }
}

const numberMathml = (text: string) =>
  text.startsWith('-') ? row(sign('−'), number(text.slice(1))) : number(text);

const symbolMathml = (name: string) => (name.length === 1 ? variable(name) : named(name));

const joined = (parts: readonly string[], operator: string) =>
  parts.flatMap((part, i) => (i === 0 ? [part] : [sign(operator), part]));

function bracketed(term: Term): string {
  const loose =
    term.is === 'sum' ||
    term.is === 'difference' ||
    (term.is === 'number' && term.text.startsWith('-'));
  return loose ? brackets(termMathml(term)) : termMathml(term);
}
