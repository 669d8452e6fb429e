import { describe, expect, test } from 'vitest';
import type { AnySizeData } from '../../src/browser/any-size-data.ts';
import { shownGroups } from '../../src/browser/any-size-lines.ts';
import { refusalText } from '../../src/browser/any-size-refusal.ts';
import { listedLike, sizeOf, wantedSize } from '../../src/browser/any-size-wanted.ts';
import { vesselFillLimit } from '../../src/cautions/vessel-fill-limit.ts';
import type { WantedSize } from '../../src/chemistry/any-size.ts';
import { massOfFatsFor } from '../../src/chemistry/batch-size.ts';
import { grams } from '../../src/chemistry/quantity.ts';
import { computeBatch } from '../../src/formulary/compute-batch.ts';
import type { ComputedFormula } from '../../src/formulary/formulary.ts';
import { weightsTable } from '../../src/handbook/weights.ts';
import { anySizeData } from '../../src/site/any-size/any-size-data.ts';
import { words } from '../../src/words/catalogue.ts';
import { demoOffers } from '../support/any-size-offers.ts';

const { formulas, offers: offered, reference } = demoOffers();
const { shop, tables, cautionThresholds } = reference;

/** A fixed sequence of numbers from 0 to 1 (mulberry32). */
function sequence(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state + 0x6d2b79f5) | 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4294967296;
  };
}

/** What the build makes of a size: the weights as a page prints them, or the reason why there are none. */
function built({ charge, document }: ComputedFormula, size: WantedSize) {
  const listed = document.batches
    .filter(({ refused }) => !refused)
    .flatMap(({ id }) => shop.batches.filter((batch) => batch.id === id))
    .map((batch) => {
      const fatsOf = (of: Parameters<typeof massOfFatsFor>[0]) => {
        const fats = massOfFatsFor(of, charge, batch.losses, tables.lyeDensity);
        if (!fats.ok) throw new Error(fats.breach.rule);
        return fats.value;
      };
      return { batch, own: fatsOf(batch.size), wanted: fatsOf(size) };
    })
    .sort((a, b) => a.own - b.own);
  const [smallest] = listed;
  if (smallest && smallest.wanted < smallest.own - 1e-6) return 'size-below-listed';
  const like = listed.find(({ own, wanted }) => wanted <= own + 1e-6)?.batch;
  if (!like) return 'size-above-listed';
  const batch = computeBatch(charge, { ...like, size }, null, reference);
  if (batch.refused) return words.breachText(batch.refused.rule, batch.refused.numbers);
  if ((batch.massOfFats ?? 0) > (like.heatLimit ?? Infinity)) return 'above-heat-limit';
  const fill = (batch.total ?? 0) / (like.vessel ?? Infinity);
  if (100 * fill > vesselFillLimit(document.process, cautionThresholds)) return 'above-vessel';
  const { end, met, floor, lowest } = document.release;
  const margin = batch.superfat?.[end === 'expanded' ? 'expanded' : 'worstCase'][0] ?? -100;
  if (margin < (met ? floor : lowest) - 1e-9) return 'lowest-superfat-below-limit';
  return {
    lines: weightsTable(document, batch, reference).groups.flatMap(({ name, lines }) =>
      lines.map((line) => [name, line.id, line.name, line.lot, line.text]),
    ),
    superfat: batch.superfat?.weighed,
    expanded: batch.superfat?.expanded,
    total: batch.total,
  };
}

/** The same from the script's side. */
function reckoned(data: AnySizeData, size: WantedSize) {
  const outcome = sizeOf(size, data);
  if (!outcome.ok) {
    const { rule } = outcome.breach;
    return rule in words.anySizeWords.refusals ? rule : refusalText(outcome.breach);
  }
  const { weighed, margin, total } = outcome.value;
  return {
    lines: shownGroups(weighed, data).flatMap(({ group, lines }) =>
      lines.map((line) => [group, line.id, line.name, line.lot, line.text]),
    ),
    superfat: weighed.superfat * 100,
    expanded: [margin.expanded.low * 100, margin.expanded.high * 100],
    total,
  };
}

describe('any size, as the page reckons it and as the build does', () => {
  test('is offered for every formula of the demonstration with weights', () => {
    expect(offered.length).toBe(formulas.length);
    expect(offered.length).toBeGreaterThan(30);
  });

  test('says the same for a thousand random sizes, to the last digit', () => {
    const random = sequence(20261201);
    const counts = { weights: 0, refused: new Map<string, number>() };
    for (let round = 0; round < 1000; round++) {
      const entry = offered[round % offered.length];
      if (!entry) throw new Error('no formula');
      const { computed, data } = entry;
      const { listed } = data.limits;
      const [low, high] = [listed[0]?.fats ?? 0, listed.at(-1)?.fats ?? 0];
      // evenly over the orders of size, and a little beyond both ends
      const fats = low * 0.8 * ((high * 1.2) / (low * 0.8)) ** random();
      const size = randomSize(fats, data, random());
      const expected = built(computed, size);
      expect(reckoned(data, size), `${data.code} ${JSON.stringify(size)}`).toEqual(expected);
      if (typeof expected === 'string') {
        counts.refused.set(expected, (counts.refused.get(expected) ?? 0) + 1);
      } else counts.weights++;
    }
    expect(counts.weights).toBeGreaterThan(500);
    expect(counts.refused.size).toBeGreaterThan(2);
  });

  test('repeats every listed size', () => {
    for (const { computed, data } of offered) {
      for (const { id, label } of data.limits.listed) {
        const wanted = wantedSize({ way: 'listed', text: id }, data);
        if (!wanted.ok) throw new Error(wanted.sentence);
        const outcome = sizeOf(wanted.size, data);
        if (!outcome.ok) {
          // published with a warning, as only a caution speaks of it there
          const warned = computed.document.cautions.filter(({ id }) =>
            ['batch-above-vessel', 'batch-above-heat-limit'].includes(id),
          );
          expect(
            warned.map(({ numbers }) => numbers.batch),
            `${data.code} ${id} ${outcome.breach.rule}`,
          ).toContain(label);
          continue;
        }
        expect(listedLike(outcome.value, data)?.id).toBe(id);
        const batch = computed.document.batches.find((each) => each.id === id);
        if (!batch) throw new Error(id);
        expect(
          shownGroups(outcome.value.weighed, data).flatMap(({ lines }) =>
            lines.map(({ id: material, text }) => [material, text]),
          ),
        ).toEqual(
          weightsTable(computed.document, batch, reference).groups.flatMap(({ lines }) =>
            lines.map(({ id: material, text }) => [material, text]),
          ),
        );
      }
    }
  });

  test('is no part of a shop that did not turn it on', () => {
    const { anySize: _, ...rest } = shop;
    const [first] = formulas;
    expect(first && anySizeData(first, { ...reference, shop: rest })).toBeNull();
  });
});

function randomSize(fats: number, { bars, limits }: AnySizeData, choice: number): WantedSize {
  const [bar] = bars;
  if (bar && choice < 0.33) {
    const count = Math.max(1, Math.round((fats * 1.45) / bar.wetMass));
    return { by: 'bars', count, wetMass: bar.wetMass };
  }
  const step = (limits.listed[0]?.fats ?? 0) > 5000 ? 1 : 0.1;
  const rounded = (mass: number) => grams(Math.round(mass / step) * step);
  return choice < 0.66
    ? { by: 'fats', mass: rounded(fats) }
    : { by: 'batter', mass: rounded(fats * 1.45) };
}
