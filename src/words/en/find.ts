import { dateText } from '../dates.ts';
import { degreeUnit } from '../measures.ts';
import { plain } from '../numbers.ts';

/** What is looked for by number: name and unit of each property, under its head. */
const properties = {
  superfat: ['Superfat, as written', '%'],
  'lowest-superfat': ['Lowest superfat', '%'],
  'final-superfat': ['Superfat, final', '%'],
  'saponification-value': ['Saponification value', 'mg KOH/g'],
  'iodine-value': ['Iodine value', 'g I₂/100 g'],
  oxidisability: ['Oxidisability, COX', ''],
  'bis-allylic': ['Bis-allylic positions, BAPE', ''],
  'chain-length': ['Mean chain length', 'carbons'],
  saturated: ['Saturated acids', '%'],
  monounsaturated: ['Acids with one double bond, ricinoleic too', '%'],
  polyunsaturated: ['Polyunsaturated acids', '%'],
  'lye-concentration': ['Lye concentration', '%'],
  'lye-as-made': ['Lye concentration in the pot', '%'],
  get 'lye-temperature'(): readonly [string, string] {
    return ['Lye temperature, no heat lost', degreeUnit()];
  },
  'tfm-fresh': ['Total fatty matter, fresh', '%'],
  'tfm-released': ['Total fatty matter, at release', '%'],
  'glycerol-fresh': ['Glycerol, fresh', '%'],
  'glycerol-released': ['Glycerol, at release', '%'],
  'water-fresh': ['Water, fresh', '%'],
  revision: ['Revision', ''],
  'approved-on': ['Approved on', ''],
  'review-by': ['Review by', ''],
} as const;

export type FindProperty = keyof typeof properties;

export const findWords = {
  properties: properties as Readonly<Record<FindProperty, readonly [name: string, unit: string]>>,
  groups: {
    superfat: 'Superfat',
    fats: 'The fats together',
    acids: 'Single acids',
    lye: 'Lye',
    soap: 'The soap',
    paper: 'Revision and approval',
  },
  traits: {
    kind: 'Kind',
    process: 'Process',
    fats: 'Fats',
    additives: 'Additives and liquids',
    allergens: 'Allergen sources',
    tags: 'Tags',
    batches: 'Batch size that can be made',
    cautions: 'Cautions',
    lots: 'Lots reckoned with',
  },
  percent: '%',
  title: 'Find',
  lead: 'A word, a fat, a range of a property, a batch size, or all of them together. The address of this page keeps what you ask: bookmark it or send it.',
  words: 'Words',
  wordsHint:
    'The beginning of a word is enough. Words in “quotes” must follow one another. Formulas, fats, safety and methods are searched.',
  where: 'Pages listed',
  everywhere: 'All pages',
  places: {
    formulas: 'Formulas',
    materials: 'Fats and other materials',
    safety: 'Safety',
    methods: 'Methods',
  },
  wordsCut: (most: number) => `Only the first ${most} letters are looked at.`,
  noWord: 'There is no word in this.',
  limits: 'Limits',
  limitsLead:
    'Each mark on a strip is a formula; the strong ones are those found. Type the ends, step them with the arrow keys, or drag over the strip. A value is compared as it is shown.',
  least: (name: string) => `${name}, at least`,
  most: (name: string) => `${name}, at most`,
  asColumn: 'column',
  asColumnOf: (name: string) => `Show ${name} as a column`,
  with: 'with',
  without: 'without',
  only: 'nothing but',
  choose: (mode: string, name: string) => `${mode} ${name}`,
  clear: 'Ask for nothing',
  results: 'Formulas',
  found: (n: number, all: number) => (n === 1 ? `1 of ${all} formulas` : `${n} of ${all} formulas`),
  inForce: 'Limits in force; without one of them there would be as many as it says:',
  drop: (limit: string, n: number) => `Drop “${limit}”: ${n}`,
  nothing: 'No formula keeps all of these limits. Dropping one would leave:',
  limitNames: {
    words: (words: string) => `the words ${words}`,
    least: (name: string, from: string) => `${name} at least ${from}`,
    most: (name: string, to: string) => `${name} at most ${to}`,
    between: (name: string, from: string, to: string) => `${name} ${from} to ${to}`,
    exactly: (name: string, value: string) => `${name} ${value}`,
    any: (trait: string, names: string) => `${trait}: ${names}`,
    with: (name: string) => `with ${name}`,
    without: (name: string) => `without ${name}`,
    only: (trait: string, names: string) => `${trait}: nothing but ${names}`,
  },
  or: ' or ',
  columns: { code: 'Code', name: 'Formula', acids: 'Acids' },
  acidsOf: (saturated: string, mono: string, poly: string) =>
    `saturated ${saturated} %, monounsaturated ${mono} %, polyunsaturated ${poly} %`,
  acidsNote:
    'Acids, from the left: filled, saturated; half-tone, monounsaturated; open, polyunsaturated; what is left, hydroxylated.',
  noValue: '–',
  listed: (n: number, all: number) => `The first ${n} of ${all} are listed.`,
  showMore: (n: number) => `Show ${n} more`,
  showAll: (n: number) => `Show all ${n}`,
  pages: 'Pages with these words',
  morePages: (n: number) => `Show more, ${plain(n)} are left`,
  noPages: 'No page has these words.',
  outsideLimits: 'Only formulas that keep the limits are listed.',
  cut: '…',
  ignored: (parts: string) =>
    `This part of the address says nothing here and was left out: ${parts}`,
  needsScripts:
    'Asking by word and by number needs scripts, which are off or could not start. These lists answer the same questions without them.',
  browserTooOld:
    'This browser is too old to search by word. The limits work, and so do the lists below.',
  searchBroken: (file: string) =>
    `The search cannot be used: ${file} is missing or damaged. The lists below need no search.`,
  lists: 'Lists',
  listsLead: 'Made with the handbook, in a fixed order.',
  savedTitle: 'Searches that the shop keeps',
  savedLead: (date: string) => `As found in this edition, as of ${dateText(date)}.`,
  savedOpen: 'Open it in the finder to change it',
  savedNone: 'No formula of this edition answers.',
  listTitles: {
    fats: 'Formulas by fat',
    kinds: 'Formulas by kind',
    cautions: 'Formulas by caution',
    property: (name: string) => `Formulas by property: ${name}`,
  },
  listLeads: {
    fats: 'Where each fat is used, with its share of the fats.',
    kinds: 'Bars, pastes and liquids, by process.',
    property: (unit: string) =>
      unit === '' ? 'In bands, from low to high.' : `In bands, from low to high, in ${unit}.`,
    cautions: 'Which formulas carry which caution.',
  },
  backToFind: 'All ways to find a formula',
  band: (from: string, to: string, unit: string) => `${from} to below ${to} ${unit}`.trimEnd(),
  fatPage: (name: string) => `${name}: its acids, values and sources`,
  and: '; ',
  propertyLists: 'By property, in bands from low to high',
  noNumber: 'no number',
} as const;
