import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { fraction, grams } from '../../src/chemistry/quantity.ts';
import { reckon } from '../../src/chemistry/reckon.ts';
import { weigh } from '../../src/chemistry/weigh.ts';
import { anyFormulation } from '../support/arbitraries.ts';
import { alkali, CITRIC_MONOHYDRATE, CONSTANTS, fat, formulation } from '../support/materials.ts';
import { givenValue } from '../support/outcome.ts';

const scale = (step: number) => () => ({ step: grams(step), error: grams(step) });

describe('weighing', () => {
  test('never puts the superfat below the one written, on any scale', () => {
    fc.assert(
      fc.property(anyFormulation, fc.constantFrom(0.1, 1, 5), (wish, step) => {
        const charge = givenValue(reckon(wish, grams(1000), CONSTANTS));
        const weighed = weigh(charge, scale(step), 1, CONSTANTS);
        if (!weighed.ok) return;
        expect(weighed.value.superfat).toBeGreaterThanOrEqual(wish.superfat - 1e-9);
        for (const { weighedMass } of weighed.value.charge.alkali) {
          expect(Math.abs(weighedMass / step - Math.round(weighedMass / step))).toBeLessThan(1e-6);
        }
      }),
    );
  });

  test('rounds fats to nearest, acids up and alkali down', () => {
    const charge = givenValue(
      reckon(
        formulation({
          fats: [
            { fat: fat('olive', { value: 190 }), share: fraction(0.7004) },
            { fat: fat('coconut', { value: 257 }), share: fraction(0.2996) },
          ],
          alkali: [{ supply: alkali('Na', 0.985), share: fraction(1) }],
          additives: [{ additive: CITRIC_MONOHYDRATE, perFats: fraction(0.0201), at: 'lye' }],
        }),
        grams(1000),
        CONSTANTS,
      ),
    );
    const { charge: rounded, steps } = givenValue(weigh(charge, scale(1), 0.01, CONSTANTS));
    expect(rounded.fats.map(({ mass }) => mass)).toEqual([700, 300]);
    expect(rounded.additives[0]?.mass).toBe(21);
    expect(charge.alkali[0]?.weighedMass).toBeCloseTo(156.09, 1);
    expect(rounded.alkali[0]?.weighedMass).toBe(156);
    expect(steps.fats).toEqual([1, 1]);
  });

  test('goes a further step down where rounded fats need less alkali', () => {
    // 100.4 g of fat rounds to 100; alkali of 13.44 g on a 0.1 g scale is not enough of a step down
    const charge = givenValue(reckon(formulation(), grams(100.4), CONSTANTS));
    const mixed = (mass: number) => ({ step: grams(mass > 50 ? 1 : 0.01), error: grams(0) });
    const { charge: rounded, superfat } = givenValue(weigh(charge, mixed, 1, CONSTANTS));
    const exact =
      givenValue(reckon(formulation(), grams(100), CONSTANTS)).alkali[0]?.weighedMass ?? 0;
    expect(rounded.alkali[0]?.weighedMass).toBeLessThanOrEqual(exact);
    expect(rounded.alkali[0]?.weighedMass).toBeGreaterThan(exact - 0.01);
    expect(superfat).toBeGreaterThanOrEqual(0.05 - 1e-9);
  });

  test('gives no weights where rounding moves the superfat too far', () => {
    const charge = givenValue(reckon(formulation(), grams(57), CONSTANTS));
    const refused = weigh(charge, scale(1), 0.003, CONSTANTS);
    expect(refused).toMatchObject({ ok: false, breach: { rule: 'size-too-small-for-scale' } });
  });

  test('gives no weights where something rounds to nothing', () => {
    const charge = givenValue(
      reckon(
        formulation({
          additives: [
            {
              additive: { ...CITRIC_MONOHYDRATE, acidity: 0 as never },
              perFats: fraction(0.0004),
              at: 'trace',
            },
          ],
        }),
        grams(1000),
        CONSTANTS,
      ),
    );
    expect(weigh(charge, scale(1), 0.01, CONSTANTS)).toMatchObject({
      ok: false,
      breach: { rule: 'weight-below-scale-step', numbers: { step: 1 } },
    });
  });

  test('held-back water that rounds to nothing is refused like anything else', () => {
    const charge = givenValue(
      reckon(formulation({ holdBack: fraction(0.001) }), grams(1000), CONSTANTS),
    );
    expect(weigh(charge, scale(1), 0.01, CONSTANTS)).toMatchObject({
      ok: false,
      breach: { rule: 'weight-below-scale-step' },
    });
    expect(weigh(charge, scale(0.1), 0.01, CONSTANTS).ok).toBe(true);
  });

  test('0.1 g steps come out as the decimal a sheet prints', () => {
    const charge = givenValue(reckon(formulation(), grams(100.3), CONSTANTS));
    const { charge: rounded } = givenValue(weigh(charge, scale(0.1), 1, CONSTANTS));
    expect(String(rounded.fats[0]?.mass)).toBe('100.3');
  });
});
