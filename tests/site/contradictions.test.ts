import { describe, expect, test } from 'vitest';
import { contradictions, contradictionsOf } from '../../src/handbook/contradictions.ts';
import { furthestApart, tableContradictions } from '../../src/handbook/table-contradictions.ts';
import type { FatRecord } from '../../src/reference/material-records.ts';
import type { TableSet } from '../../src/reference/reference.ts';
import type { ValueRecord } from '../../src/reference/values.ts';
import { packagedReference } from '../reference/packaged-data.ts';

const packaged = packagedReference();
// three sources of an order that is known, and records that are invented
const reference = {
  ...packaged,
  sources: new Map(
    (['standard', 'handbook', 'paper'] as const).map((kind) => [
      kind,
      {
        id: kind,
        title: kind,
        author: null,
        edition: null,
        year: null,
        kind,
        address: null,
        readOn: null,
      },
    ]),
  ),
};
const record = (source: string, wish: Partial<ValueRecord>): ValueRecord => ({
  value: null,
  min: null,
  max: null,
  unit: 'mg KOH/g',
  source,
  at: 'here',
  how: 'handbook',
  statistic: 'range',
  samples: null,
  temperature: null,
  note: null,
  ...wish,
});
const fat = (values: readonly ValueRecord[], wish: Partial<FatRecord> = {}) =>
  ({
    id: 'trial',
    kind: 'glyceride',
    saponificationValues: values,
    acidValues: [],
    iodineValues: [],
    relativeDensities: [],
    compositions: [],
    chosen: {
      saponificationValue: values[0] ?? null,
      loweredBy: null,
      iodineValue: null,
      composition: null,
      unsaponifiable: null,
      density: wish.relativeDensities?.[0] ?? null,
    },
    ...wish,
  }) as unknown as FatRecord;
const USED = record('standard', { min: 184, max: 196 });
const apart = (other: Partial<ValueRecord>) =>
  contradictionsOf(fat([USED, record('handbook', other)]), reference)[0]?.records[1];

describe('what contradicts', () => {
  test('ranges that do not meet, with the room between them and the reason', () => {
    expect(apart({ min: 198, max: 200 })).toMatchObject({
      apart: 2,
      used: false,
      why: 'a standard stands before a handbook',
    });
  });

  test('a single value outside the range used, on either side', () => {
    expect(apart({ value: 197 })?.apart).toBe(1);
    expect(apart({ value: 180 })?.apart).toBe(4);
  });

  test('not: ranges that touch or overlap, a value inside, an open end that reaches', () => {
    for (const other of [
      { min: 196, max: 200 },
      { min: 190, max: 199 },
      { value: 184 },
      { max: 190 },
    ]) {
      expect(apart(other)).toBeUndefined();
    }
  });

  test('not: two single values, of which neither is used as a range', () => {
    const values = [record('handbook', { value: 190 }), record('paper', { value: 195 })];
    expect(contradictionsOf(fat(values), reference)).toEqual([]);
  });

  test('two ranges of which neither is used are shown all the same', () => {
    const values = [
      USED,
      record('handbook', { min: 184, max: 188 }),
      record('paper', { min: 190, max: 195 }),
    ];
    const [found] = contradictionsOf(fat(values), reference);
    expect(found?.records.map(({ apart: distance }) => distance)).toEqual([0, 0, 0]);
  });

  test('densities at different temperatures are not compared', () => {
    const densities = (temperature: number) => [
      record('standard', { min: 0.91, max: 0.915, unit: '1', temperature: 20 }),
      record('handbook', { min: 0.89, max: 0.9, unit: '1', temperature }),
    ];
    const found = (temperature: number) =>
      contradictionsOf(fat([], { relativeDensities: densities(temperature) }), reference);
    expect(found(40)).toEqual([]);
    expect(found(20)[0]).toMatchObject({ measure: 'density' });
  });

  test('an acid of one composition that lies outside that of another', () => {
    const composition = (source: string, min: number, max: number) =>
      ({
        source,
        at: 'here',
        how: 'handbook',
        note: null,
        acids: [{ acid: 'C18:1', min, max }],
      }) as const;
    const used = composition('standard', 55, 83);
    const [found] = contradictionsOf(
      fat([], {
        compositions: [used, composition('paper', 90, 90)],
        chosen: { composition: used } as never,
      }),
      reference,
    );
    expect(found).toMatchObject({ measure: 'composition', acid: 'C18:1' });
    expect(found?.records[1]?.apart).toBe(7);
  });
});

describe('tables', () => {
  const set = (points: TableSet['points'], infiniteDilution: number | null = null) =>
    ({ points, infiniteDilution }) as TableSet;

  test('furthest apart at the points of either; a set of one point counts', () => {
    const line = set([
      [0, 0],
      [10, 10],
    ]);
    const bent = set([
      [0, 1],
      [5, 8],
      [20, 20],
    ]);
    expect(furthestApart(line, bent)).toEqual({ x: 5, used: 5, other: 8 });
    expect(furthestApart(line, set([[5, 6]]))).toEqual({ x: 5, used: 5, other: 6 });
    expect(furthestApart(line, set([[11, 6]]))).toBeNull();
    expect(furthestApart(line, line)).toBeNull();
    expect(furthestApart(set([], 42), set([], 44))).toEqual({ x: null, used: 42, other: 44 });
  });

  // as the publications print them: 46 against 52.2 %, 42.89 against 44.51 kJ/mol, 1.525 against 1.516 g/mL
  test.each([
    ['solubility', 'at 20 °C', '46 against 52.2 %'],
    ['heat-of-solution', 'at infinite dilution', '42.89 against 44.51 kJ/mol'],
    ['density', 'at 50 %', '1.525 against 1.516 g/mL'],
  ])('the known contradiction of the %s of sodium hydroxide is found', (table, where, values) => {
    const found = tableContradictions(packaged).filter(
      (each) => each.table === table && each.solute === 'sodium hydroxide',
    );
    expect(found).toContainEqual(expect.objectContaining({ where, values }));
  });

  test('no pair is listed twice', () => {
    const pairs = tableContradictions(packaged).map(({ table, solute, temperature, used, other }) =>
      JSON.stringify([table, solute, temperature, [used, other].sort()]),
    );
    expect(new Set(pairs).size).toBe(pairs.length);
  });
});

// Simmons and Appleton 1908, chapter III: saponification equivalent of arachis oil 285, that is 196.8 mg KOH/g
// and above the 187 to 196 of the Codex standard
test('the packaged data: arachis oil of 1908 against the standard', () => {
  const found = contradictions(packaged).find(
    ({ fat: { id }, measure }) => id === 'groundnut' && measure === 'saponification-value',
  );
  expect(found?.records.map(({ used }) => used)).toEqual([true, false]);
  expect(found?.records[1]?.apart).toBeCloseTo(0.8, 6);
});
