import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { superfatMargin } from '../../src/chemistry/margin.ts';
import { fraction, grams } from '../../src/chemistry/quantity.ts';
import { reckon } from '../../src/chemistry/reckon.ts';
import { equivalentsOf, superfatFrom } from '../../src/chemistry/superfat.ts';
import { anyFormulation } from '../support/arbitraries.ts';
import { alkali, CONSTANTS, fat, formulation } from '../support/materials.ts';
import { givenValue } from '../support/outcome.ts';

const everyday = formulation({
  fats: [
    { fat: fat('olive', { value: 190, low: 184, high: 196 }), share: fraction(0.45) },
    { fat: fat('coconut', { value: 256.5, low: 248, high: 265 }), share: fraction(0.25) },
    { fat: fat('shea', { value: 177.5, low: 160, high: 195 }), share: fraction(0.3) },
  ],
  alkali: [{ supply: alkali('Na', 0.995, { low: 0.98, high: 0.995 }), share: fraction(1) }],
});
const charge = givenValue(reckon(everyday, grams(1000), CONSTANTS));
const weighing = { fats: [1.5, 1.5, 1.5], alkali: [0.15], additives: [], liquids: [] };

describe('superfat margin', () => {
  test('agrees with a Monte Carlo run of the core, with and without the scale', () => {
    for (const scale of [null, weighing]) {
      const { expanded } = givenValue(superfatMargin(charge, CONSTANTS, scale));
      const { mean, deviation } = monteCarlo(40_000, scale);
      expect((expanded.low + expanded.high) / 2).toBeCloseTo(mean, 3);
      // first order against sampling: within 2 % of the half-width
      expect((expanded.high - expanded.low) / 2 / (2 * deviation)).toBeCloseTo(1, 1.4);
    }
  });

  test('the worst case is all ranges at one end', () => {
    const { worstCase } = givenValue(superfatMargin(charge, CONSTANTS));
    // by hand: E of the low ends (82.8 + 62 + 48) / 56.105 = 3.43642 mol; hydroxide as weighed
    const low = (0.45 * 184 + 0.25 * 248 + 0.3 * 160) / 0.056105;
    const hydroxide = ((charge.alkali[0]?.weighedMass ?? 0) * 0.995) / 39.997;
    expect(worstCase.low).toBeCloseTo(1 - (hydroxide * 1000) / low, 9);
  });

  test('names the largest contribution first', () => {
    const { budget } = givenValue(superfatMargin(charge, CONSTANTS, weighing));
    expect(budget.map(({ id }) => id)).toEqual([
      'fat:shea',
      'fat:olive',
      'fat:coconut',
      'assay:sodium-hydroxide',
      'scale',
    ]);
  });

  test('a measured lot narrows it', () => {
    const measured = {
      ...everyday,
      fats: everyday.fats.map((line) =>
        line.fat.id === 'shea'
          ? {
              ...line,
              fat: {
                ...line.fat,
                saponificationValue: {
                  value: 178,
                  low: 177,
                  high: 179,
                  spread: 'expanded',
                } as never,
              },
            }
          : line,
      ),
    };
    const before = givenValue(superfatMargin(charge, CONSTANTS)).expanded;
    const after = givenValue(
      superfatMargin(givenValue(reckon(measured, grams(1000), CONSTANTS)), CONSTANTS),
    ).expanded;
    expect(after.high - after.low).toBeLessThan(0.6 * (before.high - before.low));
  });

  test('in cold process a wax counts only its acid value at the lower ends', () => {
    const waxy = (process: 'cold' | 'hot') =>
      givenValue(
        reckon(
          formulation({
            process,
            fats: [
              { fat: fat('olive', { value: 190, low: 184, high: 196 }), share: fraction(0.9) },
              {
                fat: fat('jojoba', { value: 92, low: 80, high: 110, kind: 'wax', acidValue: 1 }),
                share: fraction(0.1),
              },
            ],
          }),
          grams(1000),
          CONSTANTS,
        ),
      );
    const cold = givenValue(superfatMargin(waxy('cold'), CONSTANTS));
    const hot = givenValue(superfatMargin(waxy('hot'), CONSTANTS));
    // jojoba is 5.1 % of the equivalents: without it the superfat of 5 % is all but gone
    expect(cold.expanded.low).toBeLessThan(hot.expanded.low - 0.04);
    expect(cold.worstCase.low).toBeLessThan(hot.worstCase.low - 0.04);
    expect(cold.expanded.high).toBeCloseTo(hot.expanded.high, 9);
  });

  test('is refused where nothing in the pot is sure to use up the alkali', () => {
    const wax = (acidValue: number) =>
      givenValue(
        reckon(
          formulation({
            fats: [
              { fat: fat('jojoba', { value: 92, kind: 'wax', acidValue }), share: fraction(1) },
            ],
          }),
          grams(1000),
          CONSTANTS,
        ),
      );
    expect(superfatMargin(wax(0), CONSTANTS)).toMatchObject({
      ok: false,
      breach: { rule: 'nothing-sure-to-saponify' },
    });
    expect(superfatMargin(wax(1), CONSTANTS).ok).toBe(true);
  });

  test('lies inside the worst case, whatever the formula', () => {
    fc.assert(
      fc.property(anyFormulation, (wish) => {
        const { expanded, worstCase } = givenValue(
          superfatMargin(givenValue(reckon(wish, grams(1000), CONSTANTS)), CONSTANTS),
        );
        expect(expanded.low).toBeGreaterThanOrEqual(worstCase.low);
        expect(expanded.high).toBeLessThanOrEqual(worstCase.high);
        expect(expanded.low).toBeLessThanOrEqual(expanded.high);
      }),
    );
  });
});

/** Superfats of charges whose values are drawn from their rectangular ranges, seeded. */
function monteCarlo(runs: number, scale: typeof weighing | null) {
  const random = seeded(20261201);
  const draw = (low: number, high: number) => low + (high - low) * random();
  let sum = 0;
  let squares = 0;
  for (let run = 0; run < runs; run++) {
    const shaken = {
      ...charge,
      fats: charge.fats.map(({ fat, mass }, i) => {
        const value = draw(fat.saponificationValue.low, fat.saponificationValue.high);
        const error = scale?.fats[i] ?? 0;
        return {
          mass: grams(mass + draw(-error, error)),
          fat: { ...fat, saponificationValue: { value, low: value, high: value } as never },
        };
      }),
      alkali: charge.alkali.map((line, i) => {
        const value = draw(line.supply.assay.low, line.supply.assay.high);
        const error = scale?.alkali[i] ?? 0;
        return {
          ...line,
          weighedMass: grams(line.weighedMass + draw(-error, error)),
          supply: { ...line.supply, assay: { value, low: value, high: value } as never },
        };
      }),
    };
    const reading = { fats: 'value', assay: 'value', waxAsAcids: false } as const;
    const superfat = superfatFrom(equivalentsOf(shaken, reading, CONSTANTS));
    sum += superfat;
    squares += superfat ** 2;
  }
  const mean = sum / runs;
  return { mean, deviation: Math.sqrt(squares / runs - mean ** 2) };
}

/** A small generator with a fixed seed (xorshift, 32 bit), so that the run is the same everywhere. */
function seeded(seed: number): () => number {
  let state = seed | 0;
  return () => {
    state ^= state << 13;
    state ^= state >>> 17;
    state ^= state << 5;
    return (state >>> 0) / 2 ** 32;
  };
}
