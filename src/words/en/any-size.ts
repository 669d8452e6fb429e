import { statedMass, statedVolume } from '../measures.ts';
import { fixed, plain } from '../numbers.ts';

type Numbers = Readonly<Record<string, number>>;

const percent = (value = 0, decimals = 1) => `${plain(value, decimals)} %`;

/** What a page says before anything is typed. */
export const anySizePage = {
  title: 'Another size',
  pageTitle: (code: string, name: string) => `${code} ${name}: another size`,
  link: 'Another size, or weighed wrong?',
  needsScripts:
    'Another size needs scripts, which are off here. The listed sizes hold without. Never scale one by hand.',
  notApproved:
    'No other size is reckoned: this formula is not approved. The listed sizes are there to read, not to make.',
  noWeights: 'No other size is reckoned: this formula has no weights at any listed size.',
  lead: 'Type one of these. The weights are reckoned here, by the same rules as the listed ones.',
  range: (smallest: string, largest: string) =>
    `From ${smallest} to ${largest} of fats, the smallest and the largest listed size (common practice, no source).`,
  fields: {
    fats: (unit: string) => `Fats, ${unit}`,
    batter: (unit: string) => `Batter to pour, ${unit}`,
    bars: (wetMass: string, like: string) => `Bars of ${wetMass} wet, as in ${like}`,
  },
  clear: 'Clear',
  toSheet: 'Print this size as a sheet, or put a slip right',
  benchSheet: (label: string) => `Bench sheet: ${label}`,
  sheet: {
    mark: 'Not a listed size',
    markNote:
      'Reckoned in the browser. The edition has no weights digest for it, and the page that checks sheets does not know it.',
    printHint: 'Print on A4 or Letter.',
    printListed: 'This is a listed size. Print its own bench sheet, which has a weights digest.',
    nothing: 'No size was reckoned. There is nothing to print.',
    current:
      'Code, revision, fingerprint and edition were looked up in the handbook today and are the current ones.',
    agreed: 'The formulator has agreed to this size. Agreed by:',
    rework: 'No rework in a size that is not listed.',
    amount: '(see the weights)',
    cautionsNote:
      'Cautions that do not depend on the size. Vessel, heat limit, scale and lowest superfat of this size were checked when it was reckoned.',
  },
  correction: {
    title: 'Weighed wrong?',
    lead: 'Only before the lye meets the fats. Type what the scale showed, for each line that is not as written. Leave the others empty.',
    combined: 'Lye and fats have met',
    dissolved: 'Alkali is in the water, all of it or some',
  },
} as const;

/** What is said of a size while the page is read. */
export const anySizeWords = {
  broken:
    'No other size can be reckoned: its data file is missing or damaged. The listed sizes hold. Never scale one by hand.',
  typed: {
    empty: 'Type a size first.',
    'other-sign': (sign: string) =>
      `Write the decimals after “${sign}”, and nothing between the thousands.`,
    'not-a-number': 'That is not a number. Use digits only.',
    'not-whole': 'Bars are counted: type a whole number.',
    ounces: 'Ounces after pounds stay below 16.',
    zero: 'That is nothing to make. Type a number above zero.',
    'too-long': 'That is too large for any size of this shop.',
  },
  size: {
    fats: (mass: string) => `${mass} of fats`,
    batter: (mass: string) => `${mass} of batter`,
    bars: (count: number, wetMass: string) =>
      count === 1 ? `1 bar of ${wetMass}` : `${count} bars of ${wetMass}`,
  },
  found: (size: string, like: string) =>
    `Weights for ${size}. Scales, vessel and losses as for ${like}.`,
  listed: (label: string) =>
    `This is the listed size ${label}. To make it, use its own bench sheet.`,
  caption: (code: string, size: string) => `${code}, ${size}: what to weigh, in working order`,
  lot: (lot: string) => `lot ${lot}`,
  total: (mass: string) => `All together ${mass}.`,
  poured: (mass: string, losses: number) =>
    `Expected to pour ${mass}, after losses of ${percent(100 * losses)}.`,
  superfat: (weighed: number, lowest: number) =>
    `Superfat by these weights ${fixed(weighed, 2)} %, at the lowest ${fixed(lowest, 1)} %, the scale counted.`,
  thin: (lowest: number, limit: number) =>
    `Warning. The lowest superfat of this size is ${fixed(lowest, 2)} %, under ${plain(limit)} %. Let a second person read every weight of fat and alkali, and test before release.`,
  refusedTitle: 'No weights at this size',
  advice: 'Do not scale another size by hand. Ask the formulator.',
  refusals: {
    'size-below-listed': (n: Numbers) =>
      `It takes ${statedMass(n.fats ?? 0, 1)} of fats. The smallest listed size of this formula takes ${statedMass(n.smallest ?? 0, 1)}.`,
    'size-above-listed': (n: Numbers) =>
      `It takes ${statedMass(n.fats ?? 0, 1)} of fats. The largest listed size of this formula takes ${statedMass(n.largest ?? 0, 1)}.`,
    'above-heat-limit': (n: Numbers) =>
      `It takes ${statedMass(n.fats ?? 0, 1)} of fats. One pour may hold ${statedMass(n.limit ?? 0, 1)}, as more cannot lose its heat.`,
    'above-vessel': (n: Numbers) =>
      `It fills its vessel of ${statedVolume(n.vessel ?? 0)} to ${percent(n.fill)}. At most ${percent(n.limit)} is allowed.`,
    'lowest-superfat-below-limit': (n: Numbers) =>
      `The superfat could fall to ${fixed(n.lowest ?? 0, 2)} %, the scale counted. At least ${fixed(n.floor ?? 0, 2)} % is asked for.`,
  },
} as const;

/** What is said on the sheet of a size, and to put right what was weighed wrong. */
export const sizeSheetWords = {
  corrected: (size: string) => `${size}, corrected`,
  scale: (step: string) => `steps of ${step}`,
  sheetScales: (scales: string) => `The scale is level and checked today: ${scales}.`,
  refusals: {
    'lye-has-met-fats': () =>
      'Lye and fats have met. Nothing can be reckoned for what is in the pot now.',
    'correction-too-large': (n: Numbers) =>
      `To make it right, the batch would grow by more than ${percent(n.most)} (common practice, no source). That is no slip of the hand: a cup or a line may be the wrong one.`,
    'correction-not-found': () => 'No weights on these scales make it right.',
    'grown-above-listed': (n: Numbers) =>
      `To make it right, the batch would take ${statedMass(n.fats ?? 0, 1)} of fats, more than its listed size of ${statedMass(n.largest ?? 0, 1)}, and the shop states no vessel to hold it against.`,
    'made-lye-lacks-water': (n: Numbers) =>
      `The lye is made and lacks ${percent(n.missing)} of a part of its liquid. More than ${percent(n.most)} is too much: it is hotter and stronger than anything that was reckoned.`,
    'made-lye-lacks-alkali': (n: Numbers) =>
      `By this reading the made lye lacks ${percent(n.missing)} of an alkali. More than ${percent(n.most)} is no slip of the hand (common practice, no source), and if the scale was misread, adding it would make a caustic batch.`,
    'made-lye-lacks-acid': (_: Numbers) =>
      'The lye is made and an acid in it would be too little. Acid does not go onto alkali, and without it the soap is sharper.',
    'made-lye-near-saturation': (n: Numbers) =>
      `Until the missing water joins, the lye would hold ${percent(n.strength)} of hydroxide, too near to where it drops crystals, or where that is not known.`,
  },
  shown: (name: string, unit: string) => `${name}: scale showed, ${unit}`,
  mixed: 'In with others',
  mixedOf: (name: string) => `${name}: in with others, cannot be taken back`,
  columns: {
    what: 'Material',
    target: 'Must become',
    todo: 'What to do',
    tick: 'Done',
    by: 'By',
    checked: 'Seen',
  },
  offStep: (name: string, step: string) =>
    `${name}: this scale shows steps of ${step}. Read it again.`,
  faulty: (name: string, sentence: string) => `${name}: ${sentence}`,
  stopTitle: 'Stop. Do not combine.',
  metTitle: 'Stop. No weights.',
  stopAdvice:
    'Keep lye and fats apart, write on both what they are, and tell the formulator. Goggles and gloves stay on.',
  metAdvice:
    'Heat off. Leave it where it is, write on it what it is, and tell the formulator. Goggles and gloves stay on.',
  right: 'Everything is as written. Nothing to put right.',
  sameSize: 'The size stays. Do this, line by line, and have each line seen.',
  grown: (mass: string, more: number) =>
    `What is in too much cannot be taken back, so the batch grows by ${percent(more, 2)}, to ${mass} in all. Every line changes. Do this, line by line, and have each line seen.`,
  keep: 'as it is',
  add: (mass: string) => `Add ${mass}.`,
  addBeforeAlkali: (mass: string) =>
    `Add ${mass}, only while no alkali is in. If any is, tick it above and read again.`,
  takeBackBeforeAlkali: (mass: string) =>
    `Take back ${mass}, only while no alkali is in. If any is, tick it above and read again.`,
  takeBack: (mass: string) => `Take back ${mass}.`,
  takeBackAlkali: (mass: string) =>
    `Take back ${mass}, gloves and goggles on, with a clean dry tool. It does not go back into its drum.`,
  addAlkaliToLye: (mass: string) =>
    `Add ${mass} to the lye: let it cool first, then small portions, stirring.`,
  addLater: (mass: string) =>
    `Weigh ${mass} into a cup of its own. Never onto the lye: it joins the batter once lye and fats are mixed.`,
  notYet: (mass: string, instead: string) =>
    `If not weighed yet: weigh ${mass}. If weighed as written: ${instead}`,
} as const;
