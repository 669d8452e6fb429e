/**
 * Official wordings, quoted to the letter. `…` and what stands between strokes is left open by the regulation
 * for the supplier to complete or choose from.
 */
export const STATEMENTS = {
  H290: 'May be corrosive to metals.',
  H302: 'Harmful if swallowed.',
  H314: 'Causes severe skin burns and eye damage.',
  H315: 'Causes skin irritation.',
  H319: 'Causes serious eye irritation.',
  P234: 'Keep only in original packaging.',
  P260: 'Do not breathe dust/fume/gas/mist/vapours/spray.',
  P264: 'Wash … thoroughly after handling.',
  P270: 'Do not eat, drink or smoke when using this product.',
  P280: 'Wear protective gloves/protective clothing/eye protection/face protection.',
  'P301+P330+P331': 'IF SWALLOWED: Rinse mouth. Do NOT induce vomiting.',
  'P303+P361+P353':
    'IF ON SKIN (or hair): Take off immediately all contaminated clothing. Rinse skin with water [or shower].',
  'P304+P340': 'IF INHALED: Remove person to fresh air and keep comfortable for breathing.',
  'P305+P351+P338':
    'IF IN EYES: Rinse cautiously with water for several minutes. Remove contact lenses, if present and easy to do. Continue rinsing.',
  P310: 'Immediately call a POISON CENTER/doctor/…',
  P363: 'Wash contaminated clothing before reuse.',
  P390: 'Absorb spillage to prevent material damage.',
  P405: 'Store locked up.',
  P406: 'Store in a corrosion-resistant/… container with a resistant inner liner.',
  P501: 'Dispose of contents/container to …',
} as const;

export type StatementCode = keyof typeof STATEMENTS;

const BOTH: readonly StatementCode[] = [
  'P234',
  'P260',
  'P264',
  'P280',
  'P301+P330+P331',
  'P303+P361+P353',
  'P304+P340',
  'P305+P351+P338',
  'P310',
  'P363',
  'P390',
  'P405',
  'P406',
  'P501',
];

export interface AlkaliHazard {
  readonly id: string;
  readonly index: string;
  readonly ec: string;
  readonly cas: string;
  readonly harmonised: string;
  readonly signal: string;
  readonly pictograms: string;
  readonly hazards: readonly StatementCode[];
  readonly precautions: readonly StatementCode[];
}

export const hazardWords = {
  alkalis: [
    {
      id: 'sodium-hydroxide',
      index: '011-002-00-6',
      ec: '215-185-5',
      cas: '1310-73-2',
      harmonised: 'Skin Corr. 1A, H314',
      signal: 'Danger',
      pictograms: 'GHS05 (corrosion)',
      hazards: ['H290', 'H314'],
      precautions: BOTH,
    },
    {
      id: 'potassium-hydroxide',
      index: '019-002-00-8',
      ec: '215-181-3',
      cas: '1310-58-3',
      harmonised: 'Acute Tox. 4 (oral), H302; Skin Corr. 1A, H314',
      signal: 'Danger',
      pictograms: 'GHS05 (corrosion) and GHS07 (exclamation mark)',
      hazards: ['H290', 'H302', 'H314'],
      precautions: ['P270', ...BOTH],
    },
  ] as readonly AlkaliHazard[],
  rows: {
    index: 'Index number, CLP Annex VI',
    ec: 'EC number',
    cas: 'CAS number',
    harmonised: 'Harmonised class',
    signal: 'Signal word',
    pictograms: 'Pictogram',
  },
  limitsTitle: 'How weak is still dangerous',
  limits: [
    ['5 % and more', 'Skin Corr. 1A, H314'],
    ['2 % to below 5 %', 'Skin Corr. 1B, H314'],
    ['0.5 % to below 2 %', 'Skin Irrit. 2, H315; Eye Irrit. 2, H319'],
  ],
  limitsColumns: ['Hydroxide in the mixture', 'Class'],
  limitsNote:
    'Specific concentration limits of both hydroxides, CLP Annex VI. Lye of 25 % is five times above the first of them.',
  code: 'Code',
  statement: 'Official wording',
  applies: 'applies',
  source:
    'Wording: Regulation (EC) No 1272/2008 (CLP), English, consolidated text in mhchem/hpstatements, content version 2025-09-01, © European Union, CC BY 4.0; read 2026-12-01.',
  basis:
    'Numbers, class and skin limits of sodium hydroxide: Euro Chlor sheet on its classification and INRS fiche 20, read. Complete entry of potassium hydroxide, the eye limits, the pictograms and which precautionary statements a supplier prints: from memory. H290 is the suppliers’ own addition. The label on your container holds.',
  newer:
    'The United Nations’ newer editions of GHS print P316 in the place of P310 (from memory); labels outside the European Union may carry it.',
} as const;
