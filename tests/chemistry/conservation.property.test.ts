import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { massBalance, massIn } from '../../src/chemistry/balance.ts';
import { acidProfile } from '../../src/chemistry/profile.ts';
import { fraction, grams } from '../../src/chemistry/quantity.ts';
import { reckon } from '../../src/chemistry/reckon.ts';
import { AS_USED, equivalentsOf, superfatFrom } from '../../src/chemistry/superfat.ts';
import { anyFormulation } from '../support/arbitraries.ts';
import { CONSTANTS, formulation } from '../support/materials.ts';
import { givenValue } from '../support/outcome.ts';

const at = (mass: number, wish: Parameters<typeof reckon>[0]) =>
  givenValue(reckon(wish, grams(mass), CONSTANTS));

describe('what nature conserves', () => {
  test('mass in is mass out, to 1e-9 of the batch', () => {
    fc.assert(
      fc.property(anyFormulation, (wish) => {
        const charge = at(1000, wish);
        const balance = massBalance(charge, CONSTANTS);
        expect(Math.abs(balance.total / massIn(charge) - 1)).toBeLessThan(1e-9);
        for (const part of Object.values(balance)) expect(part).toBeGreaterThan(-1e-9);
      }),
    );
  });

  test('mass closes also where alkali is left over', () => {
    fc.assert(
      fc.property(anyFormulation, fc.double({ min: 1.01, max: 1.5, noNaN: true }), (wish, over) => {
        const charge = at(1000, wish);
        const strong = {
          ...charge,
          alkali: charge.alkali.map((line) => ({
            ...line,
            moles: (line.moles * over * 1.3) as never,
            pureMass: grams(line.pureMass * over * 1.3),
            weighedMass: grams(line.weighedMass * over * 1.3),
          })),
        };
        const balance = massBalance(strong, CONSTANTS);
        expect(balance.freeAlkali).toBeGreaterThan(0);
        expect(Math.abs(balance.total / massIn(strong) - 1)).toBeLessThan(1e-9);
      }),
    );
  });

  test('the superfat asked for is the superfat found', () => {
    fc.assert(
      fc.property(anyFormulation, (wish) => {
        const found = superfatFrom(equivalentsOf(at(1000, wish), AS_USED, CONSTANTS));
        expect(found).toBeCloseTo(wish.superfat, 10);
      }),
    );
  });

  test('twice the fats is twice of everything', () => {
    fc.assert(
      fc.property(anyFormulation, (wish) => {
        const one = at(1000, wish);
        const two = at(2000, wish);
        expect(two.water / 2).toBeCloseTo(one.water, 8);
        two.alkali.forEach((line, i) => {
          expect(line.weighedMass / 2).toBeCloseTo(one.alkali[i]?.weighedMass ?? Number.NaN, 8);
        });
        two.liquids.forEach((line, i) => {
          expect(line.mass / 2).toBeCloseTo(one.liquids[i]?.mass ?? Number.NaN, 8);
        });
      }),
    );
  });

  test('the order of the fats changes nothing', () => {
    fc.assert(
      fc.property(anyFormulation, (wish) => {
        const one = at(1000, wish);
        const other = at(1000, { ...wish, fats: wish.fats.toReversed() });
        expect(other.water).toBeCloseTo(one.water, 8);
        expect(other.alkali[0]?.weighedMass).toBeCloseTo(one.alkali[0]?.weighedMass ?? 0, 8);
        const profiles = [one, other].map(({ fats }) => givenValue(acidProfile(fats, CONSTANTS)));
        expect(profiles[1]?.iodineValue).toBeCloseTo(profiles[0]?.iodineValue ?? 0, 8);
        expect(profiles[1]?.saturated).toBeCloseTo(profiles[0]?.saturated ?? 0, 8);
      }),
    );
  });

  test('the acids of a profile sum to one, and so do its classes', () => {
    fc.assert(
      fc.property(anyFormulation, (wish) => {
        const profile = givenValue(acidProfile(at(1000, wish).fats, CONSTANTS));
        const sum = profile.acids.reduce((total, { share }) => total + share, 0);
        expect(sum).toBeCloseTo(1, 10);
        expect(profile.saturated + profile.monounsaturated + profile.polyunsaturated).toBeCloseTo(
          1,
          10,
        );
      }),
    );
  });

  test('glycerol is 0.0547 g per 100 g of fat and unit of ester value', () => {
    // handbook rule, printed as 0.0547 x EV: percent of glycerol from a wholly saponified neutral fat
    for (const value of [181.3, 190, 255]) {
      const wish = formulation({ superfat: fraction(0) });
      const charge = at(100, {
        ...wish,
        fats: wish.fats.map((line) => ({
          ...line,
          fat: { ...line.fat, saponificationValue: { value, low: value, high: value } as never },
        })),
      });
      expect(massBalance(charge, CONSTANTS).glycerol / (0.0547 * value)).toBeCloseTo(1, 3);
    }
  });
});
