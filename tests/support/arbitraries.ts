import fc from 'fast-check';
import type { Formulation } from '../../src/chemistry/charge.ts';
import { fraction, molesPerGram } from '../../src/chemistry/quantity.ts';
import {
  acid,
  alkali,
  CITRIC_MONOHYDRATE,
  composition,
  fat,
  formulation,
  MILK,
  SALT,
} from './materials.ts';

const number = (min: number, max: number) =>
  fc.double({ min, max, noNaN: true, noDefaultInfinity: true });

const anyComposition = fc
  .array(
    fc.tuple(
      fc.constantFrom(
        acid(12),
        acid(14),
        acid(16),
        acid(18),
        acid(18, 1),
        acid(18, 2),
        acid(18, 1, 1),
      ),
      number(1, 60),
    ),
    { minLength: 1, maxLength: 5 },
  )
  .map((parts) => composition(...parts));

const anyGlyceride = fc
  .tuple(number(170, 270), number(0, 12), number(0, 0.1), anyComposition)
  .map(([value, half, unsaponifiable, composition]) =>
    fat('any', { value, low: value - half, high: value + half, unsaponifiable, composition }),
  );

const anyFat = fc.oneof(
  { weight: 5, arbitrary: anyGlyceride },
  {
    weight: 1,
    arbitrary: number(195, 215).map((value) =>
      fat('stearic', {
        value,
        kind: 'free-acid',
        composition: composition([acid(18), 1], [acid(16), 1]),
      }),
    ),
  },
  {
    weight: 1,
    arbitrary: number(80, 110).map((value) =>
      fat('jojoba', {
        value,
        kind: 'wax',
        acidValue: 1,
        composition: composition([acid(20, 1), 3], [acid(22, 1), 1]),
      }),
    ),
  },
);

const anyAlkali = fc
  .tuple(
    number(0.85, 1),
    number(0.85, 1),
    number(0, 1),
    fc.constantFrom('moles' as const, 'mass' as const),
  )
  .map(
    ([na, k, share, basis]): Pick<Formulation, 'alkali' | 'basis'> => ({
      basis,
      alkali: [
        { supply: alkali('Na', na, { carbonate: (1 - na) / 3 }), share: fraction(share) },
        { supply: alkali('K', k, { carbonate: (1 - k) / 4 }), share: fraction(1 - share) },
      ].filter(({ share }) => share > 0),
    }),
  );

const anyWater: fc.Arbitrary<Formulation['water']> = fc.oneof(
  number(0.25, 0.45).map((x) => ({ form: 'lye-concentration' as const, value: fraction(x) })),
  number(1.2, 4).map((value) => ({ form: 'per-alkali' as const, value })),
  number(0.2, 0.6).map((x) => ({ form: 'percent-of-fats' as const, value: fraction(x) })),
);

/** Any formulation that the core must be able to reckon. */
export const anyFormulation: fc.Arbitrary<Formulation> = fc
  .record({
    fats: fc.array(fc.tuple(anyFat, number(1, 100)), { minLength: 1, maxLength: 7 }),
    superfat: number(0, 0.2),
    alkali: anyAlkali,
    water: anyWater,
    holdBack: number(0, 0.5),
    milk: number(0, 0.8),
    milkStage: fc.constantFrom('lye' as const, 'trace' as const),
    citric: number(0, 0.03),
    citricStage: fc.constantFrom('lye' as const, 'dilution' as const),
    salt: number(0, 0.5),
    afterCook: number(0, 0.05),
    process: fc.constantFrom('cold' as const, 'hot' as const),
  })
  .map((wish) => {
    const sum = wish.fats.reduce((total, [, weight]) => total + weight, 0);
    return formulation({
      process: wish.process,
      fats: wish.fats.map(([fat, weight]) => ({ fat, share: fraction(weight / sum) })),
      superfat: fraction(wish.superfat),
      ...wish.alkali,
      water: wish.water,
      holdBack: fraction(wish.holdBack),
      liquids: [
        {
          liquid: { ...MILK, acidity: molesPerGram(2e-5) },
          replacesWater: fraction(wish.milk),
          at: wish.milkStage,
        },
      ],
      additives: [
        { additive: CITRIC_MONOHYDRATE, perFats: fraction(wish.citric), at: wish.citricStage },
        { additive: SALT, perFats: fraction(wish.salt), at: 'trace' },
      ],
      afterCookFats:
        wish.process === 'hot'
          ? [{ fat: fat('sunflower', { value: 191 }), perFats: fraction(wish.afterCook) }]
          : [],
    });
  });
