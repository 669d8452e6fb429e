import { expect, test } from 'vitest';
import { dataFiles } from '../../src/search/build/data-kinds.ts';
import { indexPages } from '../../src/search/build/index-pages.ts';
import { languagesOf } from '../../src/search/build/languages.ts';
import { readWholeIndex } from '../../src/search/build/read-back.ts';
import { stemExceptions } from '../../src/search/build/stem-exceptions.ts';
import { bytesFromBase64, inflatePayload } from '../../src/search/reader/payload.ts';
import { stemmerFor } from '../../src/search/reader/stemmer.ts';
import { spanish } from '../../src/words/es.ts';
import { phrasesOf } from '../newcomer/phrases.ts';

// Pagefind stems with an implementation of its own (Snowball in Rust), so the two check each other.
test('over the Spanish words the stems are those of the index, with few exceptions', async () => {
  const text = [...phrasesOf(spanish)].join(' ').replace(/[<>&]/g, ' ');
  const html = `<html lang="es"><body><main data-pagefind-body><p>${text}</p></main></body></html>`;
  const index = dataFiles(await indexPages([{ path: 'a.html', html }]));
  const carried = new Map(index.map(({ path, content }) => [path, content]));
  const [entry] = languagesOf(index);
  if (!entry) throw new Error('no language in the index');
  const { texts, words } = await readWholeIndex(entry, async (name) =>
    inflatePayload(bytesFromBase64(Buffer.from(carried.get(name) ?? []).toString('base64'))),
  );
  expect(entry.language).toBe('es');
  expect(words.length).toBeGreaterThan(1500);
  const exceptions = Object.keys(stemExceptions(texts, words, stemmerFor('es', {})));
  expect(exceptions.length).toBeLessThan(words.length / 200);
});

// A word, with or without its accent, and its plural.
test.each([
  ['saponificación', 'saponificaciones'],
  ['saponificacion', 'saponificaciones'],
  ['jabones', 'jabon'],
  ['pastilla', 'pastillas'],
])('%s and %s have one stem', (a, b) => {
  const stem = stemmerFor('es', {});
  const bare = (word: string) => word.normalize('NFD').replace(/\p{M}/gu, '');
  expect(stem(bare(a))).toBe(stem(bare(b)));
});
