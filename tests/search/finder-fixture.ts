import { dayOf, type FinderData } from '../../src/search/finder/finder-data.ts';

/** Six invented formulas, small enough to answer every question by hand. */
export const FIXTURE: FinderData = {
  codes: ['A-1', 'A-2', 'A-3', 'B-1', 'B-2', 'C-1'],
  names: ['Wharf', 'Anchor', 'Lamp', 'Kettle', 'Brine', 'Dock'],
  properties: [
    {
      id: 'superfat',
      name: 'Superfat',
      unit: '%',
      group: 'Superfat',
      format: 'number',
      decimals: 1,
      values: [5, 6.5, 5, 0, 2.5, 8],
    },
    {
      id: 'lye-temperature',
      name: 'Lye temperature',
      unit: '°C',
      group: 'Lye',
      format: 'number',
      decimals: 0,
      values: [78, null, 81, null, 65, -2],
    },
    {
      id: 'review-by',
      name: 'Review by',
      unit: '',
      group: 'File',
      format: 'date',
      decimals: 0,
      values: ['2027-01-31', '2027-06-01', null, '2026-12-01', null, null].map((date) =>
        date === null ? null : dayOf(date),
      ),
    },
  ],
  traits: [
    {
      id: 'kind',
      name: 'Kind',
      holds: 'one',
      only: false,
      choices: [
        { id: 'bar', name: 'Bar' },
        { id: 'liquid', name: 'Liquid' },
        { id: 'paste', name: 'Paste' },
      ],
      members: [[0], [0], [0], [2], [1], [0]],
    },
    {
      id: 'fats',
      name: 'Fats',
      holds: 'many',
      only: true,
      choices: [
        { id: 'castor', name: 'Castor oil' },
        { id: 'coconut', name: 'Coconut oil' },
        { id: 'olive', name: 'Olive oil' },
        { id: 'palm', name: 'Palm oil' },
      ],
      members: [[1, 2], [0, 1, 2], [2], [0, 1], [1], [1, 2, 3]],
    },
  ],
};
