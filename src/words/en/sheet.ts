import { dateText } from '../dates.ts';
import {
  expectedMass,
  massAtMost,
  massUnit,
  massUnits,
  statedMass,
  temperature,
} from '../measures.ts';
import { fixed, plain } from '../numbers.ts';

/** The bench sheet: what is read, ticked and written while one batch is made. */
export const sheetWords = {
  title: (code: string, name: string, label: string) => `${code} ${name}, ${label}: bench sheet`,
  kicker: 'Bench sheet',
  front: 'Front: weigh',
  back: 'Back: make and release',
  revision: (revision: number) => `Revision ${revision}`,
  asOf: (date: string) => `as of ${dateText(date)}`,
  edition: (id: string) => `Edition ${id}`,
  digest: (text: string) => `Weights ${text}`,
  fingerprint: (text: string) => `Formula ${text}`,
  approved: (by: string, on: string, until: string) =>
    `Approved by ${by} on ${dateText(on)}, review by ${dateText(until)}`,
  print: 'Print on A4 or Letter, both sides of one leaf, at actual size.',
  backToFormula: 'To the formula',
  card: 'Bench card',
  blanks: {
    batch: 'Batch number',
    date: 'Made on',
    maker: 'Weighs',
    checker: 'Checks',
    start: 'Started at',
  },
  stop: {
    title: 'Stop first. Tick all of these, or do not weigh.',
    current:
      'This sheet is the current one: code and weights digest looked up in the handbook today.',
    lots: 'The bags and drums in front of me bear these lots:',
    lot: (lot: string, until: string) => `${lot}, retest by ${dateText(until)}`,
    noLot: '(any lot inside the published range)',
    scales: (scales: string) => `The scale is level and checked today: ${scales}.`,
    scale: (name: string, step: string) => `${name}, steps of ${step} ${massUnit()}`,
    checkWeight: 'Check weight / reading',
    ready: 'Goggles, gloves and apron are on, the tap runs, somebody else is in the building.',
    cautions: 'The cautions of this sheet are read.',
    otherwise:
      'Another lot, another revision, a doubtful scale: stop and ask the formulator. Never scale by hand.',
  },
  cautions: 'Cautions',
  moreCautions: 'More cautions',
  weigh: {
    title: 'Weigh each into a cup of its own, in this order',
    columns: {
      tick: 'Done',
      what: 'Material',
      howMuch: 'Weigh',
      lot: 'Lot used',
      actual: 'Scale showed',
      by: 'By',
      checked: 'Seen',
    },
    order: 'Alkali into water, never water onto alkali.',
    afterCook:
      'Stop. Test the cooked soap for free alkali. Nothing below goes in before it has passed.',
    afterCookLimit: (limit: string) => `Found / at most ${limit}`,
    afterCookNoLimit: 'Found / limit',
    paste: 'Weigh the paste first. What the scale shows counts, not the sum of what went in.',
    get pasteBlank() {
      return `Paste, ${massUnits()}`;
    },
    sums: (lye: string, fats: string, all: string) =>
      `In the lye pot ${lye} ${massUnit()}. Fats ${fats} ${massUnit()}. All together ${all} ${massUnit()}.`,
    superfat: (weighed: number, lowest: number) =>
      `Superfat by these weights ${fixed(weighed, 2)} %, at the lowest ${fixed(lowest, 1)} %.`,
    doubt: 'In doubt whether a line was weighed: start that vessel again.',
  },
  heat: {
    title: 'Heat of the lye',
    peak: (peak: number, start: number) =>
      `Up to ${temperature(peak)} from a start at ${temperature(start)}, with no heat lost.`,
    boils: (boiling: number) =>
      `It boils at about ${temperature(boiling)}: add the alkali in small portions with cooling between them.`,
    unknown: 'No number, and so the strongest caution: take it as boiling hot.',
  },
  readings: {
    title: 'Temperatures and times',
    columns: { what: 'What', aim: 'Aim', found: 'Found', at: 'Time' },
    more: { trace: 'Trace reached', poured: 'Poured' },
  },
  method: 'Method for this size',
  record: {
    title: 'What was done differently',
    deviations: 'Deviations and what was decided',
    rework: 'Rework added: batch, mass, agreed by',
    /** Cut off, never rounded up: it is the most. */
    reworkAtMost: (percent: number, mass: number) =>
      `Rework added (at most ${plain(percent)} %, ${massAtMost(mass)}): batch, mass, agreed by`,
    portions: 'Batter split: portion, mass, what joined it',
  },
  yield: {
    title: 'Yield and days',
    expected: (poured: number, total: number) =>
      `Expected in the moulds ${expectedMass(poured)}; never more than the ${expectedMass(total)} weighed in.`,
    expectedVat: (poured: number, total: number) =>
      `Expected in the vat ${expectedMass(poured)}, less what boils off; never more than the ${expectedMass(total)} weighed in.`,
    losses: (percent: number) =>
      `Losses of ${plain(percent, 1)} % are taken off. Less than expected: write why.`,
    bars: (count: number, wetMass: number) => `${count} bars of ${statedMass(wetMass, 1)}`,
    released: (mass: number) => `${expectedMass(mass)} at the release moisture.`,
    actual: 'Actual mass',
    count: 'Bars good / lost',
    cut: (days: number) => `Cut not before making + ${plain(days)} d`,
    release: (days: number) => `Release not before making + ${plain(days)} d`,
  },
  release: {
    title: 'Release',
    columns: { what: 'Check', limit: 'Limit', method: 'Method', found: 'Found', by: 'By' },
    freeAlkali: 'Free alkali',
    freeAlkaliLimit: (percent: number) => `at most ${plain(percent)} % as NaOH`,
    freeAlkaliMethod: 'ISO 456, two samples',
    ph: 'pH',
    phMethod: 'ISO 4316, 10 g in 1 L of water*',
    moisture: 'Moisture',
    moistureLimit: (percent: number) => `at most ${plain(percent)} %`,
    moistureMethod: 'ISO 672',
    none: 'The formula states no limit. Do not release before the formulator has.',
    note: '* The dilution is common practice, no source: ISO 4316 leaves it to each product.',
    sample: 'Sample kept, where and until',
    decision: 'Decision',
    decisions: ['Released', 'Held', 'Rejected'],
    signature: 'Name, signature, date',
  },
  emergency: 'Emergency',
  noEmergency: 'No emergency number is set for this shop.',
  first: 'The supplier’s safety data sheet and local rules come first.',
} as const;
