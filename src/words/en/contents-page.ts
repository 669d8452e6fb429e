import { fixed, plain } from '../numbers.ts';

export const contentsPage = {
  lead: 'Every formula here has been computed, rounded to the shop’s scales and checked. Nobody at the bench computes lye: find the formula, take the batch size, weigh what the page says.',
  beforeTitle: 'Before you open the alkali',
  before:
    'Goggles, gloves, long sleeves. Alkali into water, never water onto alkali. Water for rinsing within reach.',
  beforeLink: 'Read the safety page',
  groups: {
    'bar cold': 'Bars, cold process',
    'bar hot': 'Bars, hot process',
    'paste cold': 'Pastes, cold process',
    'paste hot': 'Pastes, hot process',
    'liquid cold': 'Liquids, cold process',
    'liquid hot': 'Liquids, hot process',
  } as Readonly<Record<string, string>>,
  withdrawn: 'Withdrawn',
  columns: { code: 'Code', formula: 'Formula', superfat: 'Superfat', lowest: 'Lowest' },
  superfat: (percent: number) => `${plain(percent, 1)} %`,
  lowest: (percent: number) => `${fixed(percent, 1)} %`,
  lowestNote:
    'Superfat is what the formula is written for. Lowest is the lower end of its margin: how far it can fall with the natural spread of the fats and the assay of the alkali.',
  find: 'Find by a word',
  findGo: 'Find',
  findMore: 'Find by words, fats, and ranges of properties',
  lyeTitle: 'Lye tables, by batch size',
  lyeLead: 'Alkali and water of all formulas on one sheet, for the wall beside the scale.',
  count: (n: number) => (n === 1 ? '1 formula' : `${n} formulas`),
  howTitle: 'How to use it',
  how: [
    'Find the formula by its code. The code on the mould label and the code on the page must be the same.',
    'Take the block of your batch size and only that one. Weigh each line into a cup of its own, from top to bottom; each line has its unit.',
    'Check that the lot on the bag is the lot that the page names, where it names one.',
    'Where a page gives a reason in place of a weight, there is no weight. Do not work one out at the bench; ask the formulator.',
    'On paper, look at the date at the top. A sheet from an older edition belongs in the bin.',
  ],
  moreTitle: 'Also here',
  fats: 'each fat with its acids, its values, their sources, and where it is used',
  methods: 'every model behind the numbers, with its equation, its range and what it leaves out',
  safety: 'lye, protective equipment, spills, first aid',
  dataTitle: 'As files',
  dataLead: 'The same numbers for spreadsheets and programs, in grams and degrees Celsius:',
} as const;
