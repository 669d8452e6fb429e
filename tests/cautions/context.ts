import { grams } from '../../src/chemistry/quantity.ts';
import { computeFormula } from '../../src/formulary/compute.ts';
import type { FormulaDocument } from '../../src/formulary/document.ts';
import type { Formula } from '../../src/formulary/formula.ts';
import type { ComputedFormula } from '../../src/formulary/formulary.ts';
import type { AlkaliLot } from '../../src/reference/lot-records.ts';
import { readReference } from '../../src/reference/read-reference-fs.ts';
import type { Reference } from '../../src/reference/reference.ts';
import type { BatchSize } from '../../src/reference/shop-records.ts';

const read = readReference(['data']);
if (!read.reference) throw new Error(JSON.stringify(read.problems, null, 2));

/** An invented lot of alkali; what a test does not wish for is plain. */
export const alkaliLot = (wish: Partial<AlkaliLot> = {}): AlkaliLot => ({
  alkali: 'sodium-hydroxide',
  lot: 'T-1',
  form: 'solid',
  assay: 98.5,
  uncertainty: 0.3,
  carbonate: 0.4,
  status: 'released',
  opened: null,
  retestBy: '2027-03-01',
  place: { file: 'data/lots.yaml', line: 1, column: 1 },
  ...wish,
});

/** An invented batch size of 1 kg of fats. */
export const batchSize = (wish: Partial<BatchSize> = {}): BatchSize => ({
  id: 'one',
  label: 'One kilogram',
  size: { by: 'fats', mass: grams(1000) },
  losses: 0,
  scale: 'bench',
  fineScale: null,
  kinds: ['bar', 'paste', 'liquid'],
  ...wish,
});

/** The data as they are, with lots and shop of the test's own, so that a new lot in the demo moves nothing. */
export const REFERENCE: Reference = {
  ...read.reference,
  lots: {
    fats: [],
    alkalis: [
      alkaliLot(),
      alkaliLot({ alkali: 'potassium-hydroxide', lot: 'T-2', assay: 89.5, carbonate: 0.6 }),
    ],
  },
  shop: {
    ...read.reference.shop,
    startTemperature: 22,
    batches: [batchSize()],
    scales: [
      { id: 'bench', name: 'Bench', step: grams(0.1), error: grams(0.1), capacity: grams(1e5) },
    ],
  },
};

const PLAIN: Formula = {
  file: 'formulas/test.md',
  code: 'TT-001',
  name: 'Plain',
  kind: 'bar',
  process: 'cold',
  revision: 1,
  summary: null,
  fats: [
    { fat: 'olive', share: 45 },
    { fat: 'palm', share: 30 },
    { fat: 'coconut', share: 25 },
  ],
  afterCookFats: [],
  alkali: { sodium: 100, potassium: 0, basis: 'moles' },
  superfat: 6,
  water: { form: 'lye-concentration', value: 30, holdBack: 0 },
  liquids: [],
  additives: [],
  rework: null,
  targets: {},
  release: { freeAlkali: null, ph: null, moisture: null },
  batches: null,
  tags: [],
  changes: [],
  approval: null,
  concession: null,
  withdrawn: null,
  method: { type: 'root', children: [] },
  methodText: '',
  places: new Map(),
};

export interface Wish {
  readonly formula?: Partial<Formula>;
  /** Changes to the computed document, for what no formula reaches exactly. */
  readonly document?: (document: FormulaDocument) => FormulaDocument;
  readonly reference?: (reference: Reference) => Reference;
  readonly asOf?: string;
}

/** A formula computed by the real code and data, to vary. */
export function computedWith(wish: Wish): {
  readonly computed: ComputedFormula;
  readonly reference: Reference;
} {
  const reference = wish.reference ? wish.reference(REFERENCE) : REFERENCE;
  const { computed, problems } = computeFormula({ ...PLAIN, ...wish.formula }, reference);
  if (!computed) throw new Error(JSON.stringify(problems));
  const document = wish.document ? wish.document(computed.document) : computed.document;
  return { computed: { ...computed, document }, reference };
}
