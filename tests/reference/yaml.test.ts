import { describe, expect, test } from 'vitest';
import { parseYaml } from '../../src/reference/yaml.ts';

test('places are those of the whole file, with Windows line ends too', () => {
  const yaml = parseYaml('a: 1\r\nb:\r\n  - { C14:0: { min: 0x10 }, d: }\r\n', { firstLine: 2 });
  expect(yaml.value).toEqual({ a: 1, b: [{ 'C14:0': { min: 16 }, d: null }] });
  expect(yaml.placeOf(['b', 0, 'C14:0', 'min'])).toEqual({ line: 4, column: 21 });
  expect(yaml.placeOfKey(['b', 0, 'C14:0'])).toEqual({ line: 4, column: 7 });
  expect(yaml.writtenAt(['b', 0, 'C14:0', 'min'])).toBe('0x10');
});

test('what is absent stands at the nearest that holds it', () => {
  const yaml = parseYaml('a:\n  b: 1\nc:\n');
  expect(yaml.placeOf(['a', 'x'])).toEqual({ line: 2, column: 3 });
  expect(yaml.placeOf(['c'])).toEqual({ line: 3, column: 1 });
  expect(yaml.placeOf(['nothing'])).toEqual({ line: 1, column: 1 });
});

describe('faults, never an exception', () => {
  test.each([
    ['anchors that unfold', 'a: &a [x]\nb: &b [*a, *a]\nc: [*b, *b]\n', 'anchor'],
    ['a merge key', '<<: { a: 1 }\n', 'anchor'],
    ['a tab', 'a:\n\tb: 1\n', 'tab'],
    ['a key twice', 'a: 1\na: 2\n', 'duplicate-key'],
    ['an open bracket', 'a: [1\n', 'syntax'],
    ['brackets by the thousand', '['.repeat(20_000), 'syntax'],
    ['dashes by the thousand', '- '.repeat(100_000), 'syntax'],
    ['a second document', 'a: 1\n---\nb: 2\n', 'syntax'],
    ['a list as a key', '[1, 2]: 3\n', 'syntax'],
  ])('%s', (_, text, kind) => {
    const { value, faults } = parseYaml(text);
    expect(value).toBeNull();
    expect(faults[0]?.kind).toBe(kind);
    expect(faults.length).toBeLessThan(10);
  });
});
