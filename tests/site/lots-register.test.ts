import { expect, test } from 'vitest';
import type { Formulary } from '../../src/formulary/formulary.ts';
import { lotRows } from '../../src/handbook/lots-register.ts';
import type { FatLot } from '../../src/reference/lot-records.ts';
import { REFERENCE } from './fixture.ts';

const lot = (wish: Partial<FatLot>): FatLot => ({
  fat: 'olive',
  lot: 'O-1',
  saponificationValue: { value: 190.4, uncertainty: 0.8, method: 'ISO 3657' },
  acidValue: null,
  status: 'released',
  opened: null,
  retestBy: '2027-06-01',
  place: { file: 'data/lots.yaml', line: 1, column: 1 },
  ...wish,
});
const formula = (code: string, fat: string, wish = {}) => ({
  formula: {
    code,
    name: code,
    fats: [{ fat, share: 100, blend: 'base' }],
    afterCookFats: [],
    alkali: { sodium: 100, potassium: 0, basis: 'moles' },
    withdrawn: null,
    ...wish,
  },
});
const formulary = (fats: readonly FatLot[]) =>
  ({
    reference: { ...REFERENCE, lots: { fats, alkalis: [] } },
    formulas: [
      formula('TT-001', 'olive'),
      formula('TT-002', 'shea'),
      formula('TT-003', 'olive', { withdrawn: { on: '2026-01-01', reason: 'x', by: 'y' } }),
    ],
  }) as unknown as Formulary;

test('a released lot names the formulas in use that are weighed from it, by blends too', () => {
  const [row] = lotRows(formulary([lot({})]), '2026-12-01');
  expect(row?.formulas.map(({ code }) => code)).toEqual(['TT-001']);
  expect(row?.values).toEqual([
    {
      text: 'Saponification value 190.4 ± 0.8 mg KOH/g',
      how: 'ISO 3657; decides the weights',
    },
  ]);
  expect(row?.retestPassed).toBe(false);
});

test('a lot that is not released decides nothing and names no formula', () => {
  const rows = lotRows(
    formulary([
      lot({ lot: 'O-3', status: 'rejected' }),
      lot({ lot: 'O-2', status: 'quarantine' }),
      lot({}),
    ]),
    '2027-06-02',
  );
  expect(rows.map((row) => row.lot)).toEqual(['O-1', 'O-2', 'O-3']);
  for (const row of rows.slice(1)) {
    expect(row.formulas).toEqual([]);
    expect(row.values[0]?.how).toBe('ISO 3657');
  }
  expect(rows[0]?.retestPassed).toBe(true);
});

test('free acidity is shown, and said to decide nothing', () => {
  const acidValue = { value: 0.9, uncertainty: 0.1, method: 'ISO 660' };
  const [row] = lotRows(formulary([lot({ acidValue })]), '2026-12-01');
  expect(row?.values[1]?.text).toBe('Acid value 0.9 ± 0.1 mg KOH/g');
  expect(row?.values[1]?.how).toContain('shown only');
});
