import { fixed, plain } from '../numbers.ts';

/** The page of sources that do not agree. */
export const contradictionsPage = {
  title: 'Contradictions',
  lead: 'Where sources do not agree: ranges that do not meet, or a single value outside the range used. Nothing is averaged. One record is used by the order of choice, and the others stay here and on the fat’s page.',
  counted: (groups: number, fats: number) =>
    `${groups} disagreements over ${fats} fats, found by comparing every record with every other of the same kind.`,
  orderLead: 'The order of choice, by the kind of the source:',
  orderRest:
    'Within one kind, what was read stands before what is known from memory. A range needs both of its ends, and what a few samples spanned counts only where there is no other.',
  kinds: {
    standard: 'standard',
    pharmacopoeia: 'pharmacopoeia',
    regulation: 'regulation',
    handbook: 'handbook',
    paper: 'paper',
    supplier: 'supplier',
    practice: 'practice',
  },
  nothingFound: 'No two sources contradict each other here.',
  notCompared:
    'Acids that a source does not list are not compared, nor densities at different temperatures.',
  sections: {
    'saponification-value': 'Saponification values',
    'iodine-value': 'Iodine values',
    density: 'Relative densities',
    composition: 'Fatty acids, percent of all',
    tables: 'Tables of the alkalis',
  },
  columns: {
    fat: 'Fat',
    value: 'Value',
    source: 'Source',
    what: 'What',
    apart: 'From the used one',
    why: 'Used or not, and why',
    table: 'Table',
    used: 'Read by a model',
    other: 'Another set',
    widest: 'Furthest apart',
    reason: 'Why this one',
  },
  used: 'used',
  noneUsed: 'no record can be used',
  lowers: 'lowers the value used',
  why: {
    kind: (used: string, other: string) => `a ${used} stands before a ${other}`,
    memory: 'read stands before remembered',
    open: 'one end of the range is missing',
    single: 'a value without a range',
    samples: (count: number) =>
      count === 1 ? 'one sample' : `what ${count} samples spanned or gave on average`,
    file: 'of the same rank, and listed later',
  },
  apart: (distance: number) => (distance === 0 ? 'meets it' : plain(distance, 3)),
  tableNames: {
    'heat-of-solution': 'Heat of solution',
    'heat-capacity': 'Heat capacity',
    density: 'Density',
    solubility: 'Solubility',
    'boiling-point': 'Boiling point',
    crystallisation: 'First crystals',
  },
  solutes: {
    'sodium-hydroxide': 'sodium hydroxide',
    'potassium-hydroxide': 'potassium hydroxide',
    'potassium-carbonate': 'potassium carbonate',
  },
  tableReasons: {
    'heat-of-solution':
      'The older set alone has points at the strength of a lye. It is used, and the highest limit of the newer sets is put on top as the hotter reading.',
    'heat-capacity':
      'Wherever several sets cover a strength, the lowest heat capacity gives the hotter lye and is used for the peak; the highest gives the cooler.',
    density:
      'The first set, for both alkalis: above 30 % of sodium hydroxide it lies nearer to what suppliers state than the fit does.',
    solubility:
      'The first set, for both alkalis: around 20 °C it has less sodium hydroxide in a saturated lye, which is the safer reading.',
    'boiling-point': 'The first set.',
    crystallisation: 'The first set.',
  },
  noneRead:
    'No model reads either: no set has points at the strength of a lye, so no temperature is given.',
  atInfiniteDilution: 'at infinite dilution',
  at: (x: number, unit: string) => `at ${plain(x, 2)} ${unit}`,
  against: (used: number, other: number, unit: string) =>
    `${plain(used, 3)} against ${plain(other, 3)} ${unit}`,
  difference: (percent: number) => `${fixed(percent, 1)} %`,
  extrapolated: 'beyond the fit of its source',
  atTemperature: (celsius: number) => `${plain(celsius, 1)} °C`,
  units: {
    degC: '°C',
    '% (m/m)': '%',
    'mol/mol': 'mol of water per mol',
    'kJ/mol': 'kJ/mol',
    'J/(g K)': 'J/(g K)',
    'g/mL': 'g/mL',
  } as Readonly<Record<string, string>>,
  onFatPage: 'Where sources contradict each other',
  toPage: 'All contradictions',
} as const;
