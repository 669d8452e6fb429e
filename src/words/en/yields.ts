import { expectedMass, fineMass, statedMass, tableBasis } from '../measures.ts';
import { fixed, plain } from '../numbers.ts';

/** Yields, the days of cutting and release, and the dilution of a paste. */
export const yieldWords = {
  method: 'How the yield is reckoned',
  title: 'Yield and days',
  get perBasis() {
    return `From ${statedMass(tableBasis())} of fats`;
  },
  columns: {
    measure: 'Measure',
    fresh: 'Fresh',
    released: 'At release',
    size: 'Size',
    batter: 'All together',
    poured: 'Poured',
    bars: 'Bars',
    loss: 'Water lost',
    grade: 'Grade',
    least: 'At least',
  },
  measures: {
    mass: 'Mass',
    water: 'Water',
    soap: 'Soap, dry',
    glycerol: 'Glycerol from the fats',
    unsaponified: 'Fat left unsaponified',
    totalFattyMatter: 'Total fatty matter',
  },
  grams: expectedMass,
  gramsAndShare: (mass: number, percent: number) => `${expectedMass(mass)}, ${fixed(percent, 1)} %`,
  percent: (value: number) => `${fixed(value, 1)} %`,
  lead: 'Reckoned from the weights, with no water boiled off and the alkali all used up. A scale that says otherwise is right.',
  bySize: 'By size, losses of the shop taken off',
  bars: (count: number, wetMass: number) => `${count} of ${statedMass(wetMass, 1)}`,
  barAtRelease: (wetMass: number, released: number) =>
    `A bar poured at ${statedMass(wetMass, 1)} weighs ${fineMass(released)} at the release moisture.`,
  wholeBars: 'Only whole bars count. Trimmings are not taken off.',
  gradesTitle: 'Total fatty matter beside the grades of a standard',
  gradesLead: (source: string, how: string) =>
    `${source} (${how}) grades toilet soap by total fatty matter, among other limits that are not looked at here. A grade names a kind of soap, not its merit: a bar with more water, glycerol or salt has less fatty matter.`,
  atLeast: (percent: number) => `${plain(percent, 1)} %`,
  reached: 'reached',
  notReached: 'not reached',
  schedule: (cut: number | null, release: number | null) =>
    `Made on day 0${cut === null ? '' : `, cut from day ${cut}`}${
      release === null ? '' : `, tested for release from day ${release}`
    }.`,
  scheduleRule:
    'Days count from the making, a part of a day as a whole one, by the lower ends of the targets. The tests before release decide, not the calendar.',
  scheduleExample: (made: string, cut: string | null, release: string | null) =>
    `Made on ${made}${cut === null ? '' : `: cut from ${cut}`}${
      release === null ? '' : `${cut === null ? ':' : ','} tested for release from ${release}`
    }.`,
} as const;

export const dilutionWords = {
  method: 'How the dilution is reckoned',
  title: 'Dilution of the paste',
  lead: 'By the paste as weighed: a cook boils off water that no calculation knows, while the soap stays. The first column of figures is theory, as if nothing had boiled away; the others are the same paste found lighter on the scale.',
  soapIn: (percent: number) => `soap ${fixed(percent, 1)} %`,
  asWeighed: (part: number) => (part === 1 ? 'Theory' : `${fixed(part * 100, 0)} % of theory`),
  get caption() {
    return `Water for ${statedMass(tableBasis())} of paste, by what the paste weighs against theory`;
  },
  target: 'Soap content wanted',
  percent: (value: number) => `${fixed(value, 0)} %`,
  none: 'not weaker',
  joins: (mass: number) =>
    `What the formula adds at dilution is part of that water’s mass: ${fineMass(mass)} for ${statedMass(tableBasis())} of paste by theory. Subtract it before you weigh the water.`,
  bySize: 'Finished mass by size',
  bySizeCaption: 'Finished mass by soap content',
  bySizeLead:
    'Whatever the paste weighs, the soap in it is the same. Bring the whole to the mass below: water to add is that mass less the paste as weighed, less what else joins at dilution. Losses of the shop are taken off already; if more stuck to the pot, there is less soap.',
  columns: { size: 'Size', soap: 'Soap in it', theory: 'Paste by theory' },
  finished: (percent: number) => `${fixed(percent, 0)} %`,
  grams: expectedMass,
  clear:
    'How weak a liquid may be and stay clear is found by a trial on a small cup, not by this table.',
} as const;
