import { expect, test } from 'vitest';
import { cautionsOf } from '../../src/cautions/with-cautions.ts';
import { computedWith } from './context.ts';

// Facts of the trade, common practice, no source: what makers say of soaps of one oil, held against what the
// rules say once the composition in the data has gone through the core.

const ofOneOil = (fat: string, share = 100, kind: 'bar' | 'paste' = 'bar') => {
  const fats = [{ fat, share }, ...(share < 100 ? [{ fat: 'tallow', share: 100 - share }] : [])];
  const { computed, reference } = computedWith({ formula: { fats, kind } });
  return cautionsOf(computed, reference, null).map(({ id }) => id);
};

test('coconut oil alone strips the skin and makes a hard, brittle bar; a quarter of it does neither', () => {
  expect(ofOneOil('coconut')).toEqual(expect.arrayContaining(['strips-skin', 'hard-and-brittle']));
  expect(ofOneOil('coconut', 25)).not.toContain('strips-skin');
  expect(ofOneOil('coconut', 25)).not.toContain('hard-and-brittle');
});

test('olive oil alone is slow, holds no lauric or myristic acid and keeps', () => {
  const found = ofOneOil('olive');
  expect(found).toContain('slow-trace');
  for (const id of ['strips-skin', 'hard-and-brittle', 'oxidises-early']) {
    expect(found).not.toContain(id);
  }
});

test.each(['sunflower', 'linseed', 'grapeseed', 'soybean', 'hemp'])(
  '%s oil alone oxidises early',
  (fat) => {
    expect(ofOneOil(fat)).toContain('oxidises-early');
  },
);

test.each(['tallow', 'coconut', 'cocoa-butter', 'shea', 'sunflower-ho'])(
  '%s alone keeps',
  (fat) => {
    expect(ofOneOil(fat)).not.toContain('oxidises-early');
  },
);

test('palm kernel oil and cocoa butter speed trace', () => {
  expect(ofOneOil('palm-kernel')).toContain('fast-trace');
  expect(ofOneOil('cocoa-butter', 20)).toContain('fast-trace');
  expect(ofOneOil('olive')).not.toContain('fast-trace');
});

test('castor oil makes bars sticky, not pastes', () => {
  expect(ofOneOil('castor', 10)).toContain('castor-share');
  expect(ofOneOil('castor', 10, 'paste')).not.toContain('castor-share');
});
