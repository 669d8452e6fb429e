import { batchMethods } from './methods-batch.ts';
import { materialMethods } from './methods-materials.ts';

/** One model in words: symbols as [symbol, meaning, unit]. Its equations stand in `src/handbook/equations.ts`. */
export interface MethodText {
  readonly id: string;
  readonly title: string;
  readonly text: string;
  readonly symbols: readonly (readonly [string, string, string])[];
  readonly range: string;
  readonly ignores: string;
  readonly source: string;
}

const basicMethods = [
  {
    id: 'molar-mass',
    title: 'Molar masses',
    text: 'Every molar mass is summed from the standard atomic weights of its elements. None is typed in as a product.',
    symbols: [
      ['n_k', 'atoms of element k in the formula', '1'],
      ['A_k', 'standard atomic weight, abridged', 'g/mol'],
    ],
    range: 'The elements in the reference data.',
    ignores: 'Natural variation of isotopes; it is below the fifth digit here.',
    source:
      'IUPAC Commission on Isotopic Abundances and Atomic Weights, abridged values 2021 (from memory).',
  },
  {
    id: 'equivalents',
    title: 'Saponifiable equivalents',
    text: 'A saponification value says how much potassium hydroxide one gram of a fat takes up. Divided by the molar mass of potassium hydroxide it is an amount of hydroxide, whichever alkali is used. The value is a lot’s measured one where the shop has it; otherwise it comes from the first source in the declared order, as the lower of the middle of its range and any documented mean of measured samples. Free acidity measured on a lot adds nothing, because a saponification value counts the free acids already; of a free acid the acid value is the saponification value. A blend that stands ready counts as its parts.',
    symbols: [
      ['S_i', 'saponification value of fat i', 'mg KOH/g'],
      ['m_i', 'mass of fat i', 'g'],
      ['e_i', 'equivalents per gram of fat i', 'mol/g'],
      ['E', 'equivalents of all fats, with the fat in liquids', 'mol'],
    ],
    range: 'Fats with a saponification value and its range in the reference data.',
    ignores:
      'After-cook fats, which are not counted in the alkali. What a blend’s own mixing errs by; that free acids of a glyceride give no glycerol.',
    source: 'Definition of the saponification value: ISO 3657 (formula from memory).',
  },
  {
    id: 'alkali',
    title: 'Alkali and superfat',
    text: 'The alkali leaves the part s of the equivalents unsaponified and neutralises the acids that are there before saponification. The same equation, turned round, gives the superfat of any set of weights, rounded ones included. The weighed mass is the pure mass over the assay, and assay means hydroxide alone. An alkali sold with a floor is reckoned at the top of its trade range unless a lot has a certificate: the reading that leaves less free alkali.',
    symbols: [
      ['n_OH', 'amount of hydroxide', 'mol'],
      ['s', 'superfat', '1'],
      ['n_acid', 'acid protons neutralised before saponification', 'mol'],
      ['a', 'assay: pure hydroxide per mass as weighed', '1'],
    ],
    range: 'Superfat 0 to 25 %.',
    ignores: 'Moisture and carbon dioxide taken up after the assay was made; keep alkali closed.',
    source: 'Stoichiometry.',
  },
  {
    id: 'acids',
    title: 'Acids that take up alkali',
    text: 'Only acids present before saponification get alkali of their own. At the pH of soap citric acid gives up all three protons, lactic and acetic acid one. An acid added later consumes soap and gets none. Where alkali makes up for an acid, the page shows the superfat if that acid is forgotten.',
    symbols: [
      ['z_j', 'protons that acid j gives up in soap', '1'],
      ['m_j', 'mass of the pure acid', 'g'],
      ['M_j', 'molar mass', 'g/mol'],
    ],
    range: 'Acids whose strength is in the reference data.',
    ignores: 'Esters in concentrated lactic acid, which take up alkali slowly.',
    source: 'Stoichiometry; dissociation constants of citric acid at 25 °C (from memory).',
  },
  {
    id: 'mixed-lye',
    title: 'Mixed lye',
    text: 'Shares of sodium and potassium hydroxide are by amount (first equation) or by pure mass (second). The file has to say which, because the two differ by up to about eight points.',
    symbols: [
      ['x_Na', 'share of sodium hydroxide by amount', '1'],
      ['y_Na, y_K', 'shares by pure mass', '1'],
    ],
    range: 'Any mixture of the two.',
    ignores:
      'Carbonate in the alkali: with free fatty acids (stearic acid) it neutralises some of them and gives off gas, which leaves a little more hydroxide to the fats. At 0.5 % of carbonate that is about 0.3 percentage points of superfat in a soap rich in free acids; it is in none of the intervals.',
    source: 'Stoichiometry.',
  },
  {
    id: 'water',
    title: 'Water',
    text: 'Water follows from one of three statements: the concentration of the lye, water per alkali, or a percent of the fats. The first two count solid alkali as weighed and stock lye as dissolved hydroxide. Water in liquids and in stock lye counts; the page prints what is left to add.',
    symbols: [
      ['c', 'lye concentration: alkali / (alkali + water)', '1'],
      ['r', 'water per alkali', 'g/g'],
      ['p', 'water per fats', 'g/g'],
    ],
    range: 'A stock weaker than the lye asked for is refused.',
    ignores: 'Water in additives, and what evaporates.',
    source: 'Definitions of this handbook.',
  },
  {
    id: 'margin',
    title: 'Superfat margin',
    text: 'A fat is a range, alkali has an assay, a scale rounds. The expanded interval combines their standard uncertainties to first order with a coverage factor of 2, ranges taken as rectangular, measured lots by their stated interval. It is centred on the superfat that the middles of the ranges give and is cut at the worst case. The worst case sets every fat at its low end, the assay at its top and the scale against us. Of waxes in cold process the lower ends count the free acid alone. A formula’s own margin leaves the scale out; each batch size counts its own.',
    symbols: [
      [
        'q',
        'each range that enters: SV of each fat, assay of each alkali, each weighing',
        'its own',
      ],
      ['u_q', 'standard uncertainty of q', 'its own'],
      ['U', 'half-width of the expanded interval', '1'],
    ],
    range: 'First order: good while the ranges are a few percent of their values.',
    ignores:
      'Correlation between fats, errors beyond the published ranges, the acidity of additives and liquids, moisture and carbon dioxide that the alkali took up after its assay, slips at the scale.',
    source: 'JCGM 100:2008, Guide to the expression of uncertainty in measurement (from memory).',
  },
  {
    id: 'rounding',
    title: 'Rounding to the scale',
    text: 'Fats, liquids and water go to the nearest step of the scale, acids up, alkali down, and the alkali then further down step by step until the superfat recomputed from the rounded weights is not below the one written. Where that moves the superfat by more than the shop allows, the size is too small for the scale and gets a reason in place of weights.',
    symbols: [],
    range: 'The steps and capacities of the shop’s scales.',
    ignores: 'Drift and buoyancy of the scale.',
    source: 'Procedure of this handbook.',
  },
  {
    id: 'profile',
    title: 'Acid profile',
    text: 'Compositions are percent by mass of all fatty acids: the middles of the published ranges, an unstated minimum counted as 0, brought to 100. Each fat enters with the fatty acids it holds. The mean molar mass is the number average; the mass average is a known trap and overstates it, on lauric oils by enough to move a saponification value by about 7 mg KOH/g.',
    symbols: [
      ['w_k', 'mass fraction of acid k among the fatty acids', '1'],
      ['M', 'mean molar mass of the acids', 'g/mol'],
      ['F', 'fatty acids per mass of pure triglyceride', 'g/g'],
    ],
    range: 'Fats whose composition is known. If one is missing there is no profile at all.',
    ignores: 'Partial glycerides, and acids below the tables’ limits.',
    source: 'Stoichiometry; 38.049 g/mol is glycerol less three waters.',
  },
  {
    id: 'saponification-value',
    title: 'Saponification value of the fats',
    text: 'The value of a blend is the mean of its fats by mass. A value computed from a composition checks the tabulated range and never replaces it.',
    symbols: [['f_i', 'mass fraction of fat i', '1']],
    range: 'Computed check: glycerides with little unsaponifiable matter and free acid.',
    ignores: 'Free acids and partial glycerides in the computed check.',
    source: 'AOCS Cd 3a-94 (formula from memory); ISO 3657 for measuring.',
  },
  {
    id: 'iodine-value',
    title: 'Iodine value',
    text: 'Summed over the acids with one factor each, for triglycerides or for free acids as the fat is. Ricinoleic acid is not in the method’s list; its factor follows from its formula.',
    symbols: [
      ['P_k', 'percent of acid k', '%'],
      ['F_k', 'grams of iodine per gram of its glyceride or free acid', 'g/g'],
    ],
    range: 'Not for fish oils. Low by calculation above 0.5 % unsaponifiable matter.',
    ignores: 'Unsaturated matter that is not a fatty acid. Waxes take their tabulated value.',
    source: 'AOCS Cd 1c-85 (reapproved 2009), ISO 3961 Annex B.',
  },
  {
    id: 'oxidisability',
    title: 'Oxidisability',
    text: 'Weighs the unsaturated acids by how fast their methyl esters formed peroxides. The order of the three is certain; published ratios differ, and this handbook uses one set and names it.',
    symbols: [['18:1, 18:2, 18:3', 'percent of oleic, linoleic and linolenic acid', '%']],
    range: 'Compares formulas with one another. It is not a shelf life.',
    ignores: 'Antioxidants, metals, light, water and packaging.',
    source: 'Fatemi and Hammond, Lipids 15 (1980) 379 (coefficients from memory).',
  },
  {
    id: 'bis-allylic',
    title: 'Bis-allylic positions',
    text: 'Counts the places between two double bonds, where oxidation starts most easily.',
    symbols: [['18:2, 18:3', 'percent of linoleic and linolenic acid', '%']],
    range: 'As for oxidisability.',
    ignores: 'As for oxidisability.',
    source: 'Knothe, J. Am. Oil Chem. Soc. 79 (2002) 847 (coefficients from memory).',
  },
  {
    id: 'chain-length',
    title: 'Mean chain length',
    text: 'Carbon atoms per fatty acid, as a number average.',
    symbols: [['C_k', 'carbon atoms of acid k', '1']],
    range: 'Fats whose composition is known.',
    ignores: 'The alcohols of waxes.',
    source: 'Definition.',
  },
  {
    id: 'balance',
    title: 'Mass balance, total fatty matter, glycerol',
    text: 'What goes in comes out, to a part in a thousand million. Glycerides give one mole of glycerol for three of alkali, free acids give water, wax esters give alcohols. Total fatty matter counts the acids in the soap, the unsaponified fat and the unsaponifiable matter. Drying takes water alone, down to the shop’s release moisture.',
    symbols: [
      ['m', 'masses named by their index', 'g'],
      [
        'm_rest',
        'water from all origins, carbonate and other inert matter, additives and their salts',
        'g',
      ],
    ],
    range: 'Complete reaction of the alkali with the fats.',
    ignores: 'Evaporation while making, and reaction that is not finished.',
    source: 'Stoichiometry; total fatty matter as in ISO 685 (from memory).',
  },
  {
    id: 'lye-heat',
    title: 'Temperature of the lye',
    text: 'The temperature that the lye would reach from a stated start if no heat were lost: heat of solution at its dilution and heat of neutralising acids, over its heat capacity. Where data sets differ, the hotter one is shown, with the cooler beside it. Water that is held back is not in the pot: the lye is stronger and hotter, and the page says by how much against all the water.',
    symbols: [
      ['T_0', 'start temperature of water and alkali', '°C'],
      ['q(r)', 'integral heat of solution at r moles of water per mole', 'kJ/mol'],
      ['c', 'heat capacity of the lye', 'kJ/(kg K)'],
    ],
    range:
      'Sodium lye within the tables. No number for potassium lye, mixed lye or stock; take those as boiling hot. The heat of solution at the strength of a lye is known from an older set alone; what a newer set puts on top at infinite dilution is added at every strength.',
    ignores: 'Heat lost to jug and air, so the real lye stays cooler. Ice and frozen liquids.',
    source:
      'Tables in the reference data: Felder and Rousseau, Table B.11, with the limit of Parker 1965 on top; heat capacities by Laliberté 2009 and the CRC Handbook. The value at 4 mol of water was read in print; the other heats are from memory.',
  },
] as const satisfies readonly MethodText[];

/** Every model of this handbook, from the materials to the finished batch. */
export const methodWords = [...basicMethods, ...materialMethods, ...batchMethods] as const;
