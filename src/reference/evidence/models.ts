import { massBalance } from '../../chemistry/balance.ts';
import { iodineFactors } from '../../chemistry/fatty-acids.ts';
import { interpolate } from '../../chemistry/interpolate.ts';
import type { Cation, FattyAcid } from '../../chemistry/materials.ts';
import { type AtomicWeights, molarMass } from '../../chemistry/molar-mass.ts';
import { fraction, grams } from '../../chemistry/quantity.ts';
import { reckon } from '../../chemistry/reckon.ts';
import { titrate } from '../../chemistry/titration.ts';
import type { Reference } from '../reference.ts';
import type { EvidenceGroup } from './evidence.ts';

/** What a record of `evidence.yaml` gives to its model. */
export interface ModelInput {
  readonly of: string;
  readonly inputs: Readonly<Record<string, number>>;
}

export interface Model {
  readonly group: EvidenceGroup;
  /** `null` where the input names nothing the data know or lies outside the model. */
  readonly compute: (input: ModelInput, context: Context) => number | null;
}

export interface Context {
  readonly reference: Reference;
  readonly weights: AtomicWeights;
}

/** The relative weights of 1908, with which the handbook of that year computed its table. */
const WEIGHTS_OF_1908: AtomicWeights = new Map([
  ['H', 1],
  ['C', 12],
  ['O', 16],
]);

const acidOf = (id: string, { reference }: Context): FattyAcid | null =>
  reference.acids.get(id)?.acid ?? null;

/** How each kind of record is computed. The page and the tests run these and nothing else. */
export const MODELS = {
  'molar-mass': {
    group: 'molar-mass',
    compute: ({ of }, { weights }) => molarMass(of, weights),
  },
  'equivalent-1908': {
    group: 'equivalent-1908',
    compute: ({ of }) => {
      // the glyceride C3H5(OOCR)3 of an acid with this formula, per acid
      const residue = molarMass('C3H8O3', WEIGHTS_OF_1908) - 3 * molarMass('H2O', WEIGHTS_OF_1908);
      return molarMass(of, WEIGHTS_OF_1908) + residue / 3;
    },
  },
  'iodine-factor-glyceride': {
    group: 'iodine-factor',
    compute: ({ of }, context) => {
      const acid = acidOf(of, context);
      return (
        acid &&
        iodineFactors(acid.molarMass, acid.doubleBonds, context.reference.constants).glyceride
      );
    },
  },
  'iodine-factor-acid': {
    group: 'iodine-factor',
    compute: ({ of }, context) => {
      const acid = acidOf(of, context);
      return (
        acid && iodineFactors(acid.molarMass, acid.doubleBonds, context.reference.constants).acid
      );
    },
  },
  'titrated-saponification-value': {
    group: 'titration',
    compute: ({ inputs }) => titrated(inputs),
  },
  'titrated-equivalent': {
    group: 'titration',
    compute: ({ inputs }) => 56100 / titrated(inputs),
  },
  'acid-share': {
    group: 'acid-share',
    compute: ({ of }, { reference }) => {
      const [fat = '', acid = ''] = of.split(' ');
      const composition = reference.fats.get(fat)?.core?.composition;
      if (!composition) return null;
      const part = composition.find((part) => part.acid.id === acid);
      return 100 * (part?.share ?? 0);
    },
  },
  'glycerol-per-ester-value': {
    group: 'glycerol',
    compute: ({ inputs }, context) => glycerolPercent(inputs.esterValue ?? Number.NaN, context),
  },
  'mean-ester-mass': {
    group: 'wax',
    compute: ({ of }, { reference }) => {
      const value = reference.fats.get(of)?.core?.saponificationValue.value;
      return value ? (1000 * reference.constants.hydroxide.K) / value : null;
    },
  },
  'lye-density': {
    group: 'lye-density',
    compute: ({ of, inputs }, { reference }) =>
      interpolate(reference.tables.lyeDensity[of as Cation], inputs.percent ?? Number.NaN),
  },
  'heat-at-infinite-dilution': {
    group: 'lye-heat',
    compute: ({ of }, { reference }) => {
      const { heatOfSolution, newerSetAdds } = reference.tables.lyeHeat[of as Cation];
      const last = heatOfSolution.at(-1);
      return last ? last[1] + newerSetAdds : null;
    },
  },
  'heat-of-solution': {
    group: 'lye-heat',
    compute: ({ of, inputs }, { reference }) =>
      interpolate(
        reference.tables.lyeHeat[of as Cation].heatOfSolution,
        inputs.waterPerHydroxide ?? Number.NaN,
      ),
  },
} as const satisfies Readonly<Record<string, Model>>;

export type ModelId = keyof typeof MODELS;

const titrated = (inputs: Readonly<Record<string, number>>) =>
  titrate({
    blank: inputs.blank ?? Number.NaN,
    sample: inputs.sample ?? Number.NaN,
    mass: inputs.mass ?? Number.NaN,
    normality: inputs.normality ?? Number.NaN,
    uncertainty: { volume: 0, mass: 0, normality: 0 },
  }).value;

/** Glycerol from 100 g of a neutral fat of one ester value, wholly saponified by the core. [g] */
function glycerolPercent(esterValue: number, { reference }: Context): number | null {
  const olive = reference.fats.get('olive')?.core;
  const supply = reference.alkalis.get('sodium-hydroxide')?.trade;
  if (!olive || !supply) return null;
  const value = { value: esterValue, low: esterValue, high: esterValue } as never;
  const charge = reckon(
    {
      process: 'cold',
      fats: [{ fat: { ...olive, saponificationValue: value }, share: fraction(1) }],
      afterCookFats: [],
      alkali: [{ supply, share: fraction(1) }],
      basis: 'moles',
      superfat: fraction(0),
      water: { form: 'per-alkali', value: 2 },
      holdBack: fraction(0),
      liquids: [],
      additives: [],
    },
    grams(100),
    reference.constants,
  );
  return charge.ok ? massBalance(charge.value, reference.constants).glycerol : null;
}
