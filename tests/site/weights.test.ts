import { expect, test } from 'vitest';
import { lyeCsv } from '../../src/handbook/lye-csv.ts';
import { lyeTable } from '../../src/handbook/lye-table.ts';
import { weightsTable } from '../../src/handbook/weights.ts';
import { BATCH, DOCUMENT, REFERENCE, REFUSED } from './fixture.ts';

const formulary = (batch: typeof BATCH) => ({
  reference: REFERENCE,
  formulas: [{ document: { ...DOCUMENT, batches: [batch], cautions: [] } }] as never,
});

test('weights stand in working order, each to the step it was rounded to', () => {
  const { groups, decimals, steps } = weightsTable(DOCUMENT, BATCH, REFERENCE);
  expect(
    groups.map(({ title, lines }) => [title, lines.map(({ name, text }) => [name, text])]),
  ).toEqual([
    [
      'Lye',
      [
        // alkali into water: nothing that goes into the jug before it may stand below it
        ['Water', '300'],
        ['Citric acid', '12.0'],
        ['Sodium hydroxide', '139.7'],
      ],
    ],
    ['Fats', [['Olive oil', '1000']]],
    [
      'At trace',
      [
        ['Water held back', '30.4'],
        ['Kaolin', '10.0'],
      ],
    ],
    ['After the cook', [['Shea butter', '20.0']]],
  ]);
  expect(decimals).toBe(1);
  expect(steps).toEqual([0.1, 1]);
});

test('a lot that decides a weight is named beside it', () => {
  const [lye, fats] = weightsTable(DOCUMENT, BATCH, REFERENCE).groups;
  expect(lye?.lines.at(-1)?.lot).toBe('NA-1');
  expect(fats?.lines[0]?.lot).toBe('OL-1');
});

test('a stage that no group is for is a fault, not a line that goes missing', () => {
  const additives = [{ id: 'kaolin', weighedMass: 1, step: 1, at: 'nowhere' }];
  expect(() => weightsTable(DOCUMENT, { ...BATCH, additives }, REFERENCE)).toThrow('nowhere');
});

test('the lye table has alkali, water and what else goes into the lye', () => {
  const table = lyeTable(formulary(BATCH), 'pilot');
  expect(table.alkalis.map(({ name }) => name)).toEqual(['Sodium hydroxide']);
  expect(table.rows).toEqual([
    {
      code: 'TT-001',
      name: 'Test Bar',
      kind: 'bar',
      revision: 2,
      danger: false,
      alkali: ['139.7'],
      water: '300',
      heldBack: '30.4',
      also: [{ name: 'Citric acid', text: '12.0' }],
      refused: null,
    },
  ]);
});

test('a refused size has its reason and no weight anywhere', () => {
  const [row] = lyeTable(formulary(REFUSED), 'pilot').rows;
  expect(row).toMatchObject({ alkali: [null], water: null, heldBack: null, also: [] });
  expect(row?.refused).toContain('round to nothing');
  expect(lyeCsv(formulary(REFUSED), 'pilot').trimEnd().split('\r\n')[1]).toBe(
    'TT-001,Test Bar,2,pilot,,,,,weight-below-scale-step',
  );
});

test('the lye table as CSV sums to what goes into the lye pot', () => {
  const lines = lyeCsv(formulary(BATCH), 'pilot').trimEnd().split('\r\n').slice(1);
  expect(lines.map((line) => line.split(',').slice(4, 7))).toEqual([
    ['sodium-hydroxide', '139.7', '0.1'],
    ['water', '300', '1'],
    ['water-held-back', '30.4', '0.1'],
    ['citric-acid', '12', '0.1'],
  ]);
});
