import { describe, expect, test } from 'vitest';
import { constantsFrom } from '../../src/chemistry/constants.ts';
import {
  glycerideIodineValue,
  glycerideSaponificationValue,
  iodineFactors,
  meanMolarMass,
} from '../../src/chemistry/fatty-acids.ts';
import { molarMass } from '../../src/chemistry/molar-mass.ts';
import { titrate } from '../../src/chemistry/titration.ts';
import { acid, CITRIC_MONOHYDRATE, CONSTANTS, composition, WEIGHTS } from '../support/materials.ts';

describe('pure triglycerides', () => {
  /** The weights of 1908; Na, K and I play no part in an equivalent. */
  const OLD = constantsFrom(new Map([...WEIGHTS, ['H', 1], ['C', 12], ['O', 16]]));

  // Simmons and Appleton, The Handbook of Soap Manufacture, 1908, ch. II, saponification equivalents
  test.each([
    ['butyrin', 4, 0, 0, 100.7],
    ['isovalerin', 5, 0, 0, 114.7],
    ['caproin', 6, 0, 0, 128.7],
    ['caprylin', 8, 0, 0, 156.7],
    ['caprin', 10, 0, 0, 184.7],
    ['laurin', 12, 0, 0, 212.7],
    ['myristin', 14, 0, 0, 240.7],
    ['palmitin', 16, 0, 0, 268.7],
    ['stearin', 18, 0, 0, 296.7],
    ['olein', 18, 1, 0, 294.7],
    ['ricinolein', 18, 1, 1, 310.7],
  ])('%s has the equivalent printed in 1908, by the weights of 1908', (_, c, d, oh, printed) => {
    const old = new Map([
      ['H', 1],
      ['C', 12],
      ['O', 16],
    ]);
    const mass = molarMass(`C${c}H${2 * c - 2 * d}O${2 + oh}`, old);
    const equivalent = (3 * mass + OLD.glycerylResidue) / 3;
    expect(equivalent).toBeCloseTo(printed, 0);
    expect(Math.abs(equivalent - printed)).toBeLessThan(0.05);
  });

  test.each([12, 14, 16, 18])('C%i:0 obeys stoichiometry', (carbons) => {
    const pure = composition([acid(carbons), 1]);
    // three molecules of KOH to one C(3n+3)H(6n+2)O6
    const triglyceride = molarMass(`C${3 * carbons + 3}H${6 * carbons + 2}O6`, WEIGHTS);
    expect(glycerideSaponificationValue(pure, CONSTANTS)).toBeCloseTo(
      (3000 * CONSTANTS.hydroxide.K) / triglyceride,
      9,
    );
  });

  test('the number average is used: a lauric oil is not understated', () => {
    const mixed = composition([acid(8), 7], [acid(12), 48], [acid(18, 1), 7], [acid(18), 3]);
    const massAverage = mixed.reduce((sum, { acid, share }) => sum + acid.molarMass * share, 0);
    expect(meanMolarMass(mixed)).toBeLessThan(massAverage - 4);
  });
});

describe('iodine factors', () => {
  // AOCS Cd 1c-85 (reapproved 2009): triglycerides, free fatty acids
  test.each([
    [16, 1, 0.95, 0.9976],
    [18, 1, 0.86, 0.8986],
    [18, 2, 1.732, 1.81],
    [18, 3, 2.616, 2.735],
    [20, 1, 0.785, 0.8175],
    [22, 1, 0.723, 0.7497],
  ])('C%i:%i from first principles is the AOCS factor', (carbons, doubleBonds, glyceride, free) => {
    const { molarMass } = acid(carbons, doubleBonds);
    const factors = iodineFactors(molarMass, doubleBonds, CONSTANTS);
    expect(factors.glyceride / glyceride).toBeCloseTo(1, 2.5);
    expect(factors.acid / free).toBeCloseTo(1, 2.5);
  });

  test('triolein has IV 86.0, a half-and-half blend with tristearin 43.0', () => {
    expect(glycerideIodineValue(composition([acid(18, 1), 1]))).toBeCloseTo(86, 1);
    expect(glycerideIodineValue(composition([acid(18, 1), 1], [acid(18), 1]))).toBeCloseTo(43, 0);
  });
});

describe('titration', () => {
  // Simmons and Appleton 1908, ch. X: 25.6 and 18.95 mL of N acid, 1.8976 g: equivalent 285.3, SV 196.6
  const read = { blank: 25.6, sample: 18.95, mass: 1.8976, normality: 1 };
  const sure = { volume: 0, mass: 0, normality: 0 };

  test('gives the printed saponification value', () => {
    expect(titrate({ ...read, uncertainty: sure }).value).toBeCloseTo(196.6, 1);
    expect(56100 / titrate({ ...read, uncertainty: sure }).value).toBeCloseTo(285.35, 1);
  });

  test('carries the uncertainty of its readings to first order', () => {
    const { value, low, high } = titrate({
      ...read,
      uncertainty: { volume: 0.05, mass: 0.001, normality: 0.002 },
    });
    // by hand: sqrt(2) x 0.05 / 6.65 = 1.063 %, 0.001 / 1.8976 = 0.053 %, 0.2 %: together 1.083 %
    expect(high - value).toBeCloseTo(0.01083 * 196.6, 1);
    expect(value - low).toBeCloseTo(high - value, 9);
  });

  test('refuses readings that cannot be', () => {
    expect(() => titrate({ ...read, sample: 26, uncertainty: sure })).toThrow(RangeError);
    expect(() => titrate({ ...read, mass: 0, uncertainty: sure })).toThrow(RangeError);
  });
});

describe('acids that consume alkali', () => {
  test('citric acid monohydrate takes 0.57101 g NaOH and 0.80098 g KOH per gram', () => {
    // stoichiometry, 3 mol per mol of 210.138 g
    expect(CITRIC_MONOHYDRATE.acidity * CONSTANTS.hydroxide.Na).toBeCloseTo(0.57101, 4);
    expect(CITRIC_MONOHYDRATE.acidity * CONSTANTS.hydroxide.K).toBeCloseTo(0.80098, 4);
  });
});
