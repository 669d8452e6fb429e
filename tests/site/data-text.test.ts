import { expect, test } from 'vitest';
import { dataText } from '../../src/site/data-text.ts';

test('what JSON would take for the same is kept apart', () => {
  const alike = [
    null,
    Number.NaN,
    Number.POSITIVE_INFINITY,
    undefined,
    0,
    -0,
    '0',
    [],
    {},
    new Map(),
    new Set(),
    { a: undefined },
    [['a', 1]],
    new Map([['a', 1]]),
    new Map([['a', 2]]),
    new Set([['a', 1]]),
    { a: 1 },
  ];
  expect(new Set(alike.map(dataText)).size).toBe(alike.length);
});

test.each([
  { name: 'a function', data: { a: () => 1 } },
  { name: 'a symbol', data: { a: Symbol('a') } },
  { name: 'an object of a class', data: { a: new (class Weight {})() } },
  { name: 'a key that looks like a mark', data: { '\0map': [] } },
])('$name is no data', ({ data }) => {
  expect(() => dataText(data)).toThrow();
});
