import { expect, test } from 'vitest';
import { RULES } from '../../src/cautions/rules.ts';
import { cautionNames as english } from '../../src/words/en/cautions-names.ts';
import { cautionNames as spanish } from '../../src/words/es/cautions-names.ts';

test.each([
  ['English', english],
  ['Spanish', spanish],
])('every caution has a short name of its own, in words: %s', (_, called) => {
  const names = Object.keys(RULES).map((id) => called[id as keyof typeof called]);
  expect(new Set(names).size).toBe(names.length);
  expect(names.filter((name) => !/^\p{Lu}[\p{L} ]{4,39}$/u.test(name))).toEqual([]);
});
