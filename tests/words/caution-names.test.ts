import { expect, test } from 'vitest';
import { RULES } from '../../src/cautions/rules.ts';
import { cautionNames } from '../../src/words/en/cautions-names.ts';

test('every caution has a short name of its own, in words', () => {
  const names = Object.keys(RULES).map((id) => cautionNames[id as keyof typeof cautionNames]);
  expect(new Set(names).size).toBe(names.length);
  expect(names.filter((name) => !/^\p{Lu}[\p{L} ]{4,39}$/u.test(name))).toEqual([]);
});
