import { expect, test } from 'vitest';
import { packagedReference } from './packaged-data.ts';

const reference = packagedReference();

test('more than 40 fats have a saponification value and a composition', () => {
  const complete = [...reference.fats.values()].filter(({ core }) => core?.composition);
  expect(complete.length).toBeGreaterThan(40);
});

test('what is known too little of stays without numbers', () => {
  expect(reference.fats.get('kokum')?.core).toBeNull();
  expect(reference.fats.get('sal')?.core?.composition).toBeNull();
  expect(reference.fats.get('beeswax')?.core?.composition).toBeNull();
});

test('kinds of fat', () => {
  const ids = (kind: string) =>
    [...reference.fats.values()].filter((fat) => fat.kind === kind).map(({ id }) => id);
  expect(ids('wax')).toEqual(['beeswax', 'jojoba', 'lanolin']);
  expect(ids('free-acid')).toEqual(['lauric-acid', 'oleic-acid', 'stearic-acid']);
});

test('compositions are fractions that sum to 1', () => {
  for (const { core } of reference.fats.values()) {
    if (!core?.composition) continue;
    expect(core.composition.reduce((sum, { share }) => sum + share, 0)).toBeCloseTo(1, 12);
  }
});

test('the value used lies within its range', () => {
  for (const { core } of reference.fats.values()) {
    if (!core) continue;
    const { low, value, high } = core.saponificationValue;
    expect(low).toBeLessThanOrEqual(value);
    expect(value).toBeLessThanOrEqual((low + high) / 2);
  }
});

// `derived` figures of the trade's acids: three moles of base per mole of citric acid, 192.123 and 210.138 g/mol
test('acids take the alkali that stoichiometry asks', () => {
  const acidity = (id: string) => reference.additives.get(id)?.core.acidity ?? 0;
  expect(acidity('citric-acid') * 39.997).toBeCloseTo(0.62455, 4);
  expect(acidity('citric-acid-monohydrate') * 39.997).toBeCloseTo(0.57101, 4);
  expect(acidity('lactic-acid-80') * 39.997).toBeCloseTo(0.8 * 0.44402, 4);
  expect((reference.liquids.get('vinegar')?.core.acidity ?? 0) * 39.997).toBeCloseTo(
    0.05 * 0.66604,
    4,
  );
  expect(acidity('sodium-lactate-60')).toBe(0);
  expect(acidity('sodium-citrate')).toBe(0);
});

test('water of hydrates comes from the formula', () => {
  // 18.015 / 210.138 and 2 x 18.015 / 294.098
  expect(reference.additives.get('citric-acid-monohydrate')?.core.water).toBeCloseTo(0.08573, 5);
  expect(reference.additives.get('sodium-citrate')?.core.water).toBeCloseTo(0.12251, 4);
});

test('an alkali without a lot is reckoned at the top of its trade ranges', () => {
  expect(reference.alkalis.get('sodium-hydroxide')?.trade.assay).toEqual({
    low: 0.98,
    value: 0.995,
    high: 0.995,
  });
  expect(reference.alkalis.get('potassium-hydroxide')?.trade.assay).toEqual({
    low: 0.85,
    value: 0.92,
    high: 0.92,
  });
  for (const { trade } of reference.alkalis.values()) {
    expect(trade.assay.high + trade.carbonate).toBeLessThanOrEqual(1);
  }
});

test('lye tables: no extrapolated point, the newer limit on top, nothing for potassium', () => {
  const { Na, K } = reference.tables.lyeHeat;
  expect(Na.newerSetAdds).toBeCloseTo(44.51 - 42.89, 10);
  expect(Na.heatCapacities.map((curve) => curve.at(-1))).toEqual([
    [30, 3.534],
    [50, 3.2],
  ]);
  expect(K.heatCapacities.map((curve) => curve.at(-1))).toEqual([[45, 2.624]]);
  expect(K.heatOfSolution).toEqual([]);
  expect(K.newerSetAdds).toBe(0);
});

// by hand: ricinoleic acid 298.467, its triglyceride 933.450; 3 x 253.809 / 933.450 and 253.809 / 298.467
test('iodine factors: the method’s where listed, first principles otherwise', () => {
  expect(reference.acids.get('C18:1')?.acid.iodineFactor).toEqual({
    glyceride: 0.86,
    acid: 0.8986,
  });
  const ricinoleic = reference.acids.get('C18:1-OH')?.acid.iodineFactor;
  expect(ricinoleic?.glyceride).toBeCloseTo(0.81571, 5);
  expect(ricinoleic?.acid).toBeCloseTo(0.85038, 5);
  expect(reference.acids.get('C18:0')?.acid.iodineFactor).toEqual({ glyceride: 0, acid: 0 });
});

test('the shop: masses in grams, losses as a fraction, one size per way', () => {
  const { shop } = reference;
  expect(shop.batches.map(({ size }) => size)).toEqual([
    { by: 'fats', mass: 1000 },
    { by: 'bars', count: 48, wetMass: 118 },
    { by: 'mould', millilitres: 12_000 },
    { by: 'batter', mass: 2500 },
  ]);
  expect(shop.batches[0]?.losses).toBe(0.03);
  expect(shop.batches[2]?.vessel).toBe(20_000);
  expect(shop.scales[1]).toEqual({
    id: 'fine',
    name: 'Fine',
    step: 0.1,
    error: 0.2,
    capacity: 2000,
  });
  expect(shop.startTemperature).toBe(22);
});
