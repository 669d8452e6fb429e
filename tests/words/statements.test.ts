import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { hazardWords, STATEMENTS } from '../../src/words/en/hazard-statements.ts';
import { safetyPage } from '../../src/words/en/safety.ts';
import { safetySections } from '../../src/words/en/safety-sections.ts';
import { STATEMENTS as SPANISH } from '../../src/words/es/hazard-statements.ts';

const published = (file: string) =>
  new Map(
    readFileSync(new URL(file, import.meta.url), 'utf8')
      .split('\n')
      .filter((line) => line !== '' && !line.startsWith('#'))
      .map((line) => line.split('\t') as [string, string]),
  );

const ENGLISH_PUBLISHED = published('./clp-statements.txt');
const SPANISH_PUBLISHED = published('./clp-statements-es.txt');

test('there are published wordings to hold against', () => {
  expect(ENGLISH_PUBLISHED.size).toBe(36);
  expect(SPANISH_PUBLISHED.size).toBe(20);
});

test.each(Object.entries(STATEMENTS))('%s is quoted to the letter', (code, text) => {
  expect(text).toBe(ENGLISH_PUBLISHED.get(code));
});

test.each(Object.entries(SPANISH))('%s is quoted to the letter in Spanish', (code, text) => {
  expect(text).toBe(SPANISH_PUBLISHED.get(code));
});

// CLP Annex VI: sodium hydroxide H314; potassium hydroxide H302 and H314. H290 is the suppliers' own addition.
test.each([
  ['sodium-hydroxide', '1310-73-2', '215-185-5', ['H290', 'H314']],
  ['potassium-hydroxide', '1310-58-3', '215-181-3', ['H290', 'H302', 'H314']],
])('%s carries its numbers and hazards', (id, cas, ec, hazards) => {
  const hazard = hazardWords.alkalis.find((each) => each.id === id);
  expect(hazard).toMatchObject({ cas, ec, hazards, signal: 'Danger' });
});

// check digit of a CAS number: the digits before it, weighted 1, 2, 3 ... from the right, modulo 10
test.each(hazardWords.alkalis.map(({ cas }) => [cas]))('%s is a CAS number', (cas) => {
  const digits = cas.replaceAll('-', '').split('').map(Number).reverse();
  const sum = digits.slice(1).reduce((total, digit, i) => total + digit * (i + 1), 0);
  expect(sum % 10).toBe(digits[0]);
});

test('every first-aid route leads to a statement, and skin and eyes are never neutralised', () => {
  for (const { code } of safetyPage.firstAid) expect(STATEMENTS).toHaveProperty([code]);
  expect(safetyPage.firstAid.map(({ code }) => code)).toEqual([
    'P305+P351+P338',
    'P303+P361+P353',
    'P301+P330+P331',
    'P304+P340',
  ]);
  expect(safetyPage.neverNeutralise).toMatch(/^Never .*vinegar/);
});

// at 200 words a minute, which is slow reading
test('the page is read in ten minutes', () => {
  const read = [
    safetyPage.first,
    safetyPage.firstAidLead,
    safetyPage.neverNeutralise,
    ...safetyPage.firstAid.flatMap(({ code, practice }) => [practice, STATEMENTS[code]]),
    ...safetySections.flatMap(({ items }) => items),
  ];
  expect(read.join(' ').split(/\s+/).length).toBeLessThan(2000);
});
