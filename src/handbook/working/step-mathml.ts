import { display, named, row, sign } from '../mathml.ts';
import type { Step } from './step.ts';
import { termMathml } from './term.ts';

/** A step as one displayed equation: symbol = symbols = numbers = result unit. */
export function stepMathml({ symbol, equation, numbers, result, unit }: Step): string {
  const parts = [termMathml(symbol)];
  if (equation) parts.push(termMathml(equation));
  const value = termMathml(result);
  const working = termMathml(numbers);
  // a value that is only looked up stands once
  if (working !== value) parts.push(working);
  const unitMathml = unit === '1' ? '' : named(`\u00a0${unit}`);
  parts.push(row(value, unitMathml));
  return display(row(...parts.flatMap((part, i) => (i === 0 ? [part] : [sign('='), part]))));
}
