import { describe, expect, test } from 'vitest';
import { lyeHeat } from '../../src/chemistry/lye-heat.ts';
import { celsius, type Fraction, fraction, grams } from '../../src/chemistry/quantity.ts';
import { reckon } from '../../src/chemistry/reckon.ts';
import { alkali, formulation } from '../support/materials.ts';
import { givenValue } from '../support/outcome.ts';
import { packagedReference } from './packaged-data.ts';

const { constants, tables } = packagedReference();

/** Lye of pure sodium hydroxide in so many moles of water, from 25 degC. */
function lye(waterPerHydroxide: number, holdBack: Fraction = fraction(0)) {
  const water = (waterPerHydroxide * constants.water) / constants.hydroxide.Na;
  const charge = givenValue(
    reckon(
      formulation({
        alkali: [{ supply: alkali('Na', 1), share: fraction(1) }],
        water: { form: 'per-alkali', value: water },
        holdBack,
      }),
      grams(1000),
      constants,
    ),
  );
  return lyeHeat(charge, celsius(25), tables.lyeHeat, constants);
}
/** One mole of hydroxide and so many of water. [g] */
const massOf = (waterPerHydroxide: number) =>
  constants.hydroxide.Na + waterPerHydroxide * constants.water;

describe('the heat that the temperature accounts for is the published one', () => {
  // Felder and Rousseau, Table B.11: -34.43 kJ/mol at 4 mol of water, read in a published solution of problem
  // 8.83. Heat capacity at 35.69 %: 3.429 J/(g K), between the 3.52 and 3.20 that the CRC Handbook (from
  // memory) has at 30 and 50 %.
  test('4 mol of water', () => {
    const { coolest, peak } = givenValue(lye(4));
    expect(((coolest - 25) * massOf(4) * 3.429) / 1000).toBeCloseTo(34.43, 1);
    // the hotter set: 44.51 (Parker 1965, from memory) is 1.62 above the 42.89 of the table
    expect(((peak - 25) * massOf(4) * 3.429) / 1000).toBeCloseTo(34.43 + 1.62, 1);
  });

  // Formation enthalpies, CRC Handbook: -240.1 - 230.0 + 425.8 = -44.3 kJ/mol at infinite dilution. At 200 mol
  // of water the cooler set must lie below and the hotter near it; 4.126 J/(g K) is the heat capacity at 1.1 %,
  // between water's 4.179 and 3.938 at 5 % by Laliberté.
  test('200 mol of water, against the formation enthalpies', () => {
    const { coolest, peak } = givenValue(lye(200));
    const heat = (temperature: number) => ((temperature - 25) * massOf(200) * 4.126) / 1000;
    expect(heat(coolest)).toBeLessThan(44.3);
    expect(Math.abs(heat(peak) - 44.3)).toBeLessThan(0.6);
  });
});

test('the hotter set is the peak everywhere between 3 and 500 mol of water', () => {
  for (const moles of [3, 3.5, 4, 5, 6, 8, 10, 20, 50, 100, 500]) {
    const { coolest, peak } = givenValue(lye(moles));
    expect(peak).toBeGreaterThan(coolest);
  }
});

test('water held back: the pot is that of the stronger lye', () => {
  expect(givenValue(lye(6, fraction(1 / 3))).peak).toBeCloseTo(givenValue(lye(4)).peak, 9);
});

test('past the table there is no number', () => {
  expect(lye(2.9)).toMatchObject({ ok: false, breach: { rule: 'lye-heat-out-of-range' } });
});
