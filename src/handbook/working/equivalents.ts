import { isBeforeSaponification } from '../../chemistry/saponification.ts';
import { decidingValue } from '../../formulary/lots.ts';
import { cited, named, type Working } from './context.ts';
import { molarMassTerm } from './molar-masses.ts';
import { type Section, type Step, step } from './step.ts';
import { exact, figure, fractionOf, product, sumOf, symbol } from './term.ts';

const M = (of: string) => symbol('M', of);

const THOUSAND = exact(1000);

/** Liquids as solved, and the fat in them. `null` where the formula has none. */
export function liquids(working: Working): Section | null {
  const { charge, reference } = working;
  if (charge.liquids.length === 0) return null;
  const steps = charge.liquids.flatMap(({ liquid, mass }): Step[] => {
    const subject = named(working, liquid.id);
    const record = reference.liquids.get(liquid.id);
    const sources = [...new Set(record?.values.map((value) => cited(reference, value)) ?? [])];
    return [
      step({
        kind: 'liquid-mass',
        of: liquid.id,
        subject,
        symbol: symbol('m', subject),
        numbers: figure(mass),
        value: mass,
        unit: 'g',
        sources,
      }),
      ...(liquid.fatData
        ? [
            step({
              kind: 'fat-in-liquid',
              of: liquid.id,
              subject,
              symbol: symbol('m', 'fat'),
              numbers: product(figure(mass), exact(liquid.fat)),
              value: mass * liquid.fat,
              unit: 'g',
              sources,
            }),
          ]
        : []),
    ];
  });
  return { id: 'liquids', subject: null, steps };
}

/** n = m S / (1000 M(KOH)) for each fat, and their sum E. */
export function equivalents(working: Working): Section {
  const { charge, document, reference } = working;
  const koh = reference.constants.hydroxide.K;
  const parts = [
    ...charge.fats.map(({ fat, mass }) => ({ fat, mass, of: fat.id })),
    ...charge.liquids.flatMap(({ liquid, mass, at }) =>
      liquid.fatData && isBeforeSaponification(at)
        ? [{ fat: liquid.fatData, mass: mass * liquid.fat, of: `${liquid.id}-fat` }]
        : [],
    ),
  ];
  const steps = parts.map(({ fat, mass, of }, index): Step => {
    const subject = named(working, fat.id);
    const value = fat.saponificationValue.value;
    return step({
      kind: 'fat-equivalents',
      of,
      subject,
      symbol: symbol('n', String(index + 1)),
      equation: fractionOf(product(symbol('m'), symbol('S')), product(THOUSAND, M('KOH'))),
      numbers: fractionOf(
        product(figure(mass, 8), figure(value, 8)),
        product(THOUSAND, molarMassTerm(koh)),
      ),
      value: (mass * value) / (1000 * koh),
      unit: 'mol',
      sources: saponificationSources(working, fat.id, document),
    });
  });
  const total = step({
    kind: 'equivalents',
    symbol: symbol('E'),
    numbers: sumOf(...steps.map(({ result }) => result)),
    value: working.equivalents.saponifiable,
    unit: 'mol',
  });
  return { id: 'equivalents', subject: null, steps: [...steps, total] };
}

function saponificationSources(
  { reference }: Working,
  id: string,
  document: Working['document'],
): string[] {
  const lotName = document.fats.find((line) => line.id === id)?.saponificationValue.lot;
  const lot = reference.lots.fats.find((lot) => lot.fat === id && lot.lot === lotName);
  const kind = reference.fats.get(id)?.kind;
  const deciding = lot && kind ? decidingValue(lot, kind) : null;
  if (lot && deciding) {
    return [`${lot.lot}: ${deciding.value} ± ${deciding.uncertainty} mg KOH/g, ${deciding.method}`];
  }
  const chosen = reference.fats.get(id)?.chosen;
  return [chosen?.saponificationValue, chosen?.loweredBy].flatMap((record) =>
    record ? [cited(reference, record)] : [],
  );
}
