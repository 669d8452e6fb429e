import { describe, expect, test } from 'vitest';
import { isCalendarDate } from '../../src/formulary/calendar-date.ts';
import { parseTarget } from '../../src/formulary/target.ts';
import { didYouMean, suggestion } from '../../src/reference/nearest.ts';
import { problemSummary, problemText } from '../../src/words/problem-text.ts';
import { KNOWN } from './known.ts';

test.each([
  ['38 C', { min: 38, max: 38, unit: 'C' }],
  ['35-40 C', { min: 35, max: 40, unit: 'C' }],
  ['35 – 40 °C', { min: 35, max: 40, unit: 'C' }],
  ['-5--2 C', { min: -5, max: -2, unit: 'C' }],
  ['24h', { min: 24, max: 24, unit: 'h' }],
  ['42 d', { min: 42, max: 42, unit: 'd' }],
  ['90 min', { min: 90, max: 90, unit: 'min' }],
  ['38', null],
  ['86 F', { min: 30, max: 30, unit: 'C' }],
  ['95-104°F', { min: 35, max: 40, unit: 'C' }],
  ['100 K', null],
  ['about 38 C', null],
  ['1e2 C', null],
])('target %s', (text, target) => {
  expect(parseTarget(text)).toEqual(target);
});

test.each([
  ['2026-02-28', true],
  ['2024-02-29', true],
  ['2026-02-29', false],
  ['2100-02-29', false],
  ['2026-13-01', false],
  ['2026-9-1', false],
  ['2026-09-14T00:00', false],
])('date %s', (text, exists) => {
  expect(isCalendarDate(text)).toBe(exists);
});

describe('suggestions', () => {
  test.each([
    ['cocnut', 'coconut'],
    ['Coconut Oil', 'coconut'],
    ['SHEA_BUTTER', 'shea'],
    ['olive oil', 'olive'],
  ])('%s', (found, id) => {
    expect(suggestion(found, KNOWN.fats, '')).toBe(`did you mean "${id}"?`);
  });
  test('none where nothing is near', () => {
    expect(suggestion('tallow', KNOWN.fats, 'add it')).toBe('add it');
    expect(didYouMean('', ['bar', 'paste'], '')).toBe('');
  });
});

describe('problem text', () => {
  const problem = {
    rule: 'formula/unknown-fat',
    severity: 'error',
    file: 'formulas/x.md',
    line: 6,
    column: 12,
    found: 'fat "cocnut"',
    expected: 'an id from data/fats',
    advice: 'did you mean "coconut"?',
  } as const;

  test('is one line', () => {
    expect(problemText(problem)).toBe(
      'formulas/x.md:6:12  Found fat "cocnut", expected an id from data/fats; did you mean "coconut"?  [formula/unknown-fat]',
    );
    expect(problemText({ ...problem, advice: '', severity: 'warning' })).toBe(
      'formulas/x.md:6:12  Warning: Found fat "cocnut", expected an id from data/fats.  [formula/unknown-fat]',
    );
  });
  test('is summed up', () => {
    expect(problemSummary([])).toBe('no problems');
    expect(problemSummary([problem])).toBe('1 error in 1 file');
    expect(
      problemSummary([problem, { ...problem, file: 'b' }, { ...problem, severity: 'warning' }]),
    ).toBe('2 errors and 1 warning in 2 files');
  });
});
