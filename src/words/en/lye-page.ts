import { dateText } from '../dates.ts';
export const lyePage = {
  title: (label: string) => `Lye table: ${label}`,
  lead: 'Weigh everything on one line, to its last column, each into a cup of its own. The code stands at both ends of the line: they must be the same.',
  order: 'Alkali into water, never water onto alkali.',
  columns: {
    code: 'Code',
    name: 'Formula',
    also: 'Also into the lye',
    water: 'Water',
    revision: 'Rev.',
  },
  danger: 'Danger: read its cautions first',
  heldBack: 'Water held back',
  none: '—',
  refused: 'No weights at this size:',
  csv: 'This table as CSV',
  groups: { bar: 'Bars', paste: 'Pastes', liquid: 'Liquids' },
  lots: {
    title: 'What this table was reckoned for',
    lead: 'Hold it against the bags and drums. With any other lot the weights do not hold.',
    lot: (lot: string, until: string) => `lot ${lot}, retest by ${dateText(until)}`,
    without: (names: string) => `No lot, reckoned on the published range: ${names}.`,
    until: (date: string | null) =>
      date === null ? 'until a lot is released' : `not after ${dateText(date)}`,
    validity: (asOf: string, until: string) =>
      `As of ${dateText(asOf)}. Take it down after ${dateText(until)}, or as soon as a lot, a formula or the edition changes.`,
    noUntil: (asOf: string) =>
      `As of ${dateText(asOf)}. Take it down as soon as a lot is released or a formula or the edition changes.`,
  },
  fats: {
    title: 'Alkali for 100\u00a0g of one fat',
    link: 'Alkali for 100\u00a0g of each fat',
    lead: 'What saponifies all of 100 g of the fat alone: no superfat, nothing to spare. A check on other figures, not a formula to make.',
    rounding: 'Rounded down. The range says how far a fat without a lot can differ.',
    waxes: 'Waxes (beeswax, jojoba) may react only in part, in cold process hardly at all.',
    columns: { fat: 'Fat', value: 'Saponification value', range: 'Range', lot: 'Lot' },
    unit: 'mg KOH per g',
    alkali: (assay: string) => `as weighed at ${assay} %`,
    solution: (assay: string) => `solution of ${assay} %, as weighed`,
    noLot: '—',
  },
} as const;
