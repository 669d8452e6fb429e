import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, inject, test } from 'vitest';
import type { FormulaDocument } from '../../src/formulary/document.ts';

const site = inject('site');
const documents = readdirSync(join(site, 'data/formulas')).map(
  (file): FormulaDocument => JSON.parse(readFileSync(join(site, 'data/formulas', file), 'utf8')),
);
const cards = readdirSync(join(site, 'cards'));

test('every batch with weights has its card as SVG and PNG, and no other has', () => {
  const names = documents.flatMap(({ code, batches }) =>
    batches.filter(({ refused }) => !refused).map(({ id }) => `${code}-${id}`),
  );
  expect(cards.toSorted()).toEqual(names.flatMap((name) => [`${name}.png`, `${name}.svg`]).sort());
});

test('no card takes more than 400 kB as SVG and 150 kB as PNG', () => {
  const heavy = cards.filter((file) => {
    const bytes = readFileSync(join(site, 'cards', file)).length;
    return bytes > (file.endsWith('.svg') ? 400_000 : 150_000);
  });
  expect(heavy).toEqual([]);
});

test('the formula page leads to the sheet and the card of each of its sizes', () => {
  for (const { code, batches } of documents) {
    const page = readFileSync(join(site, 'formulas', `${code}.html`), 'utf8');
    for (const { id, refused } of batches) {
      for (const link of [
        `sheets/${code}-${id}.html`,
        `cards/${code}-${id}.svg`,
        `cards/${code}-${id}.png`,
      ]) {
        expect(page.includes(`href="../${link}"`), `${code} to ${link}`).toBe(!refused);
      }
    }
  }
});
