import { describe, expect, test } from 'vitest';
import type { AnySizeData } from '../../src/browser/any-size-data.ts';
import { sizeOf } from '../../src/browser/any-size-wanted.ts';
import { todoText } from '../../src/browser/size-sheet-todo.ts';
import { correct } from '../../src/chemistry/correction.ts';
import { grams } from '../../src/chemistry/quantity.ts';
import { weighingsOf } from '../../src/chemistry/weighings.ts';
import { demoOffers } from '../support/any-size-offers.ts';
import { givenValue } from '../support/outcome.ts';

const { offers } = demoOffers();
const lamp = offers.find(({ data }) => data.code === 'QY-014')?.data;
if (!lamp) throw new Error('the demonstration has no QY-014');
const sour = offers.find(({ data }) =>
  data.formulation.additives.some(({ at, additive }) => at === 'lye' && additive.acidity > 0),
)?.data;
if (!sour) throw new Error('the demonstration has no acid in a lye');

/** A kilogram of fats where the scale of one line showed a multiple of what is written. */
function slip(
  data: AnySizeData,
  id: string,
  times: number,
  how: { mixed?: boolean; dissolved?: boolean } = {},
) {
  const fats = data.limits.listed[0]?.fats ?? grams(1000);
  const sized = givenValue(sizeOf({ by: 'fats', mass: fats }, data));
  const lines = weighingsOf(sized.weighed.charge);
  const place = lines.findIndex((line) => line.id === id);
  const mass = grams(
    Number((Math.round((lines[place]?.mass ?? 0) * times * 10) / 10).toPrecision(12)),
  );
  const { mixed = false, dissolved = false } = how;
  const bench = { combined: false, dissolved, shown: new Map([[place, { mass, mixed }]]) };
  const outcome = correct(sized, bench, data.strongestLye, data.limits, data.constants);
  return { outcome, sized, place };
}

const ruleOf = ({ outcome }: ReturnType<typeof slip>) =>
  outcome.ok ? 'corrected' : outcome.breach.rule;
const changeOf = ({ outcome }: ReturnType<typeof slip>, id: string) =>
  givenValue(outcome).lines.find(({ line }) => line.id === id)?.change;

describe('a slip at the scale', () => {
  test('alone in its cup is taken back or filled up, and nothing else moves', () => {
    for (const [id, times] of [
      ['olive', 1.04],
      ['olive', 0.9],
      ['sodium-hydroxide', 1.3],
      ['water', 1.5],
    ] as const) {
      const found = slip(lamp, id, times);
      const { lines } = givenValue(found.outcome);
      expect(lines.filter(({ change }) => change !== 0).map(({ line }) => line.id)).toEqual([id]);
      expect(Math.sign(changeOf(found, id) ?? 0)).toBe(Math.sign(1 - times));
    }
  });

  test('of a fat in the pot makes all else grow with it', () => {
    // 450 g of olive oil became 468 g: 4 % more of everything
    const { outcome, sized } = slip(lamp, 'olive', 1.04, { mixed: true });
    const { lines, sized: grown } = givenValue(outcome);
    expect(grown.weighed.massOfFats / sized.weighed.massOfFats).toBeCloseTo(1.04, 4);
    for (const { line, written, change } of lines) {
      if (line.id !== 'olive') expect(change / written, line.id).toBeCloseTo(0.04, 2);
    }
  });

  test('of alkali in the water asks for more of everything, never for less alkali', () => {
    const found = slip(lamp, 'sodium-hydroxide', 1.03, { dissolved: true });
    expect(changeOf(found, 'sodium-hydroxide')).toBeGreaterThanOrEqual(0);
    expect(changeOf(found, 'olive')).toBeGreaterThan(450 * 0.025);
    const water = givenValue(found.outcome).lines[0];
    if (!water) throw new Error('no water');
    expect(todoText(water, { shown: false, dissolved: true })).toContain('Never onto the lye');
  });

  test('of water or acid in the jug is never put right without a word about alkali', () => {
    for (const times of [0.95, 1.05]) {
      const { outcome, place } = slip(lamp, 'water', times);
      const water = givenValue(outcome).lines[place];
      if (!water) throw new Error('no water');
      expect(todoText(water, { shown: true, dissolved: false })).toContain(
        'only while no alkali is in',
      );
    }
  });

  test('beyond what can be put right stops the batch', () => {
    expect(ruleOf(slip(lamp, 'sodium-hydroxide', 1.15, { dissolved: true }))).toBe(
      'correction-too-large',
    );
    expect(ruleOf(slip(lamp, 'olive', 1.2, { mixed: true }))).toBe('correction-too-large');
    expect(ruleOf(slip(lamp, 'water', 0.8, { dissolved: true }))).toBe('made-lye-lacks-water');
    const alkali = 'sodium-hydroxide';
    expect(ruleOf(slip(lamp, alkali, 0.8, { dissolved: true }))).toBe('made-lye-lacks-alkali');
    expect(ruleOf(slip(lamp, alkali, 0.95, { dissolved: true }))).toBe('corrected');
    expect(ruleOf(slip(lamp, alkali, 0.8))).toBe('corrected');
    const acid = sour.formulation.additives.find(({ at }) => at === 'lye')?.additive.id ?? '';
    expect(ruleOf(slip(sour, acid, 0.5, { dissolved: true }))).toBe('made-lye-lacks-acid');
    expect(ruleOf(slip(sour, acid, 0.5))).toBe('corrected');
    expect(ruleOf(slip({ ...lamp, strongestLye: null }, 'water', 0.97, { dissolved: true }))).toBe(
      'made-lye-near-saturation',
    );
  });

  test('that would overfill the vessel or pass the heat limit stops the batch', () => {
    const within = (change: object): AnySizeData => ({
      ...lamp,
      limits: {
        ...lamp.limits,
        listed: lamp.limits.listed.map((size) => ({ ...size, ...change })),
      },
    });
    const mixed = { mixed: true };
    expect(ruleOf(slip(within({ vessel: 1850 }), 'olive', 1.06, mixed))).toBe('above-vessel');
    expect(ruleOf(slip(within({ heatLimit: 1020 }), 'olive', 1.06, mixed))).toBe(
      'above-heat-limit',
    );
    expect(ruleOf(slip(within({ vessel: null }), 'olive', 1.06, mixed))).toBe('grown-above-listed');
  });

  test('is refused where the lowest superfat would pass its floor', () => {
    const floors = [{ end: 'expanded', floor: 0.06 }] as const;
    expect(
      sizeOf({ by: 'fats', mass: grams(1000) }, { ...lamp, limits: { ...lamp.limits, floors } }),
    ).toMatchObject({
      breach: { rule: 'lowest-superfat-below-limit' },
    });
  });
});
