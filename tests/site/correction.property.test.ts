import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { AnySizeData } from '../../src/browser/any-size-data.ts';
import { sizeOf } from '../../src/browser/any-size-wanted.ts';
import type { Sized } from '../../src/chemistry/any-size.ts';
import { correct, type Shown } from '../../src/chemistry/correction.ts';
import { grams } from '../../src/chemistry/quantity.ts';
import { AS_USED, equivalentsOf, superfatFrom } from '../../src/chemistry/superfat.ts';
import { stepOf, type WeighingLine, weighingsOf } from '../../src/chemistry/weighings.ts';
import { demoOffers } from '../support/any-size-offers.ts';
import { givenValue } from '../support/outcome.ts';

const { offers } = demoOffers();

/** Sizes of the demonstration's formulas that can be made. */
const planned = offers.flatMap(({ data }) =>
  data.limits.listed.flatMap(({ fats }) => {
    const sized = sizeOf({ by: 'fats', mass: fats }, data);
    return sized.ok
      ? [{ data, sized: sized.value, lines: weighingsOf(sized.value.weighed.charge) }]
      : [];
  }),
);

interface Slip {
  /** Which line, as a part of the list. */
  readonly line: number;
  /** By how much the scale showed more or less than written. */
  readonly by: number;
  readonly mixed: boolean;
}

const anySlip = fc.record({
  line: fc.double({ min: 0, max: 0.999, noNaN: true }),
  by: fc.integer({ min: -200, max: 150 }).map((thousandths) => thousandths / 1000),
  mixed: fc.boolean(),
});

/** What the scale showed, in whole steps of it. */
function shownBy(slips: readonly Slip[], { weighed }: Sized, lines: readonly WeighingLine[]) {
  return new Map(
    slips.flatMap(({ line: part, by, mixed }): [number, Shown][] => {
      const place = Math.floor(part * lines.length);
      const line = lines[place];
      if (!line || line.group === 'after-cook' || line.group === 'dilution') return [];
      const step = stepOf(weighed, line);
      const steps = Math.max(0, Math.round((line.mass * (1 + by)) / step));
      return [[place, { mass: grams(Number((steps * step).toPrecision(12))), mixed }]];
    }),
  );
}

const anyCase = fc.record({
  which: fc.nat({ max: planned.length - 1 }),
  slips: fc.array(anySlip, { minLength: 1, maxLength: 3 }),
  dissolved: fc.boolean(),
});

const corrected = ({
  which,
  slips,
  dissolved,
}: typeof anyCase extends fc.Arbitrary<infer T> ? T : never) => {
  const found = planned[which];
  if (!found) throw new Error('no size');
  const { data, sized, lines } = found;
  const shown = shownBy(slips, sized, lines);
  const bench = { combined: false, dissolved, shown };
  return {
    ...found,
    shown,
    outcome: correct(sized, bench, data.strongestLye, data.limits, data.constants),
  };
};

/** The superfat of a batch with other masses, reckoned from the masses alone. */
function superfatWith(
  { weighed: { charge } }: Sized,
  masses: ReadonlyMap<string, number>,
  { constants }: AnySizeData,
): number {
  const massOf = (what: WeighingLine['what'], place: number) => masses.get(`${what} ${place}`) ?? 0;
  return superfatFrom(
    equivalentsOf(
      {
        fats: charge.fats.map((line, i) => ({ ...line, mass: grams(massOf('fats', i)) })),
        alkali: charge.alkali.map((line, i) => ({
          ...line,
          weighedMass: grams(massOf('alkali', i)),
        })),
        liquids: charge.liquids.map((line, i) => ({ ...line, mass: grams(massOf('liquids', i)) })),
        additives: charge.additives.map((line, i) => ({
          ...line,
          mass: grams(massOf('additives', i)),
        })),
      },
      AS_USED,
      constants,
    ),
  );
}

describe('a correction', () => {
  test('keeps mass, never takes from what is mixed, never lowers the superfat, and keeps the limits', () => {
    let found = 0;
    let stopped = 0;
    fc.assert(
      fc.property(anyCase, (wish) => {
        const { data, sized: before, outcome, shown } = corrected(wish);
        if (!outcome.ok) {
          stopped++;
          return;
        }
        found++;
        const { sized, lines } = outcome.value;
        const { charge } = sized.weighed;
        // what is there and what is added is what the batch weighs
        const sum = lines.reduce((total, { present, change }) => total + present + change, 0);
        expect(sum).toBeCloseTo(sized.total, 6);
        const masses = new Map<string, number>();
        lines.forEach(({ line, present, change, mixed, step }, place) => {
          const after = present + change;
          expect(after).toBeGreaterThanOrEqual(0);
          if (mixed) expect(change).toBeGreaterThanOrEqual(-1e-9);
          // a scale can show it
          expect(Math.abs(after / step - Math.round(after / step))).toBeLessThan(1e-6);
          expect(shown.get(place)?.mass ?? present).toBe(present);
          for (const index of line.places) {
            const share = line.what === 'fats' ? (charge.fats[index]?.mass ?? 0) / line.mass : 1;
            masses.set(`${line.what} ${index}`, after * share);
          }
        });
        const { superfat } = charge.formulation;
        const now = superfatWith(sized, masses, data);
        expect(now).toBeGreaterThanOrEqual(superfat - 1e-9);
        expect(now).toBeCloseTo(sized.weighed.superfat, 9);
        for (const { end, floor } of data.limits.floors) {
          expect(sized.margin[end].low).toBeGreaterThanOrEqual(floor - 1e-9);
        }
        const listed = data.limits.listed[sized.as];
        if (!listed) throw new Error('no listed size');
        expect(sized.weighed.massOfFats).toBeLessThanOrEqual(
          before.weighed.massOfFats * 1.1 + 1e-6,
        );
        expect(sized.total).toBeLessThanOrEqual(
          (listed.vessel ?? Infinity) * data.limits.largestFill,
        );
        expect(sized.weighed.massOfFats).toBeLessThanOrEqual(
          (listed.heatLimit ?? Infinity) * 1.001,
        );
      }),
      { seed: 20261201, numRuns: 1500 },
    );
    expect(found).toBeGreaterThan(400);
    expect(stopped).toBeGreaterThan(100);
  });

  test('of nothing changes nothing', () => {
    for (const { data, sized } of planned) {
      const bench = { combined: false, dissolved: true, shown: new Map() };
      const { lines } = givenValue(
        correct(sized, bench, data.strongestLye, data.limits, data.constants),
      );
      expect(lines.map(({ change }) => change)).toEqual(lines.map(() => 0));
    }
  });

  test('of anything is refused once lye and fats have met', () => {
    for (const { data, sized } of planned.slice(0, 5)) {
      const bench = { combined: true, dissolved: true, shown: new Map() };
      const outcome = correct(sized, bench, data.strongestLye, data.limits, data.constants);
      expect(outcome.ok || outcome.breach.rule).toBe('lye-has-met-fats');
    }
  });
});
