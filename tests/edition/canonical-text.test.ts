import fc from 'fast-check';
import { expect, test } from 'vitest';
import { type Canonical, canonicalText } from '../../src/edition/canonical-text.ts';

test('the example of RFC 8785, section 3.2', () => {
  const value = {
    // biome-ignore lint/correctness/noPrecisionLoss: the example has more digits than a number holds
    numbers: [333333333.33333329, 1e30, 4.5, 2e-3, 0.000000000000000000000000001],
    string: '\u20ac$\u000F\u000aA\'\u0042\u0022\u005c\\"/',
    literals: [null, true, false],
  };
  expect(canonicalText(value)).toBe(
    '{"literals":[null,true,false],"numbers":[333333333.3333333,1e+30,4.5,0.002,1e-27],' +
      '"string":"\u20ac$\\u000f\\nA\'B\\"\\\\\\\\\\"/"}',
  );
});

test('keys sort by UTF-16 code unit, as in RFC 8785, section 3.2.3', () => {
  const value = {
    '\u20ac': 'Euro Sign',
    '\r': 'Carriage Return',
    '\ufb33': 'Hebrew Letter Dalet With Dagesh',
    '1': 'One',
    '\ud83d\ude00': 'Emoji: Grinning Face',
    '\u0080': 'Control',
    '\u00f6': 'Latin Small Letter O With Diaeresis',
  };
  const order = Object.values(JSON.parse(canonicalText(value)) as Record<string, string>);
  // "1" comes first in any object that is parsed, so the text itself is looked at too
  expect(order.slice(1)).toEqual([
    'Carriage Return',
    'Control',
    'Latin Small Letter O With Diaeresis',
    'Euro Sign',
    'Emoji: Grinning Face',
    'Hebrew Letter Dalet With Dagesh',
  ]);
  expect(canonicalText(value)).toMatch(/^\{"\\r":"Carriage Return","1":"One","\u0080"/);
});

test('an absent key and an undefined one are the same, order is not', () => {
  expect(canonicalText({ b: 1, a: undefined, c: [2, 1] })).toBe('{"b":1,"c":[2,1]}');
  expect(canonicalText([1, 2])).not.toBe(canonicalText([2, 1]));
});

test('it is JSON of the same value, whatever the order of the keys', () => {
  fc.assert(
    fc.property(fc.dictionary(fc.string(), fc.jsonValue()), (value) => {
      const data = JSON.parse(JSON.stringify(value)) as Record<string, Canonical>;
      const text = canonicalText(data);
      expect(JSON.parse(text)).toEqual(data);
      const turned = Object.fromEntries(Object.entries(data).reverse());
      expect(canonicalText(turned)).toBe(text);
    }),
  );
});

test('refuses what is not a number', () => {
  expect(() => canonicalText({ a: Number.NaN })).toThrow(RangeError);
  expect(() => canonicalText([Number.POSITIVE_INFINITY])).toThrow(RangeError);
});
