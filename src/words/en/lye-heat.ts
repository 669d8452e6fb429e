import { temperature, warming } from '../measures.ts';
import { fixed } from '../numbers.ts';

/** The heat of the lye on a formula's page. */
export const lyeHeatWords = {
  title: 'Heat of the lye',
  method: 'How the heat of the lye is reckoned',
  rows: {
    start: 'Water and alkali at the start',
    strength: 'Hydroxide in the pot, pure, of hydroxide and water',
    peak: 'Hottest, by the hotter of the data sets',
    coolest: 'The same by the cooler',
    allWater: 'Hottest if no water were held back',
    extra: 'Holding water back makes the pot hotter by',
    boiling: 'Boils at',
    saturationAtStart: 'A saturated lye at the start temperature holds',
    saturationAtPeak: 'A saturated lye at the hottest holds',
  },
  celsius: (value: number) => temperature(value),
  /** A difference. [K] */
  kelvin: (value: number) => warming(value),
  percent: (value: number) => `${fixed(value, 1)} %`,
  noNumber: 'No number',
  tableEnds: (celsius: number) => `not known: the table ends at ${temperature(celsius)}`,
  noLoss:
    'With no heat lost to jug and air. A real pot stays somewhat cooler; nothing here says by how much, so plan for the figure.',
  boils:
    'The lye reaches its boiling point by this reckoning. It can spit and boil over: add the alkali in small portions with cooling between them.',
  crystals:
    'The lye holds more than dissolves at the start temperature. What dissolves hot comes out as crystals on cooling: use it warm, and look at the bottom of the jug before you pour.',
  strongest:
    'No number means the strongest caution, not a mild lye. Take it as boiling hot: alkali into the water in small portions, cold water, cooling round the jug, a vessel that stands heat and is no more than half full, face shield, nobody leaning over it, and a thermometer before anything else is done with it.',
  ofStock:
    'Stock lye still warms when water is added. Pour the stock into the water slowly, measure, and take it as hot until the thermometer says otherwise.',
  limitOnly: (material: string, kilojoules: readonly number[]) =>
    `${material}: at infinite dilution one mole sets free ${kilojoules.map((each) => fixed(each, 1)).join(' or ')} kJ, by source. At the strength of a lye nothing was found, and the limit gives no temperature.`,
  newerAdds: (kilojoules: number) =>
    `At the strength of a lye only the older set has figures. A newer set, known at infinite dilution alone, lies ${fixed(kilojoules, 2)} kJ/mol higher; the hotter reading adds that at every strength.`,
  fromMemory: (tables: readonly string[]) =>
    `At this strength nothing but figures from memory stands behind: ${tables.join(', ')}.`,
  partlyFromMemory: (tables: readonly string[]) =>
    `Partly from memory at this strength: ${tables.join(', ')}.`,
  tables: {
    'heat-of-solution': 'heat of solution',
    'heat-capacity': 'heat capacity',
    solubility: 'solubility',
    'boiling-point': 'boiling point',
  },
  sourcesTitle: 'Where the tables come from',
} as const;
