import { plain } from '../numbers.ts';

export const lotsPage = {
  title: 'Lots',
  lead: 'What was measured on the fats and alkalis in the house. A released lot decides the weights of the formulas beside it; the sheet names it, and the bag must bear the same number.',
  none: 'The shop keeps no lots. Every weight is reckoned on published and trade ranges.',
  without:
    'A material without a released lot is reckoned on its published or trade range, which is wider: the page of each formula shows both.',
  sections: {
    released: 'Released',
    quarantine: 'In quarantine',
    rejected: 'Rejected',
  },
  notes: {
    released: 'To be weighed from until the retest date.',
    quarantine: 'Not to be weighed from. Formulas are reckoned as if it were not there.',
    rejected: 'Never to be weighed from.',
  },
  statuses: { released: 'released', quarantine: 'quarantine', rejected: 'rejected' },
  columns: {
    material: 'Material',
    lot: 'Lot',
    value: 'Measured, k = 2',
    opened: 'Opened',
    retest: 'Retest by',
    formulas: 'Formulas',
  },
  value: (name: string, value: number, uncertainty: number) =>
    `${name} ${plain(value, 2)} ± ${plain(uncertainty, 2)} mg KOH/g`,
  assay: (form: 'solid' | 'solution', percent: number, uncertainty: number) =>
    `${form === 'solution' ? 'Solution' : 'Solid'}, hydroxide ${plain(percent, 2)} ± ${plain(uncertainty, 2)} %`,
  carbonate: (percent: string) => `carbonate ${percent} %`,
  decides: 'decides the weights',
  freeAcid: 'shown only: the saponification value counts free acids already',
  besideAcid: 'shown only: of a free acid the acid value decides',
  ofWax: 'counts in the lower end of the margin in cold process',
  notOpened: 'not opened',
  retestPassed: 'date has passed',
  noFormula: 'none',
  link: 'Lots in the house',
  about:
    'what was measured on each lot, until when it holds, and which formulas are weighed from it',
} as const;
