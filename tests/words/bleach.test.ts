import { readdirSync, readFileSync } from 'node:fs';
import { expect, test } from 'vitest';

const folder = new URL('../../src/words/es/', import.meta.url);

// in most places the trade's word for lye is what bleach is called, and the two must never be taken for each other
test('the Spanish word for bleach is used once, to say that lye is never that', () => {
  const sentences = readdirSync(folder)
    .flatMap((name) => readFileSync(new URL(name, folder), 'utf8').split(/(?<=[.:])\s|\n/))
    .filter((sentence) => /lej[ií]as?\b|lavandina|\bcloro\b/i.test(sentence));
  expect(sentences).toHaveLength(1);
  expect(sentences[0]).toMatch(/lejía cáustica; nunca es lejía doméstica \(cloro, lavandina\)/);
});
