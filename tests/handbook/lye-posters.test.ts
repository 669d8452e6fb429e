import { describe, expect, test } from 'vitest';
import { loadFormulary } from '../../src/formulary/load.ts';
import { fatAlkaliTable } from '../../src/handbook/fat-alkali-table.ts';
import { type LyeRow, rowsByKind } from '../../src/handbook/lye-table.ts';
import { lotsOfShop, lotsOfSize } from '../../src/handbook/table-lots.ts';
import type { AlkaliLot, FatLot } from '../../src/reference/lot-records.ts';
import type { Reference } from '../../src/reference/reference.ts';
import { packagedReference } from '../support/packaged-reference.ts';

const packaged = packagedReference();
const alkaliLot = (change: Partial<AlkaliLot>) =>
  ({ ...packaged.lots.alkalis[0], status: 'released', ...change }) as AlkaliLot;
const fatLot = (change: Partial<FatLot>) =>
  ({ ...packaged.lots.fats[0], acidValue: null, status: 'released', ...change }) as FatLot;
const withLots = (fats: readonly FatLot[], alkalis: readonly AlkaliLot[]): Reference => ({
  ...packaged,
  lots: { fats, alkalis },
});

describe('alkali for 100 g of one fat', () => {
  const reference = withLots(
    [
      fatLot({
        fat: 'olive',
        lot: 'O-1',
        saponificationValue: { value: 190, uncertainty: 1 } as never,
      }),
    ],
    [
      alkaliLot({ alkali: 'sodium-hydroxide', lot: 'N-1', form: 'solid', assay: 98 }),
      alkaliLot({ alkali: 'potassium-hydroxide', lot: 'K-1', form: 'solution', assay: 50 }),
    ],
  );
  const { rows, alkalis } = fatAlkaliTable(reference);
  const row = (id: string) => rows.find((each) => each.id === id);

  // by hand: 19.0 g KOH for 100 g at SV 190; as NaOH 19.0 x 39.997 / 56.105 = 13.5449 g, at 98 % 13.8213 g;
  // as a 50 % solution of KOH 38.0 g
  test('follows from the lots, and is never rounded up', () => {
    expect(alkalis.map(({ id }) => id)).toEqual(['sodium-hydroxide', 'potassium-hydroxide']);
    expect(row('olive')).toMatchObject({ value: '190', lot: 'O-1', alkali: ['13.82', '38.00'] });
    expect(alkalis.map(({ isSolution }) => isSolution)).toEqual([false, true]);
  });

  test('has a line for every fat that alkali can be reckoned for, by name', () => {
    const known = [...packaged.fats.values()].filter(({ core }) => core);
    expect(rows).toHaveLength(known.length);
    expect(rows.map(({ name }) => name)).toEqual(rows.map(({ name }) => name).toSorted());
  });

  test('a fat without a lot names none', () => {
    expect(row('shea')?.lot).toBeNull();
  });
});

describe('how long a table may hang', () => {
  test('until the first of its lots is to be tested again', () => {
    const reference = withLots(
      [
        fatLot({ fat: 'olive', lot: 'O-1', retestBy: '2027-05-01' }),
        fatLot({ fat: 'castor', lot: 'C-1', retestBy: '2026-12-20', status: 'quarantine' }),
      ],
      [alkaliLot({ alkali: 'sodium-hydroxide', lot: 'N-1', retestBy: '2027-02-01' })],
    );
    const { lots, until } = lotsOfShop(reference);
    expect(lots.map(({ lot }) => lot)).toEqual(['N-1', 'O-1']);
    expect(until).toBe('2027-02-01');
  });

  test('without lots there is no such day', () => {
    expect(lotsOfShop(withLots([], [])).until).toBeNull();
  });

  test('of a size only the lots that its formulas use count, and what has none is named', () => {
    const loaded = loadFormulary({ formulas: 'formulas', data: 'data' });
    if (!loaded.ok) throw new Error(JSON.stringify(loaded.problems, null, 2));
    const kettle = lotsOfSize(loaded.formulary, 'kettle');
    const used = new Set(
      loaded.formulary.formulas
        .filter(({ document }) =>
          document.batches.some(({ id, refused }) => id === 'kettle' && !refused),
        )
        .flatMap(({ document }) => [...document.alkali, ...document.fats].map(({ id }) => id)),
    );
    expect(kettle.lots.length + kettle.without.length).toBe(used.size);
    expect(kettle.lots.every(({ material }) => used.has(material))).toBe(true);
    expect(lotsOfSize(loaded.formulary, 'no-such-size').lots).toEqual([]);
  });
});

test('a lye table keeps bars, pastes and liquids apart and loses no line', () => {
  const row = (code: string, kind: LyeRow['kind']) => ({ code, kind }) as LyeRow;
  const rows = [row('A', 'liquid'), row('B', 'bar'), row('C', 'bar')];
  expect(rowsByKind(rows).map(({ kind, rows }) => [kind, rows.map(({ code }) => code)])).toEqual([
    ['bar', ['B', 'C']],
    ['liquid', ['A']],
  ]);
});
