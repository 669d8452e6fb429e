/**
 * US customary units by their exact definitions: the international avoirdupois pound, the US gallon of 231 cubic
 * inches, the inch of 25.4 mm. Source: NIST SP 811 (2008), appendix B.8, and NIST Handbook 44, appendix C; the values
 * are from memory, and the tests derive them from one another.
 */

/** Avoirdupois pound. [g] */
export const POUND = 453.59237;
/** Avoirdupois ounce, 1/16 of a pound. [g] */
export const OUNCE = POUND / 16;
/** US liquid gallon, 231 cubic inches. [mL] */
export const GALLON = 231 * 2.54 ** 3;
/** US liquid quart, a quarter of a gallon. [mL] */
export const QUART = GALLON / 4;

/** The units that a shop weighs and measures in; an edition has one of them. */
export const UNIT_SYSTEMS = ['metric', 'us'] as const;
export type UnitSystem = (typeof UNIT_SYSTEMS)[number];

/** Degrees Celsius as degrees Fahrenheit. */
export const fahrenheit = (celsius: number): number => (celsius * 9) / 5 + 32;

/** Degrees Fahrenheit as degrees Celsius. */
export const celsiusOf = (degreesFahrenheit: number): number => ((degreesFahrenheit - 32) * 5) / 9;
