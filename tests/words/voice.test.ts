import { afterEach, describe, expect, test } from 'vitest';
import { speak } from '../../src/words/catalogue.ts';
import { dateText, monthText } from '../../src/words/dates.ts';
import { weight } from '../../src/words/measures.ts';
import { fixed, plain, range, splitAtPoint } from '../../src/words/numbers.ts';
import { voice } from '../../src/words/voice.ts';

// decimal signs and forms of dates are those of the Unicode CLDR, which Node brings
afterEach(() => speak('en-GB'));

describe.each([
  ['en-GB', 'en', '129.8', '1 Dec 2026', 'Dec 2026'],
  ['en-US', 'en', '129.8', 'Dec 1, 2026', 'Dec 2026'],
  ['es-ES', 'es', '129,8', '1 dic 2026', 'dic 2026'],
  ['es-US', 'es', '129.8', '1 dic 2026', 'dic 2026'],
])('%s', (locale, language, number, date, month) => {
  test('numbers and dates are written as there', () => {
    speak(locale);
    expect(voice().language).toBe(language);
    expect(weight(129.8, 0.1)).toBe(number);
    expect(fixed(-129.8, 1)).toBe(`\u2212${number}`);
    expect(plain(129.8)).toBe(number);
    expect(splitAtPoint(number)).toEqual(['129', number.slice(3)]);
    expect(dateText('2026-12-01')).toBe(date);
    expect(monthText('2026-12-01')).toBe(month);
  });

  test('what rounds to nothing has no sign, and thousands no grouping', () => {
    speak(locale);
    expect(fixed(-0.001, 1).startsWith('0')).toBe(true);
    expect(fixed(1234567, 0)).toBe('1234567');
    expect(range(1, 1, 0)).toBe('1');
  });
});

test('a language without a catalogue is refused, and so is what is no tag', () => {
  expect(() => speak('tlh')).toThrow(RangeError);
  expect(() => speak('not a locale')).toThrow(RangeError);
  expect(voice().locale).toBe('en-GB');
});
