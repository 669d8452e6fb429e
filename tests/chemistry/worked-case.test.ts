import { describe, expect, test } from 'vitest';
import { fraction, grams } from '../../src/chemistry/quantity.ts';
import { reckon } from '../../src/chemistry/reckon.ts';
import {
  AS_USED,
  equivalentsOf,
  superfatFrom,
  superfatIfAcidForgotten,
} from '../../src/chemistry/superfat.ts';
import { alkali, CITRIC_MONOHYDRATE, CONSTANTS, fat, formulation } from '../support/materials.ts';
import { givenValue } from '../support/outcome.ts';

/** A case reckoned by hand: olive 700 g at 190, coconut 300 g at 257, 20 g of citric acid, 5 %. */
describe('the worked case', () => {
  const charge = givenValue(
    reckon(
      formulation({
        fats: [
          { fat: fat('olive', { value: 190 }), share: fraction(0.7) },
          { fat: fat('coconut', { value: 257 }), share: fraction(0.3) },
        ],
        alkali: [{ supply: alkali('Na', 0.985), share: fraction(1) }],
        additives: [{ additive: CITRIC_MONOHYDRATE, perFats: fraction(0.02), at: 'lye' }],
      }),
      grams(1000),
      CONSTANTS,
    ),
  );
  const equivalents = equivalentsOf(charge, AS_USED, CONSTANTS);

  test('has E = 3.7447, acid 0.2855, hydroxide 3.8430 mol', () => {
    // the case was reckoned with M(KOH) 56.1053, which moves the fifth digit
    expect(Math.abs(equivalents.saponifiable - 3.7447)).toBeLessThan(1e-4);
    expect(equivalents.acid).toBeCloseTo(0.2855, 4);
    expect(Math.abs(equivalents.hydroxide - 3.843)).toBeLessThan(1e-4);
  });

  test('weighs 156.0 g of 98.5 % sodium hydroxide', () => {
    expect(charge.alkali[0]?.weighedMass).toBeCloseTo(156.05, 1);
  });

  test('comes back to 5 %, and to -2.6 % with the acid forgotten', () => {
    expect(superfatFrom(equivalents)).toBeCloseTo(0.05, 12);
    expect(superfatIfAcidForgotten(equivalents)).toBeCloseTo(-0.026, 3);
  });
});
