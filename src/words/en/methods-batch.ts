import type { MethodText } from './methods.ts';

/** Models about a batch: its lye beside the heat, its size, what it gives, what is done after. */
export const batchMethods = [
  {
    id: 'stock-lye',
    title: 'Stock lye',
    text: 'Where the alkali lot is a solution, the sheet prints stock and extra water. The stock’s own water counts as water of the formula.',
    symbols: [
      ['a', 'assay of the stock: hydroxide per mass of solution', '1'],
      ['m_pure', 'hydroxide needed', 'g'],
      ['m_all', 'water that the formula asks for', 'g'],
    ],
    range: 'A stock stronger than the lye asked for. A weaker one is refused.',
    ignores:
      'Heat of diluting the stock: no temperature is given. Crystals that already lie in the drum; the caution names the temperature at which they form.',
    source:
      'Stoichiometry; temperatures of first crystals as the table’s source gives them (from memory).',
  },
  {
    id: 'lye-limits',
    title: 'Saturation and boiling point of the lye',
    text: 'Straight lines between the points of the tables. The hydroxide in the pot is held against a saturated lye at the start temperature, at which crystals come out on cooling, and at the hottest. Of a mixed lye the less soluble alkali decides.',
    symbols: [
      ['y', 'saturation or boiling point at x', '%, °C'],
      ['x', 'temperature, or percent of hydroxide', '°C, %'],
      ['x_0, y_0, x_1, y_1', 'the points of the table on either side', 'as x and y'],
    ],
    range:
      'Inside the tables. Nothing is carried beyond their ends; a mixed lye has no boiling point here.',
    ignores: 'Salts, sugar and acids in the lye.',
    source:
      'Tables in the reference data; the figures are from memory, and the sets contradict each other around 20 °C.',
  },
  {
    id: 'batch-size',
    title: 'Size of a batch',
    text: 'A size is stated by its fats, by its batter, by bars and the weight poured for one, or by the volume of the mould. The last three say what must reach the mould, so the shop’s losses come on top. The volume goes by ideal mixing: each part is taken to keep its own volume.',
    symbols: [
      ['b', 'batter per fats of the formula', 'g/g'],
      ['l', 'losses: what stays in pots, of what is made', '1'],
      ['N, m_bar', 'number of bars, and the poured weight of one', 'g'],
      ['V', 'volume of the mould', 'mL'],
      ['d', 'density of the batter', 'g/mL'],
      ['d_i', 'density of each fat and of the lye', 'g/mL'],
    ],
    range:
      'Losses up to 50 %. By volume only where every density is known; the result is an estimate.',
    ignores:
      'By volume: air stirred in, shrinking on mixing, and the temperature, as densities are those at 20 °C. Additives and liquids are taken to be as dense as the rest.',
    source: 'Definition; densities of the reference data.',
  },
  {
    id: 'after-cook',
    title: 'After-cook fats and acids',
    text: 'What joins after the cook gets no alkali. The superfat of the cook and the final one are both shown. Acid that joins then sets fatty acid free from soap, which counts as unsaponified.',
    symbols: [
      ['E_late', 'equivalents of the fats that join after the cook', 'mol'],
      ['n_late', 'acid protons that join after the cook', 'mol'],
    ],
    range: 'Hot process only.',
    ignores: 'Alkali that is still free when they go in; the sheet demands a test first.',
    source: 'Stoichiometry.',
  },
  {
    id: 'yields',
    title: 'Yield at release',
    text: 'Drying takes water alone, until the release moisture of the formula or the shop is reached. Whatever else there is becomes a larger share of less. Total fatty matter is shown fresh and at release, beside the grades that a published standard makes of toilet soap; the grade names a kind of soap, not its merit. Pastes and liquids are not dried.',
    symbols: [
      ['m_dry', 'everything but water', 'g'],
      ['f', 'release moisture, mass fraction', '1'],
      ['k', 'whole bars of what is poured', '1'],
    ],
    range: 'Bars that are wetter than the release moisture. A drier one stays as it is.',
    ignores:
      'Water boiled off in the cook, carbonation, glycerol that draws water from damp air, trimmings.',
    source:
      'Mass balance; total fatty matter as in ISO 685, grades of IS 2888:2004 (both from memory).',
  },
  {
    id: 'days',
    title: 'Days of cutting and release',
    text: 'The lower ends of the targets “unmould” and “cure”, both counted from the making, which is day 0. A part of a day counts whole, and no release comes before the cutting.',
    symbols: [
      ['D', 'first day', 'd'],
      ['t', 'lower end of the target', 'h'],
    ],
    range: 'Formulas that state the target.',
    ignores: 'How the soap really is. The tests for release decide.',
    source: 'Procedure of this handbook; the targets are the shop’s own.',
  },
  {
    id: 'dilution',
    title: 'Dilution of a paste',
    text: 'A cook boils off water that no calculation knows, while the soap stays. So the content of the paste is the soap of the mass balance over the paste as weighed, and theory stands beside it. What the formula adds at dilution is part of the added mass.',
    symbols: [
      ['m_soap', 'dry soap of the mass balance', 'g'],
      ['m_paste', 'paste as weighed', 'g'],
      ['c_0', 'soap content of the paste', '1'],
      ['c_1', 'soap content wanted', '1'],
      ['m_add', 'water to add', 'g'],
    ],
    range: 'Contents wanted below that of the paste.',
    ignores:
      'Soap that stays in the pot, and whether the liquid stays clear at that content. That is found by a trial.',
    source: 'Mass balance.',
  },
  {
    id: 'release',
    title: 'Release limit: the floor of the superfat',
    text: 'The shop sets a floor for one end of one superfat interval, per kind and process. The formula’s interval and those of all its sizes, scale counted, are held against it; the lowest decides. Below the floor nothing is published without a concession in writing.',
    symbols: [
      ['s_low', 'lower end that the limit names', '1'],
      ['s_floor', 'floor of the shop', '1'],
    ],
    range: 'As for the superfat margin.',
    ignores: 'Everything that a release test finds. It is a limit for publishing, not a release.',
    source: 'Procedure of this handbook; concession as in ISO 9000 (from memory).',
  },
] as const satisfies readonly MethodText[];
