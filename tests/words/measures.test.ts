import fc from 'fast-check';
import { afterEach, describe, expect, test } from 'vitest';
import { readMeasure } from '../../src/reference/schema/measure.ts';
import { speak } from '../../src/words/catalogue.ts';
import {
  expectedMass,
  fineMass,
  massAtLeast,
  massAtMost,
  massUnits,
  statedMass,
  statedTemperature,
  stepText,
  tableBasis,
  temperature,
  totalMass,
  volume,
  warming,
  weighed,
} from '../../src/words/measures.ts';
import { celsiusOf, fahrenheit, GALLON, OUNCE, POUND, QUART } from '../../src/words/units.ts';

afterEach(() => speak('en-GB'));

const spaced = (text: string) => text.replaceAll('\u00a0', ' ');

describe('the factors are those that are exact by definition', () => {
  test('NIST Handbook 44, appendix C: the pound of 7000 grains of 64.798 91 mg, the ounce of 437.5', () => {
    expect(POUND).toBeCloseTo((7000 * 64.79891) / 1000, 10);
    expect(OUNCE).toBeCloseTo((437.5 * 64.79891) / 1000, 12);
    expect(OUNCE).toBe(28.349523125);
  });

  test('NIST SP 811, B.8: gallon 3.785 412 L, liquid quart 0.946 352 9 L, fluid ounce 29.573 53 mL', () => {
    expect(GALLON / 1000).toBeCloseTo(3.785412, 6);
    expect(QUART / 1000).toBeCloseTo(0.9463529, 7);
    expect(GALLON / 128).toBeCloseTo(29.57353, 5);
    expect(GALLON).toBeCloseTo(231 * 16.387064, 9);
  });

  test('degrees Fahrenheit: ice 32, boiling water 212, alike at -40', () => {
    expect([0, 100, -40].map(fahrenheit)).toEqual([32, 212, -40]);
    expect([32, 212, -40].map(celsiusOf)).toEqual([0, 100, -40]);
  });
});

describe('in a US edition', () => {
  const us = (step: number) => step * OUNCE;

  test.each([
    [4.6, 0.1, '0 lb 4.6 oz'],
    [15.96, 0.1, '1 lb 0.0 oz'],
    [15.94, 0.1, '0 lb 15.9 oz'],
    [31.996, 0.05, '2 lb 0.00 oz'],
    [16, 1, '1 lb 0 oz'],
    [707, 1, '44 lb 3 oz'],
    [0, 0.1, '0 lb 0.0 oz'],
    [389, 0.5, '24 lb 5.0 oz'],
    [5.12, 0.32, '0 lb 5.12 oz'],
  ])('%f oz at steps of %f oz are %s', (ounces, step, text) => {
    speak('en-US', 'us');
    expect(spaced(weighed(us(ounces), us(step)))).toBe(text);
  });

  test('what is printed reads back as the same number of steps, in one form, never as 16 oz', () => {
    speak('es-US', 'us');
    const steps = fc.constantFrom(0.01, 0.02, 0.05, 0.1, 0.2, 0.25, 0.5, 1, 2, 4, 0.16, 16);
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 200_000 }), steps, (count, step) => {
        const text = spaced(weighed(Number((count * us(step)).toPrecision(15)), us(step)));
        expect(text).toMatch(/^[0-9]+ lb (?:[0-9]|1[0-5])(?:\.[0-9]+)? oz$/);
        const mass = readMeasure('mass', text)?.value ?? Number.NaN;
        expect(mass / us(step)).toBeCloseTo(count, 6);
      }),
    );
  });

  test('expected masses, totals, bars and sizes stand in pounds and ounces too', () => {
    speak('en-US', 'us');
    expect(spaced(expectedMass(1000))).toBe('2 lb 3.3 oz');
    expect(spaced(totalMass(20_000))).toBe('44 lb 1.5 oz');
    expect(spaced(fineMass(100))).toBe('0 lb 3.53 oz');
    expect(spaced(statedMass(2 * POUND + 4 * OUNCE))).toBe('2 lb 4 oz');
    expect(spaced(statedMass(4.25 * OUNCE))).toBe('0 lb 4.25 oz');
    expect(statedMass(tableBasis())).toBe('1\u00a0lb\u00a00\u00a0oz');
    expect(stepText(0.05 * OUNCE)).toBe('0.05 oz');
    expect(massUnits()).toBe('lb, oz');
  });

  test('the most that may go in is cut off, not rounded', () => {
    speak('en-US', 'us');
    expect(spaced(massAtMost(15.99 * OUNCE))).toBe('0 lb 15.9 oz');
    expect(spaced(massAtMost(16 * OUNCE))).toBe('1 lb 0.0 oz');
    speak('en-GB');
    expect(massAtMost(99.9)).toBe('99 g');
    expect(massAtLeast(99.1)).toBe('100 g');
    expect(massAtLeast(100)).toBe('100 g');
    speak('en-US', 'us');
    expect(spaced(massAtLeast(15.91 * OUNCE))).toBe('1 lb 0.0 oz');
    expect(spaced(massAtLeast(3 * POUND))).toBe('3 lb 0.0 oz');
    expect(spaced(massAtMost(24.5 * POUND))).toBe('24 lb 8.0 oz');
  });

  test('volumes and temperatures; a difference has no 32 in it', () => {
    speak('en-US', 'us');
    expect(volume(3 * GALLON)).toBe('3.0 gal');
    expect(volume(3 * QUART)).toBe('3.0 qt');
    expect(temperature(100)).toBe('212 °F');
    expect(statedTemperature(celsiusOf(72))).toBe('72 °F');
    expect(warming(10)).toBe('18 °F');
  });
});

test('a metric edition shows grams, kilograms, litres and degrees Celsius', () => {
  expect(weighed(139.7, 0.1)).toBe('139.7\u00a0g');
  expect(expectedMass(1000.4)).toBe('1000 g');
  expect(totalMass(20_000)).toBe('20.000 kg');
  expect(statedMass(118)).toBe('118 g');
  expect(volume(12_000)).toBe('12.0 L');
  expect(temperature(66.4)).toBe('66 °C');
  expect(warming(10)).toBe('10 °C');
  expect(massUnits()).toBe('g');
});

test.each([
  ['mass', '8 oz', 8 * OUNCE],
  ['mass', '2 lb', 2 * POUND],
  ['mass', '2.5 lb', 2.5 * POUND],
  ['mass', '44 lb 3 oz', 707 * OUNCE],
  ['mass', '0 lb 4.6 oz', 4.6 * OUNCE],
  ['mass', '1 lb 16 oz', null],
  ['mass', '1.5 lb 3 oz', null],
  ['mass', '3 oz 1 lb', null],
  ['mass', '1 kg 3 oz', null],
  ['mass', '5 toString', null],
  ['volume', '2 qt', 2 * QUART],
  ['volume', '3 gal', 3 * GALLON],
  ['volume', '1 lb 3 oz', null],
  ['temperature', '212 F', 100],
] as const)('%s %s', (quantity, text, value) => {
  const read = readMeasure(quantity, text)?.value ?? null;
  if (value === null) expect(read).toBeNull();
  else expect(read).toBeCloseTo(value, 9);
});
