import { expect, test } from 'vitest';
import { compareEditions } from '../../src/edition/changes.ts';
import { weightMoves } from '../../src/edition/weight-moves.ts';
import { FORMULA, LOTS, shopWith } from './shop.ts';

const named = (code: string) => FORMULA.replace('TT-001', code);
const WITHDRAWN = 'withdrawn: { on: 2026-11-01, reason: r, by: b }\ntags:';
const drafts = { drafts: true };

test('what is new, changed, weighed otherwise, withdrawn, back and gone', () => {
  const shop = shopWith({
    '1.md': named('TT-001'),
    '2.md': named('TT-002'),
    '3.md': named('TT-003'),
    '4.md': named('TT-004').replace('tags:', WITHDRAWN),
    '5.md': named('TT-005').replace('tags:', WITHDRAWN),
    '6.md': named('TT-006'),
  });
  const before = shop.edition(drafts).document;
  shop.write('2.md', named('TT-002').replace('60 }', '55 }').replace('40 }', '45 }'));
  shop.write('3.md', named('TT-003').replace('tags:', WITHDRAWN));
  shop.write('4.md', named('TT-004'));
  shop.write('6.md', named('TT-007'));
  const after = shop.edition(drafts).document;
  const changes = compareEditions(before, after);
  const codes = (list: readonly { readonly code: string }[]) => list.map(({ code }) => code);
  expect(changes.since).toEqual({ id: before.id, asOf: before.asOf });
  expect(changes.added).toMatchObject([
    { code: 'TT-004', back: true },
    { code: 'TT-007', back: false },
  ]);
  expect(codes(changes.changed)).toEqual(['TT-002']);
  expect(codes(changes.reweighed)).toEqual([]);
  expect(codes(changes.withdrawn)).toEqual(['TT-003']);
  expect(codes(changes.gone)).toEqual(['TT-006']);

  const [change] = changes.changed;
  expect(change?.shares).toEqual([
    { id: 'olive', before: 60, after: 55 },
    { id: 'coconut', before: 40, after: 45 },
  ]);
  const alkali = change?.weights.find(({ part }) => part === 'alkali');
  // coconut oil has the higher saponification value, so more of it takes more alkali
  expect(alkali?.after).toBeGreaterThan(alkali?.before ?? 0);
  const sv = change?.profile.find(({ id }) => id === 'saponificationValue');
  expect(sv?.after).toBeGreaterThan(sv?.before ?? 0);
  expect(change?.superfat.written).toEqual([8, 8]);
});

test('new lots are no change of a formula', () => {
  const shop = shopWith();
  const before = shop.edition(drafts).document;
  shop.setLots(LOTS.replace('O-1', 'O-2').replace('190.4', '189.4'));
  const changes = compareEditions(before, shop.edition(drafts).document);
  expect(changes.changed).toEqual([]);
  expect(changes.reweighed).toMatchObject([{ code: 'TT-001', shares: [] }]);
});

test('nothing changed is nothing', () => {
  const { document } = shopWith().edition(drafts);
  const { since: _, ...lists } = compareEditions(document, document);
  expect(Object.values(lists).flat()).toEqual([]);
});

test('something that joins at two times is two lines', () => {
  const nothing = {
    fats: [],
    afterCookFats: [],
    alkali: [],
    water: 300,
    heldBack: 0,
    liquids: [],
    additives: [],
  };
  const twice = {
    ...nothing,
    additives: [
      { id: 'sugar', mass: 10, at: 'lye' },
      { id: 'sugar', mass: 5, at: 'trace' },
    ],
  };
  expect(weightMoves(nothing, twice)).toEqual([
    { part: 'water', id: 'water', at: null, before: 300, after: 300 },
    { part: 'additives', id: 'sugar', at: 'lye', before: null, after: 10 },
    { part: 'additives', id: 'sugar', at: 'trace', before: null, after: 5 },
  ]);
});
