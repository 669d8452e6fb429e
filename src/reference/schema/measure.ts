import { z } from 'zod';
import { broken } from './value.ts';

const SCALES = {
  mass: { example: '500 g or 1 kg', units: { g: 1, kg: 1000 } },
  volume: { example: '800 mL or 12 L', units: { mL: 1, L: 1000 } },
  temperature: { example: '22 C', units: { C: 1 } },
} as const satisfies Record<string, { example: string; units: Readonly<Record<string, number>> }>;

/** A number with its unit in one text, read as grams, millilitres or degrees Celsius, between two bounds. */
export function measure(quantity: keyof typeof SCALES, least: number, most: number) {
  const { example, units }: { example: string; units: Readonly<Record<string, number>> } =
    SCALES[quantity];
  return z.union([z.string(), z.number()]).transform((written, context) => {
    const [, digits = '', unit = ''] =
      /^(-?[0-9]+(?:\.[0-9]+)?) ?([A-Za-z]+)$/.exec(String(written)) ?? [];
    const factor = units[unit];
    if (factor === undefined) {
      context.addIssue(
        broken({
          rule: 'data/measure-form',
          found: typeof written === 'number' ? `${written} without a unit` : `"${written}"`,
          expected: `a number with its unit, ${example}`,
          advice: 'write number, space, unit',
        }),
      );
      return z.NEVER;
    }
    const value = Number(digits) * factor;
    if (value < least || value > most) {
      const base = Object.keys(units)[0];
      context.addIssue(
        broken({
          rule: 'data/out-of-range',
          found: `${written}`,
          expected: `${least} to ${most} ${base}`,
          advice: 'check the digits and the unit',
        }),
      );
      return z.NEVER;
    }
    return value;
  });
}
