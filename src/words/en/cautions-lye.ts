import { dateText } from '../dates.ts';
import { statedTemperature, temperature } from '../measures.ts';
import { fixed, plain } from '../numbers.ts';

const STRONG_LYE =
  'Stand the jug in ice water, add the alkali to the water in small portions, and wait for each to dissolve.';

/** Cautions about the lye and its alkali. */
export const lyeCautions = {
  'lye-heat-near-boiling': (n: { peak: number; boiling: number; margin: number }) => ({
    text: `Made in one go, this lye can heat itself to ${temperature(n.peak)}. It boils at ${temperature(n.boiling)}.`,
    action: STRONG_LYE,
  }),
  'lye-hot': (n: { peak: number; limit: number }) => ({
    text: `Made in one go, this lye can heat itself to ${temperature(n.peak)}, hotter than many plastics bear.`,
    action: `Use a steel jug. ${STRONG_LYE}`,
  }),
  'lye-heat-unknown': (n: { asMade: number; potassium: number }) => ({
    text: `How hot this lye of ${fixed(n.asMade, 0)} % gets is not known${n.potassium > 0 ? ': there are no data for potassium hydroxide' : ''}. Take it that it boils.`,
    action: STRONG_LYE,
  }),
  'lye-stronger-than-written': (n: { asMade: number; written: number; limit: number }) => ({
    text: `Part of the water joins later. In the jug the lye has ${fixed(n.asMade, 1)} % of alkali, not ${fixed(n.written, 1)} %: hotter and more caustic.`,
    action:
      'Weigh the water for the jug by its own line. Cool the jug, and keep the other part away from it.',
  }),
  'lye-near-saturation': (n: {
    percent: number;
    saturation: number;
    temperature: number;
    margin: number;
  }) => ({
    text: `The lye holds ${fixed(n.percent, 1)} % of hydroxide; at ${statedTemperature(n.temperature)} no more than ${fixed(n.saturation, 1)} % dissolves.`,
    action:
      'Stir until it is clear, do not let it go cold, and look for grains before pouring: each one is a caustic spot in the soap.',
  }),
  'potassium-lye': (n: { potassium: number }) => ({
    text: `${fixed(n.potassium, 0)} % of the hydroxide is potassium hydroxide. It draws water from the air within minutes and spits when it meets water.`,
    action:
      'Read the label twice: the two alkalis never stand in for each other weight for weight. Weigh fast, close the bag, face away from the jug.',
  }),
  'stock-lye': (n: { name: string; lot: string; assay: number }) => ({
    text: `${n.name}, lot ${n.lot}, is a stock lye of ${fixed(n.assay, 1)} %: caustic as it stands, and cold makes crystals in it that leave the rest weaker.`,
    action:
      'Goggles and gloves before the cap comes off. Do not weigh from it while there are crystals; warm it only as its safety data sheet allows.',
  }),
  'stock-crystallises': (n: {
    name: string;
    lot: string;
    assay: number;
    crystals: number;
    how: string;
  }) => ({
    text: `${n.name}, lot ${n.lot}, at ${fixed(n.assay, 1)} % begins to crystallise at about ${temperature(n.crystals)} (${n.how}).`,
    action:
      'Keep it warmer than that, on the way here too. If it has been colder, look for crystals, and weigh none of it until it is whole again.',
  }),
  'alkali-without-lot': (n: { name: string; low: number; high: number; reckoned: number }) => ({
    text: `No lot of ${n.name} is released. It is reckoned at ${fixed(n.reckoned, 1)} %, the strong end of ${fixed(n.low, 1)} to ${fixed(n.high, 1)} %.`,
    action:
      'Titrate the lot or enter its certificate. Until then expect more superfat than written, and never a bag above that range.',
  }),
  'alkali-lot-retest': (n: { name: string; lot: string; retestBy: string; days: number }) => ({
    text:
      n.days < 0
        ? `Lot ${n.lot} of ${n.name} was due for its retest on ${dateText(n.retestBy)}.`
        : `Lot ${n.lot} of ${n.name} is due for its retest on ${dateText(n.retestBy)}, in ${plain(n.days)} days.`,
    action:
      n.days < 0
        ? 'Do not weigh from it. Titrate it, or release another lot.'
        : 'Titrate it now, or order the next lot. Keep the bag closed.',
  }),
  'lye-and-metals': (n: { concentration: number }) => ({
    text: `Lye of ${fixed(n.concentration, 0)} % eats aluminium, zinc and tin and sets hydrogen free, which burns.`,
    action: 'Stainless steel or polypropylene only: jug, pot, spoon, strainer and mould.',
  }),
} as const;
