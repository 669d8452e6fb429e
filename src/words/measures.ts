import { decimalsOf, fixed, plain } from './numbers.ts';
import { fahrenheit, GALLON, OUNCE, POUND, QUART } from './units.ts';
import { voice } from './voice.ts';

/**
 * Formats of what is weighed, filled and heated, in the units of the shop. Everything is given in grams,
 * millilitres and degrees Celsius. Pounds always stand with ounces, so that no line reads like another unit.
 */

/** The unit that a weight ends in: `g`, or `oz` after its pounds. */
export const massUnit = (): string => (isUs() ? 'oz' : 'g');

/** The unit or units of a weight, for a blank that is filled in by hand. */
export const massUnits = (): string => (isUs() ? 'lb, oz' : 'g');

/** Digits after the decimal sign of a weight to this step. `step` [g] */
export const stepDecimals = (step: number): number => decimalsOf(inUnit(step));

/** A scale's step without its unit: `0.1`. [g] */
export const stepDigits = (step: number): string => plain(inUnit(step), 6);

/** A scale's step: `0.1 oz`. [g] */
export const stepText = (step: number): string => `${stepDigits(step)} ${massUnit()}`;

/** A weight to its scale's step, without the unit that it ends in: `139.6`, or `0 lb 4.9`. [g] */
export const weight = (mass: number, step: number): string => toDecimals(mass, stepDecimals(step));

/** A weight to its scale's step: `139.6 g`, `0 lb 4.9 oz`. It never breaks over two lines. [g] */
export const weighed = (mass: number, step: number): string =>
  `${weight(mass, step)}\u00a0${massUnit()}`;

/** A mass that is expected and not weighed in: to the gram, or to a tenth of an ounce. [g] */
export const expectedMass = (mass: number): string =>
  isUs() ? `${toDecimals(mass, 1)}\u00a0oz` : `${fixed(mass, 0)} g`;

/** Of a single bar: to a tenth of a gram, or a hundredth of an ounce. [g] */
export const fineMass = (mass: number): string =>
  isUs() ? `${toDecimals(mass, 2)}\u00a0oz` : `${fixed(mass, 1)} g`;

/** The same, cut off and never rounded up: for the most that may go in. [g] */
export const massAtMost = (mass: number): string =>
  isUs()
    ? expectedMass((Math.floor((mass / OUNCE) * 10) / 10) * OUNCE)
    : expectedMass(Math.floor(mass));

/** The same, rounded up and never down: for the least that may go in. [g] */
export const massAtLeast = (mass: number): string =>
  isUs()
    ? expectedMass((Math.ceil((mass / OUNCE) * 10 - 1e-9) / 10) * OUNCE)
    : expectedMass(Math.ceil(mass - 1e-9));

/** A mass that a file states, with no more decimals than it has. [g] */
export function statedMass(mass: number, decimals = 3): string {
  if (!isUs()) return `${plain(mass, decimals)} g`;
  const ounces = Number((mass / OUNCE).toFixed(decimals));
  return `${toDecimals(mass, decimalsOf(ounces))}\u00a0oz`;
}

/** Large masses, of totals and purchases: kilograms to the gram, pounds to a tenth of an ounce. [g] */
export const totalMass = (mass: number): string =>
  isUs() ? expectedMass(mass) : `${fixed(mass / 1000, 3)} kg`;

/** The same with no more decimals than it has, at most two of a kilogram. [g] */
export const largeMass = (mass: number): string =>
  isUs() ? expectedMass(mass) : `${plain(mass / 1000, 2)} kg`;

/** The unit that prices are told for. */
export const priceUnit = (): string => (isUs() ? 'lb' : 'kg');

/** A price of a kilogram as the price of that unit. */
export const priceOf = (perKilogram: number): number =>
  isUs() ? (perKilogram * POUND) / 1000 : perKilogram;

/** The mass of fats or paste that yields are told for. [g] */
export const tableBasis = (): number => (isUs() ? POUND : 1000);

/** Litres, or US gallons and below one gallon US quarts. [mL] */
export function volume(millilitres: number): string {
  if (!isUs()) return `${fixed(millilitres / 1000, 1)} L`;
  return millilitres < GALLON
    ? `${fixed(millilitres / QUART, 1)} qt`
    : `${fixed(millilitres / GALLON, 1)} gal`;
}

/** A volume that a file states, with no more decimals than it has. [mL] */
export function statedVolume(millilitres: number): string {
  if (!isUs()) return `${plain(millilitres / 1000, 1)} L`;
  return millilitres < GALLON
    ? `${plain(millilitres / QUART, 2)} qt`
    : `${plain(millilitres / GALLON, 2)} gal`;
}

/** `38 °C`, `100 °F`. [degC] */
export const temperature = (celsius: number, decimals = 0): string =>
  `${fixed(degrees(celsius), decimals)} ${degreeUnit()}`;

/** A temperature that a file states, with no more decimals than it has. [degC] */
export const statedTemperature = (celsius: number): string =>
  `${plain(degrees(celsius), 1)} ${degreeUnit()}`;

/** A difference of two temperatures. [K] */
export const warming = (kelvin: number, decimals = 0): string =>
  `${fixed(isUs() ? (kelvin * 9) / 5 : kelvin, decimals)} ${degreeUnit()}`;

/** A temperature in the shop's degrees, as a number. [degC] */
export const degrees = (celsius: number): number => (isUs() ? fahrenheit(celsius) : celsius);

export const degreeUnit = (): string => (isUs() ? '°F' : '°C');

const isUs = () => voice().units === 'us';

/** A step in grams is a decimal number of the shop's unit; what binary adds behind the ninth digit is cut off. */
const inUnit = (step: number): number => (isUs() ? Number((step / OUNCE).toPrecision(9)) : step);

function toDecimals(mass: number, decimals: number): string {
  return isUs() ? poundsAndOunces(mass, decimals) : fixed(mass, decimals);
}

/** Rounded as a whole before it is split, so that sixteen ounces always are the next pound. */
function poundsAndOunces(mass: number, decimals: number): string {
  const perOunce = 10 ** decimals;
  const parts = Math.round((Math.abs(mass) / OUNCE) * perOunce);
  const pounds = Math.floor(parts / (16 * perOunce));
  const ounces = (parts - pounds * 16 * perOunce) / perOunce;
  const sign = mass < 0 && parts > 0 ? '\u2212' : '';
  return `${sign}${pounds}\u00a0lb\u00a0${fixed(ounces, decimals)}`;
}
