import type { Formulation } from '../../src/chemistry/charge.ts';
import { constantsFrom } from '../../src/chemistry/constants.ts';
import { iodineFactors } from '../../src/chemistry/fatty-acids.ts';
import type {
  Additive,
  AlkaliSupply,
  Cation,
  Composition,
  Fat,
  FattyAcid,
  Liquid,
} from '../../src/chemistry/materials.ts';
import { molarMass } from '../../src/chemistry/molar-mass.ts';
import {
  fraction,
  gramsPerMillilitre,
  iodineValue,
  mgKohPerGram,
  molesPerGram,
} from '../../src/chemistry/quantity.ts';

/** CIAAW 2021 abridged standard atomic weights, from memory; the data files hold the same. */
export const WEIGHTS = new Map([
  ['H', 1.008],
  ['C', 12.011],
  ['O', 15.999],
  ['Na', 22.99],
  ['K', 39.098],
  ['I', 126.90447],
]);
export const CONSTANTS = constantsFrom(WEIGHTS);

export function acid(carbons: number, doubleBonds = 0, hydroxyls = 0): FattyAcid {
  const hydrogens = 2 * carbons - 2 * doubleBonds;
  const mass = molarMass(`C${carbons}H${hydrogens}O${2 + hydroxyls}`, WEIGHTS);
  return {
    id: `C${carbons}:${doubleBonds}${hydroxyls ? '-OH' : ''}`,
    carbons,
    doubleBonds,
    hydroxyls,
    molarMass: mass,
    iodineFactor: iodineFactors(mass, doubleBonds, CONSTANTS),
  };
}

export const composition = (...parts: readonly (readonly [FattyAcid, number])[]): Composition => {
  const sum = parts.reduce((total, [, share]) => total + share, 0);
  return parts.map(([acid, share]) => ({ acid, share: fraction(share / sum) }));
};

export interface FatWish {
  readonly value: number;
  readonly low?: number;
  readonly high?: number;
  readonly kind?: Fat['kind'];
  readonly acidValue?: number;
  readonly unsaponifiable?: number;
  readonly composition?: Composition | null;
  readonly density?: number | null;
}

/** A fat made for a test; what is not wished for is plain. */
export function fat(id: string, wish: FatWish): Fat {
  const { value, low = value, high = value, acidValue = 0 } = wish;
  return {
    id,
    kind: wish.kind ?? 'glyceride',
    saponificationValue: {
      value: mgKohPerGram(value),
      low: mgKohPerGram(low),
      high: mgKohPerGram(high),
    },
    acidValue: {
      value: mgKohPerGram(acidValue),
      low: mgKohPerGram(acidValue),
      high: mgKohPerGram(acidValue),
    },
    unsaponifiable: fraction(wish.unsaponifiable ?? 0),
    composition: wish.composition ?? null,
    iodineValue: wish.kind === 'wax' ? iodineValue(80) : null,
    density: wish.density === undefined ? gramsPerMillilitre(0.91) : (wish.density as never),
  };
}

export function alkali(
  cation: Cation,
  assay: number,
  wish: Partial<{ low: number; high: number; form: AlkaliSupply['form']; carbonate: number }> = {},
): AlkaliSupply {
  return {
    id: cation === 'Na' ? 'sodium-hydroxide' : 'potassium-hydroxide',
    cation,
    form: wish.form ?? 'solid',
    assay: {
      value: fraction(assay),
      low: fraction(wish.low ?? assay),
      high: fraction(wish.high ?? assay),
    },
    carbonate: fraction(wish.carbonate ?? 0),
    remainder: cation === 'K' || wish.form === 'solution' ? 'water' : 'inert',
  };
}

/** Three protons; one crystal water. */
export const CITRIC_MONOHYDRATE: Additive = {
  id: 'citric-acid-monohydrate',
  water: fraction(CONSTANTS.water / molarMass('C6H10O8', WEIGHTS)),
  acidity: molesPerGram(3 / molarMass('C6H10O8', WEIGHTS)),
};

export const SALT: Additive = { id: 'salt', water: fraction(0), acidity: molesPerGram(0) };

export const MILK: Liquid = {
  id: 'milk',
  water: fraction(0.87),
  fat: fraction(0.04),
  sugar: fraction(0.045),
  acidity: molesPerGram(0),
  fatData: fat('milk-fat', { value: 226, low: 218, high: 235, unsaponifiable: 0.004 }),
};

/** A plain cold-process formulation to vary. */
export function formulation(wish: Partial<Formulation> = {}): Formulation {
  return {
    process: 'cold',
    fats: [{ fat: fat('olive', { value: 190 }), share: fraction(1) }],
    afterCookFats: [],
    alkali: [{ supply: alkali('Na', 1), share: fraction(1) }],
    basis: 'moles',
    superfat: fraction(0.05),
    water: { form: 'lye-concentration', value: fraction(0.33) },
    holdBack: fraction(0),
    liquids: [],
    additives: [],
    ...wish,
  };
}
