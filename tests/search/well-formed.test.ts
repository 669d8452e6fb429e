import fc from 'fast-check';
import { expect, test, vi } from 'vitest';
import { readQuery } from '../../src/search/reader/query.ts';
import { wellFormed } from '../../src/search/well-formed.ts';

test('is what the built-in method of newer browsers gives', () => {
  fc.assert(
    fc.property(fc.string({ unit: 'binary' }), fc.integer({ min: 0, max: 30 }), (text, at) => {
      const cut = `${text.slice(at)}\ud83d ${text.slice(0, at)}\ude00`;
      expect(wellFormed(cut)).toBe(cut.toWellFormed());
    }),
  );
});

test('a query is read alike where the browser has no segmenter of letters', () => {
  const read = (typed: string) => readQuery(typed, new Set(['_']), (word) => word);
  const typed = [
    '“olive” Öl',
    'cafe\u0301, jabón!',
    'İzmir ñandú…',
    'a_b (lye) — 30 %',
    'e\u0301\u0323',
  ];
  const segmented = typed.map(read);
  vi.stubGlobal('Intl', Object.create(Intl, { Segmenter: { value: undefined } }));
  try {
    expect(Intl.Segmenter).toBeUndefined();
    expect(typed.map(read)).toEqual(segmented);
  } finally {
    vi.unstubAllGlobals();
  }
});
