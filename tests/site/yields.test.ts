import { describe, expect, test } from 'vitest';
import type { FormulaDocument } from '../../src/formulary/document.ts';
import { barsOf } from '../../src/handbook/batch-yields.ts';
import { dilutionTable, finishedMasses } from '../../src/handbook/dilution.ts';
import { barsAtRelease, gradeRows, scheduleLines, yieldRows } from '../../src/handbook/yields.ts';
import type { Reference } from '../../src/reference/reference.ts';
import { BATCH } from './fixture.ts';

// All numbers in this file are invented and chosen to be reckoned with in the head.
const YIELD = {
  soap: 1000,
  glycerol: 100,
  unsaponifiedFat: 50,
  water: 500,
  total: 1700,
  totalFattyMatter: { fresh: 58, released: 72 },
  moisture: { fresh: 29.4, released: 20 },
  releasedMass: 1500,
};
const document = (wish: object = {}) =>
  ({
    kind: 'bar',
    yield: YIELD,
    schedule: { cutFromDay: 1, releaseFromDay: 42 },
    batches: [BATCH],
    additives: [],
    liquids: [],
    ...wish,
  }) as unknown as FormulaDocument;
const grade = (name: string, min: number) => ({
  name,
  totalFattyMatter: { min, value: null, source: 's', how: 'standard' },
});
const reference = (sizes: readonly object[]) =>
  ({
    shop: { batches: sizes.map((size, i) => ({ id: String(i), size })) },
    sources: new Map(),
    soapGrades: [grade('High', 76), grade('Middle', 70), grade('Low', 60)],
  }) as unknown as Reference;

describe('yield of a bar', () => {
  test('drying takes water alone', () => {
    const rows = new Map(yieldRows(document()).map(({ name, ...row }) => [name, row]));
    expect(rows.get('Mass')).toEqual({ fresh: '1700 g', released: '1500 g' });
    expect(rows.get('Water')).toEqual({ fresh: '500 g, 29.4 %', released: '300 g, 20.0 %' });
    expect(rows.get('Soap, dry')).toEqual({
      fresh: '1000 g, 58.8 %',
      released: '1000 g, 66.7 %',
    });
  });

  test('grades are reached or not, fresh and at release; a paste has none', () => {
    const rows = gradeRows(document(), reference([]));
    expect(rows.map(({ fresh, released }) => [fresh, released])).toEqual([
      [false, false],
      [false, true],
      [false, true],
    ]);
    expect(gradeRows(document({ kind: 'paste' }), reference([]))).toEqual([]);
  });

  test('whole bars of every weight that the shop pours; a size by bars has its own count', () => {
    const shop = reference([
      { by: 'fats', mass: 1000 },
      { by: 'bars', count: 10, wetMass: 120 },
      { by: 'bars', count: 40, wetMass: 90 },
    ]);
    expect(barsOf('0', 1199, shop)).toEqual([
      { count: 13, wetMass: 90 },
      { count: 9, wetMass: 120 },
    ]);
    expect(barsOf('1', 1199, shop)).toEqual([{ count: 10, wetMass: 120 }]);
    expect(barsAtRelease(document(), shop)[1]).toContain('weighs 105.9 g');
  });

  test('the days as a rule and as dates', () => {
    expect(scheduleLines(document(), '2026-12-01')).toEqual([
      'Made on day 0, cut from day 1, tested for release from day 42.',
      'Made on 1 Dec 2026: cut from 2 Dec 2026, tested for release from 12 Jan 2027.',
    ]);
    const none = { cutFromDay: null, releaseFromDay: null };
    expect(scheduleLines(document({ schedule: none }), '2026-12-01')).toBeNull();
    const cure = { cutFromDay: null, releaseFromDay: 7 };
    expect(scheduleLines(document({ schedule: cure }), '2026-12-01')?.[1]).toBe(
      'Made on 1 Dec 2026: tested for release from 8 Dec 2026.',
    );
  });
});

describe('dilution', () => {
  // 200 g of glycerol join at dilution: 1500 g of paste that holds 1000 g of soap, 66.7 %
  const paste = document({
    kind: 'liquid',
    additives: [{ id: 'glycerol', at: 'dilution', mass: 200, percentOfFats: 20 }],
    batches: [{ ...BATCH, yield: { poured: 850, releasedMass: 850, soap: 500 } }],
  });

  test('water by the paste as weighed: 1000 g at 66.7 % to 20 % takes 2333 g, a lighter paste more', () => {
    const table = dilutionTable(paste);
    expect(table?.columns[0]).toEqual({ name: 'Theory', content: 'soap 66.7 %' });
    // at 90 % of theory the paste holds 1000 / 1350: 74.07 %, and 74.07 / 20 - 1 = 2.704
    const row = table?.rows.find(({ target }) => target === '20 %');
    expect(row?.water[0]).toBe('2333 g');
    expect(row?.water[2]).toBe('2704 g');
    // 200 g for 1500 g of paste
    expect(table?.joins).toBeCloseTo(133.333, 3);
  });

  test('the finished mass does not depend on what the paste weighs', () => {
    const masses = finishedMasses(paste);
    const at = masses?.targets.indexOf('20 %') ?? -1;
    expect(masses?.sizes[0]).toMatchObject({ soap: '500 g', theory: '750 g' });
    expect(masses?.sizes[0]?.finished[at]).toBe('2500 g');
  });

  test('a content that the paste does not have is not offered; a bar has no table', () => {
    const weak = document({ kind: 'paste', yield: { ...YIELD, soap: 500 } });
    // 500 of 1700 is 29.4 % by theory: 30 % only where the paste came out lighter
    const row = dilutionTable(weak)?.rows.find(({ target }) => target === '30 %');
    expect(row?.water[0]).toBeNull();
    expect(row?.water[3]).not.toBeNull();
    expect(finishedMasses(weak)?.targets).toEqual(['25 %', '20 %', '15 %']);
    expect(dilutionTable(document())).toBeNull();
    expect(finishedMasses(document())).toBeNull();
  });
});
