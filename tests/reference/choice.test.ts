import { describe, expect, test } from 'vitest';
import { firstClosedRange, loweringMean, placeInOrder } from '../../src/reference/choice.ts';
import { ORDER_OF_CHOICE, type Source, type ValueRecord } from '../../src/reference/values.ts';
import { packagedReference } from './packaged-data.ts';

const record = (parts: Partial<ValueRecord>): ValueRecord => ({
  value: null,
  min: null,
  max: null,
  unit: 'mg KOH/g',
  source: 'somewhere',
  at: 'there',
  how: 'standard',
  statistic: 'range',
  samples: null,
  temperature: null,
  note: null,
  ...parts,
});

describe('the range that is used', () => {
  test('is the first with both ends', () => {
    const floor = record({ min: 250 });
    const range = record({ min: 248, max: 265 });
    expect(firstClosedRange([floor, range, record({ min: 1, max: 2 })])).toBe(range);
    expect(firstClosedRange([floor])).toBeNull();
  });

  test('is not what a few samples happened to span, unless there is nothing else', () => {
    const samples = record({ min: 196.8, max: 197.6, samples: 6 });
    const range = record({ min: 192, max: 198 });
    expect(firstClosedRange([samples, range])).toBe(range);
    expect(firstClosedRange([samples])).toBe(samples);
  });
});

test('the lowest mean lowers the value, a higher one or a typical value does not', () => {
  const range = { ...record({}), min: 192, max: 203 };
  const mean = (value: number) => record({ value, statistic: 'mean', samples: 1 });
  expect(loweringMean([mean(196.2), mean(193.9)], range)?.value).toBe(193.9);
  expect(loweringMean([mean(199)], range)).toBeNull();
  expect(loweringMean([record({ value: 193, statistic: 'typical' })], range)).toBeNull();
});

test('the kind of source decides before how it is known, and how it is known before the place', () => {
  const sources = new Map(
    ORDER_OF_CHOICE.map((kind): [string, Source] => [
      kind,
      {
        id: kind,
        title: '',
        author: null,
        edition: null,
        year: null,
        kind,
        address: null,
        readOn: null,
      },
    ]),
  );
  const places = ORDER_OF_CHOICE.flatMap((source) => [
    placeInOrder({ source, how: 'handbook' }, sources),
    placeInOrder({ source, how: 'from memory' }, sources),
  ]);
  expect(places).toEqual([...places].sort((a, b) => a - b));
  expect(new Set(places).size).toBe(2 * ORDER_OF_CHOICE.length);
});

describe('choices in the packaged data', () => {
  const { fats } = packagedReference();
  const chosen = (id: string) => {
    const fat = fats.get(id);
    return {
      source: fat?.chosen.saponificationValue?.source,
      by: fat?.chosen.loweredBy?.source,
      value: fat?.core?.saponificationValue.value,
    };
  };
  test('the standard before everything else', () => {
    expect(chosen('coconut')).toEqual({ source: 'cxs-210-1999', by: undefined, value: 256.5 });
    expect(chosen('olive')).toEqual({ source: 'cxs-33-1981', by: undefined, value: 190 });
  });
  test('a documented mean lowers castor oil and lard', () => {
    expect(chosen('castor')).toEqual({
      source: 'bp-1993',
      by: 'simmons-appleton-1908',
      value: 181,
    });
    expect(chosen('lard')).toEqual({ source: 'cxs-211-1999', by: 'canadian-lards', value: 193.9 });
  });
  test('six samples of mutton tallow do not make its range', () => {
    expect(chosen('tallow-mutton').source).toBe('firestone-2006');
  });
  test('the acid value of free acids takes the place of the saponification value', () => {
    expect(fats.get('stearic-acid')?.core?.saponificationValue).toEqual({
      low: 194,
      value: 203,
      high: 212,
    });
  });
  test('of a wax the free acids are known apart', () => {
    expect(fats.get('beeswax')?.core?.acidValue).toEqual({ low: 17, value: 19.5, high: 22 });
  });
});
