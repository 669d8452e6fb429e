import type { MethodText } from './methods.ts';

/** Models about what goes in: which value is used, free acids, waxes, lots, blends. */
export const materialMethods = [
  {
    id: 'choice',
    title: 'Which value is used',
    text: 'Sources stay apart. They stand in an order by kind: standard, pharmacopoeia, regulation, handbook, paper, supplier, practice; within a kind, what was read stands before what is known from memory. The first range with both ends is used, and what a few samples spanned counts only where there is no other. The value is the lower of the middle and the lowest documented mean of measured samples, but never below the range: the reading that leaves less free alkali.',
    symbols: [
      ['S_low, S_high', 'ends of the range used', 'mg KOH/g'],
      ['S_mean', 'lowest documented mean of measured samples, where there is one', 'mg KOH/g'],
    ],
    range: 'Fats of which at least one source gives a range with both ends.',
    ignores:
      'Every other source. They are shown on the fat’s page and, where they disagree, on the page of contradictions.',
    source: 'Procedure of this handbook.',
  },
  {
    id: 'lots',
    title: 'Measured lots',
    text: 'A released lot’s own value takes the place of the published range, with its stated interval at a coverage factor of 2. Its free acidity adds no alkali, because a saponification value counts the free acids already. The assay of an alkali lot is hydroxide alone. A certificate of total alkali counts carbonate as hydroxide and is corrected by the equation before it is written into the lot.',
    symbols: [
      ['a', 'assay as hydroxide alone, mass fraction', '1'],
      ['t', 'total alkali of the certificate, as hydroxide', '1'],
      ['w', 'carbonate, mass fraction', '1'],
    ],
    range:
      'Released lots within their retest date. One that lies far outside the published range is refused as a slip.',
    ignores: 'What the lot takes up from the air after it was measured.',
    source: 'Stoichiometry.',
  },
  {
    id: 'titration',
    title: 'Saponification value by titration',
    text: 'A weighed sample of the fat is boiled with an excess of alkali and the rest titrated back with acid. A blank without fat says how much acid the alkali alone takes.',
    symbols: [
      ['V_0, V_1', 'acid for the blank and for the sample', 'mL'],
      ['c', 'concentration of the acid', 'mol/L'],
      ['m', 'mass of the fat', 'g'],
      ['u', 'standard uncertainty of each reading, both volumes alike', 'its own'],
    ],
    range: 'A blank above the sample, and readings above zero.',
    ignores:
      'Carbonate in the alkali as far as the blank does not cancel it, and a fat not boiled long enough.',
    source:
      'ISO 3657 (formula and the factor 56.1 from memory); a printed example of 1908 is among the evidence.',
  },
  {
    id: 'free-acids',
    title: 'Free fatty acids as a raw material',
    text: 'An acid bought as such is reckoned by its acid value. It reacts before any glyceride, gives soap and water, and gives no glycerol. Its iodine value takes the factors of free acids.',
    symbols: [
      ['n_acids', 'equivalents of the free acids', 'mol'],
      ['n_esters', 'equivalents of glycerides that were saponified', 'mol'],
      ['n_glycerol', 'glycerol set free', 'mol'],
    ],
    range: 'Acids with an acid value and its range in the reference data.',
    ignores:
      'Glycerides left in commercial acids. Free acid inside a natural fat is not taken apart: its glycerol is overstated by that part.',
    source: 'Stoichiometry; commercial grades as suppliers state them (from memory).',
  },
  {
    id: 'waxes',
    title: 'Waxes',
    text: 'The esters of a wax give soap and fatty alcohols and no glycerol. They count with their full saponification value, so that no alkali is left over if they react; but in cold process they may hardly react at all. Every lower end of the superfat therefore counts only what a wax’s free acid is sure to take up.',
    symbols: [
      ['e_high', 'equivalents per gram for the alkali and for upper ends', 'mol/g'],
      ['e_sure', 'equivalents per gram for lower ends in cold process', 'mol/g'],
      ['A', 'acid value', 'mg KOH/g'],
    ],
    range: 'Waxes with a saponification value and an acid value; iodine value as tabulated.',
    ignores: 'How far the esters really react, which depends on time and heat.',
    source: 'Stoichiometry; that wax esters react slowly is common practice, no source.',
  },
  {
    id: 'blends',
    title: 'Blends that stand ready',
    text: 'A blend of fats counts as its parts and is weighed as one. Its superfat margin counts a fat that is in the blend and beside it as one fat, because it has one saponification value.',
    symbols: [
      ['x_j', 'share of fat j in the blend', '1'],
      ['m_b', 'mass of the blend', 'g'],
    ],
    range: 'Blends whose shares sum to 100 %.',
    ignores: 'A blend that has settled or was mixed badly.',
    source: 'Definition.',
  },
] as const satisfies readonly MethodText[];
