import { expect, test } from 'vitest';
import { totalMass, weight } from '../../src/words/measures.ts';
import { decimalsOf, fixed, plain, range, splitAtPoint } from '../../src/words/numbers.ts';

test.each([
  [5, 0],
  [1, 0],
  [0.5, 1],
  [0.1, 1],
  [0.01, 2],
  [1e-7, 7],
])('a step of %s g needs %i decimals', (step, decimals) => {
  expect(decimalsOf(step)).toBe(decimals);
});

test('weights show the step of the scale and never group digits', () => {
  expect(weight(139.7, 0.1)).toBe('139.7');
  expect(weight(450, 0.1)).toBe('450.0');
  expect(weight(12345, 5)).toBe('12345');
  expect(totalMass(12345.6)).toBe('12.346 kg');
});

test('negative numbers have a true minus sign, and nothing has no sign', () => {
  expect(fixed(-2.64, 1)).toBe('\u22122.6');
  expect(fixed(-0.01, 1)).toBe('0.0');
});

test('plain numbers show no more than they have', () => {
  expect(plain(5)).toBe('5');
  expect(plain(5.25)).toBe('5.25');
  expect(plain(1 / 3)).toBe('0.333');
  expect(plain(-0.5)).toBe('\u22120.5');
});

test('a range whose ends look alike is one number', () => {
  expect(range(184, 196, 0)).toBe('184 to 196');
  expect(range(98.51, 98.53, 1)).toBe('98.5');
});

test('a number is cut at its point', () => {
  expect(splitAtPoint('139.7')).toEqual(['139', '.7']);
  expect(splitAtPoint('450')).toEqual(['450', '']);
});
