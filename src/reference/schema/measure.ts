import { z } from 'zod';
import { celsiusOf, GALLON, OUNCE, POUND, QUART, type UnitSystem } from '../../words/units.ts';
import { broken } from './value.ts';

interface Unit {
  readonly system: UnitSystem;
  /** A number of this unit in grams, millilitres or degrees Celsius. */
  readonly toBase: (value: number) => number;
}

const times = (system: UnitSystem, factor: number): Unit => ({
  system,
  toBase: (value) => value * factor,
});

const SCALES = {
  mass: {
    base: 'g',
    example: '500 g, 1 kg, 8 oz, 2 lb or 2 lb 4 oz',
    units: {
      g: times('metric', 1),
      kg: times('metric', 1000),
      oz: times('us', OUNCE),
      lb: times('us', POUND),
    },
  },
  volume: {
    base: 'mL',
    example: '800 mL, 12 L, 2 qt or 3 gal',
    units: {
      mL: times('metric', 1),
      L: times('metric', 1000),
      qt: times('us', QUART),
      gal: times('us', GALLON),
    },
  },
  temperature: {
    base: 'C',
    example: '22 C or 72 F',
    units: { C: times('metric', 1), F: { system: 'us', toBase: celsiusOf } },
  },
} as const satisfies Record<
  string,
  { base: string; example: string; units: Readonly<Record<string, Unit>> }
>;

/** A measure as it was written: its value in grams, millilitres or degrees Celsius, and whose unit it has. */
export interface Written {
  readonly value: number;
  readonly system: UnitSystem;
}

/** A number with its unit in one text, read as grams, millilitres or degrees Celsius, between two bounds. */
export const measure = (quantity: keyof typeof SCALES, least: number, most: number) =>
  writtenMeasure(quantity, least, most).transform(({ value }) => value);

/** The same with the unit system that it was written in. */
export function writtenMeasure(quantity: keyof typeof SCALES, least: number, most: number) {
  const { base, example } = SCALES[quantity];
  return z.union([z.string(), z.number()]).transform((text, context): Written => {
    const read = readMeasure(quantity, String(text));
    if (!read) {
      context.addIssue(
        broken({
          rule: 'data/measure-form',
          found: typeof text === 'number' ? `${text} without a unit` : `"${text}"`,
          expected: `a number with its unit, ${example}`,
          advice: 'write number, space, unit',
        }),
      );
      return z.NEVER;
    }
    if (read.value < least || read.value > most) {
      context.addIssue(
        broken({
          rule: 'data/out-of-range',
          found: `${text}`,
          expected: `${least} to ${most} ${base}`,
          advice: 'check the digits and the unit',
        }),
      );
      return z.NEVER;
    }
    return read;
  });
}

const NUMBER = '[0-9]+(?:\\.[0-9]+)?';
const ONE_UNIT = new RegExp(`^(-?${NUMBER})\\s?([A-Za-z]+)$`);
/** Whole pounds and less than sixteen ounces. */
const POUNDS_AND_OUNCES = new RegExp(`^([0-9]+)\\s?lb\\s(${NUMBER})\\s?oz$`);

/** `null` for what is no measure of the quantity. */
export function readMeasure(quantity: keyof typeof SCALES, text: string): Written | null {
  const [, pounds, ounces] = (quantity === 'mass' && POUNDS_AND_OUNCES.exec(text)) || [];
  if (pounds !== undefined) {
    if (Number(ounces) >= 16) return null;
    return { value: (Number(pounds) * 16 + Number(ounces)) * OUNCE, system: 'us' };
  }
  const [, digits, name = ''] = ONE_UNIT.exec(text) ?? [];
  const units: Readonly<Record<string, Unit>> = SCALES[quantity].units;
  const unit = Object.hasOwn(units, name) ? units[name] : undefined;
  return unit ? { value: unit.toBase(Number(digits)), system: unit.system } : null;
}
