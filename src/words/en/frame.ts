import { dateText } from '../dates.ts';
import { statedMass, volume } from '../measures.ts';

/** What stands around every page, and the small words that many pages share. */
export const frame = {
  skip: 'To the content',
  menu: 'Handbook',
  contents: 'Contents',
  find: 'Find',
  lyeTables: 'Lye tables',
  fats: 'Fats',
  safety: 'Safety',
  methods: 'Methods',
  asOf: (date: string) => `As of ${dateText(date)}`,
  edition: (id: string) => `Edition ${id}`,
  proof: 'Proof edition, not for use: it holds formulas that are not approved.',
  invented: 'Demonstration: an invented workshop, not a formulary to work from.',
  foot: 'Not a substitute for the supplier’s safety data sheet, for local rules, or for a licensed practitioner’s advice. Those come first.',
  percent: '%',
  /** For those who hear a table: `g` after a number is easily taken for a letter. */
  massIn: { metric: 'in grams', us: 'in pounds and ounces' },
  kinds: { bar: 'Bar', paste: 'Paste', liquid: 'Liquid' },
  processes: { cold: 'cold process', hot: 'hot process' },
  stages: {
    lye: 'in the lye',
    fats: 'in the fats',
    trace: 'at trace',
    'after-cook': 'after the cook',
    dilution: 'at dilution',
  } as Readonly<Record<string, string>>,
  allergens: {
    'tree nuts': 'tree nuts',
    peanut: 'peanut',
    soy: 'soy',
    sesame: 'sesame',
    milk: 'milk',
    wheat: 'wheat',
  } as Readonly<Record<string, string>>,
  severities: { danger: 'Danger', warning: 'Warning', care: 'Care', note: 'Note' },
  batchSize: {
    fats: (grams: number) => `${statedMass(grams)} of fats`,
    batter: (grams: number) => `${statedMass(grams)} of batter`,
    bars: (count: number, grams: number) => `${count} bars of ${statedMass(grams)}, poured weight`,
    mould: (millilitres: number) => `mould of ${volume(millilitres)}`,
  },
  /** Of a caution that follows from the formula's own numbers. */
  reckoned: 'reckoned here, see methods',
  how: {
    measured: 'measured',
    standard: 'standard',
    handbook: 'handbook',
    supplier: 'supplier’s figure',
    'common practice': 'common practice, no source',
    'from memory': 'from memory, not checked against the print',
  },
} as const;
