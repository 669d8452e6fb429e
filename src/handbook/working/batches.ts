import { type FatWeighing, fatWeighings } from '../../chemistry/blend.ts';
import { isBeforeSaponification } from '../../chemistry/saponification.ts';
import { AS_USED, equivalentsOf, superfatFrom } from '../../chemistry/superfat.ts';
import { weighBatch } from '../../formulary/compute-batch.ts';
import { expectedMass, weighed as onPaper } from '../../words/measures.ts';
import { superfatStep } from './check.ts';
import { named, type Working } from './context.ts';
import { molarMassTerm } from './molar-masses.ts';
import { type Section, type Step, step } from './step.ts';
import { exact, figure, fractionOf, product, sumOf, symbol } from './term.ts';

/** From the masses per 1000 g to what the scale shows, for each batch size that has weights. */
export function batches(working: Working): readonly Section[] {
  const { weighedCharge: charge, document, reference } = working;
  return document.batches.flatMap(({ id, label, refused, superfat }): Section[] => {
    const batch = reference.shop.batches.find((batch) => batch.id === id);
    if (refused || !superfat || !batch) return [];
    const weighed = weighBatch(charge, batch, reference);
    if (!weighed.ok) return [];
    const { charge: rounded, massOfFats: fats, steps } = weighed.value;
    const perKilogram = charge.fats.reduce((sum, { mass }) => sum + mass, 0);
    const scaled = (kind: Step['kind'], of: string, subject: string, mass: number) =>
      step({
        kind,
        of: `${id}-${of}`,
        subject,
        symbol: symbol('m'),
        numbers: fractionOf(product(figure(mass), figure(fats)), figure(perKilogram)),
        value: (mass * fats) / perKilogram,
        unit: 'g',
      });
    /** So many whole steps of the scale. */
    const onScale = (of: string, mass = Number.NaN, size = Number.NaN) =>
      step({
        kind: 'on-the-scale',
        of: `${id}-${of}`,
        subject: named(working, of),
        symbol: symbol('m'),
        numbers: product(exact(Math.round(mass / size)), exact(size)),
        value: mass,
        digits: 9,
        unit: 'g',
        printed: onPaper(mass, size),
      });
    const onScales = fatWeighings(rounded.fats);
    /** What each part of a blend is of the weight of the blend; nothing for a fat by itself. */
    const partsOf = (weighing: FatWeighing, onScale: number) =>
      weighing.lines.length < 2
        ? []
        : weighing.lines.flatMap((index) => {
            const line = charge.fats[index];
            if (!line) return [];
            return step({
              kind: 'part-of-blend',
              of: `${id}-${weighing.id}-${line.fat.id}`,
              subject: named(working, line.fat.id),
              symbol: symbol('m'),
              numbers: product(
                exact(onScale),
                fractionOf(figure(line.mass, 8), figure(weighing.mass, 8)),
              ),
              value: rounded.fats[index]?.mass ?? Number.NaN,
              digits: 9,
              unit: 'g',
            });
          });
    const koh = reference.constants.hydroxide.K;
    const amounts = equivalentsOf(rounded, AS_USED, reference.constants);
    const saponified = [
      ...rounded.fats.map(({ fat, mass }) => ({
        mass: exact(mass),
        value: fat.saponificationValue.value,
      })),
      ...rounded.liquids.flatMap(({ liquid, mass, at }) =>
        liquid.fatData && isBeforeSaponification(at)
          ? [
              {
                mass: product(exact(mass), exact(liquid.fat)),
                value: liquid.fatData.saponificationValue.value,
              },
            ]
          : [],
      ),
    ];
    const acids = [
      ...rounded.additives.map(({ additive, mass, at }) => ({
        mass,
        acidity: additive.acidity,
        at,
      })),
      ...rounded.liquids.map(({ liquid, mass, at }) => ({ mass, acidity: liquid.acidity, at })),
    ].filter(({ acidity, at }) => acidity > 0 && isBeforeSaponification(at));
    const lines: Step[] = [
      step({
        kind: 'fats-of-batch',
        of: id,
        symbol: symbol('m', 'fats'),
        numbers: figure(fats),
        value: fats,
        unit: 'g',
        printed: expectedMass(fats),
      }),
      ...fatWeighings(charge.fats).flatMap((weighing, i) => [
        scaled('exact-weight', weighing.id, named(working, weighing.id), weighing.mass),
        onScale(weighing.id, onScales[i]?.mass, steps.fats[weighing.lines[0] ?? 0]),
        ...partsOf(weighing, onScales[i]?.mass ?? Number.NaN),
      ]),
      ...charge.alkali.flatMap(({ supply, weighedMass }, i) => [
        scaled('exact-weight', supply.id, named(working, supply.id), weighedMass),
        onScale(supply.id, rounded.alkali[i]?.weighedMass, steps.alkali[i]),
      ]),
      ...charge.additives.flatMap(({ additive, mass }, i) => [
        scaled('exact-weight', additive.id, named(working, additive.id), mass),
        onScale(additive.id, rounded.additives[i]?.mass, steps.additives[i]),
      ]),
      ...charge.liquids.flatMap(({ liquid, mass }, i) => [
        scaled('exact-weight', liquid.id, named(working, liquid.id), mass),
        onScale(liquid.id, rounded.liquids[i]?.mass, steps.liquids[i]),
      ]),
      step({
        kind: 'batch-equivalents',
        of: id,
        symbol: symbol('E'),
        numbers: fractionOf(
          sumOf(...saponified.map(({ mass, value }) => product(mass, figure(value, 8)))),
          product(exact(1000), molarMassTerm(koh)),
        ),
        value: amounts.saponifiable,
        digits: 7,
        unit: 'mol',
      }),
      ...(acids.length > 0
        ? [
            step({
              kind: 'batch-acid',
              of: id,
              symbol: symbol('n', 'acid'),
              numbers: sumOf(
                ...acids.map(({ mass, acidity }) => product(exact(mass), figure(acidity))),
              ),
              value: amounts.acid,
              digits: 7,
              unit: 'mol',
            }),
          ]
        : []),
      step({
        kind: 'batch-hydroxide',
        of: id,
        symbol: symbol('n', 'OH'),
        numbers: sumOf(
          ...rounded.alkali.map(({ supply, weighedMass }) =>
            fractionOf(
              product(exact(weighedMass), figure(supply.assay.value)),
              molarMassTerm(reference.constants.hydroxide[supply.cation]),
            ),
          ),
        ),
        value: amounts.hydroxide,
        digits: 7,
        unit: 'mol',
      }),
      superfatStep('batch-superfat', amounts, superfatFrom(amounts) * 100, id),
    ];
    return [{ id: 'batch', subject: label, steps: lines }];
  });
}
