import { describe, expect, test } from 'vitest';
import { typedCount, typedMass } from '../../src/browser/any-size-typed.ts';
import { voiceOf } from '../../src/words/voice.ts';

const metric = voiceOf('en-GB');
const spanish = voiceOf('es-ES');
const us = voiceOf('en-US', 'us');
const found = (typed: ReturnType<typeof typedMass>) => (typed.ok ? typed.value : typed.fault);

describe('what is typed', () => {
  test.each([
    ['1000', 1000],
    [' 1234.5 ', 1234.5],
    ['', 'empty'],
    ['   ', 'empty'],
    ['0', 'zero'],
    ['0.0', 'zero'],
    ['1,5', 'other-sign'],
    ['1,250', 'other-sign'],
    ['1.250.000', 'other-sign'],
    ['1 250', 'other-sign'],
    ['1e9', 'not-a-number'],
    ['-5', 'not-a-number'],
    ['+5', 'not-a-number'],
    ['0x10', 'not-a-number'],
    ['Infinity', 'not-a-number'],
    ['5.', 'not-a-number'],
    ['.5', 'not-a-number'],
    ['12 g', 'not-a-number'],
    ['\u0663', 'not-a-number'],
    ['\uff11', 'not-a-number'],
    ['\ud800', 'not-a-number'],
    ['1\u0000', 'not-a-number'],
    ['99999999', 'too-long'],
  ])('%j as a mass', (text, expected) => expect(found(typedMass(text, metric))).toBe(expected));

  test('follows the decimal sign of the locale', () => {
    expect(found(typedMass('12,5', spanish))).toBe(12.5);
    expect(found(typedMass('12.5', spanish))).toBe('other-sign');
  });

  test.each([
    // an avoirdupois pound is 453.59237 g by definition, NIST Handbook 44, appendix C; from memory
    ['2 lb', 907.18474],
    ['2lb 0', 907.18474],
    ['2 lb 0.0 oz', 907.18474],
    ['2 lb 0.00', 907.18474],
    ['2 lb 8 oz', 1133.980925],
    ['35.5', 1006.40807],
    ['35.5 oz', 1006.40807],
    ['2 kg', 'not-a-number'],
    ['2 lb 3 lb', 'not-a-number'],
    ['2 lb 20', 'ounces'],
    ['2 lb 16 oz', 'ounces'],
    ['2 lb 15.9', 1357.9421576875002],
    ['', 'empty'],
    ['0', 'zero'],
  ])('%j in pounds and ounces', (text, expected) => {
    const value = found(typedMass(text, us));
    if (typeof expected === 'number') expect(value).toBeCloseTo(expected, 4);
    else expect(value).toBe(expected);
  });

  test.each([
    ['48', 48],
    ['4.5', 'not-whole'],
    ['4,5', 'not-whole'],
    ['0', 'zero'],
    ['-1', 'not-a-number'],
    ['1e3', 'not-a-number'],
    ['', 'empty'],
  ])('%j as a count', (text, expected) => expect(found(typedCount(text))).toBe(expected));
});
