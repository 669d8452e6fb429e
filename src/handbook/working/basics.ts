import type { GramsPerMole } from '../../chemistry/quantity.ts';
import { isBeforeSaponification } from '../../chemistry/saponification.ts';
import { decidingValue } from '../../formulary/lots.ts';
import { cited, named, type Working } from './context.ts';
import { type Section, type Step, step } from './step.ts';
import { exact, figure, fractionOf, minus, product, sumOf, symbol, type Term } from './term.ts';

const M = (of: string) => symbol('M', of);
const THOUSAND = exact(1000);

/** Molar masses from the atomic weights: the alkalis, and what an acid is made of. */
export function molarMasses(working: Working): Section {
  const { charge, reference } = working;
  const formulas = new Set(['KOH']);
  for (const { supply } of charge.alkali) formulas.add(supply.cation === 'Na' ? 'NaOH' : 'KOH');
  for (const { additive } of charge.additives) {
    const substance = reference.additives.get(additive.id)?.substance;
    if (additive.acidity > 0 && substance) formulas.add(substance.formula);
  }
  formulas.add('H2O');
  formulas.add('C3H8O3');
  const steps = [...formulas].map((formula): Step => {
    const parts = [...formula.matchAll(/([A-Z][a-z]?)([0-9]*)/g)].map(([, element = '', count]) => {
      const weight = exact(reference.elements.get(element)?.value ?? Number.NaN);
      return count ? product(exact(Number(count)), weight) : weight;
    });
    const symbols = new Set([...formula.matchAll(/[A-Z][a-z]?/g)].map(([element]) => element));
    return step({
      kind: 'molar-mass',
      of: formula,
      subject: formula,
      symbol: M(formula),
      numbers: sumOf(...parts),
      value: molarMassOf(formula, working),
      digits: 8,
      unit: 'g/mol',
      sources: [
        ...new Set(
          [...symbols].flatMap((element) => {
            const record = reference.elements.get(element);
            return record ? [cited(reference, record)] : [];
          }),
        ),
      ],
    });
  });
  return { id: 'molar-masses', subject: null, steps };
}

function molarMassOf(formula: string, { reference }: Working): number {
  let mass = 0;
  for (const [, element = '', count] of formula.matchAll(/([A-Z][a-z]?)([0-9]*)/g)) {
    mass += (reference.elements.get(element)?.value ?? Number.NaN) * Number(count || 1);
  }
  return mass;
}

export const molarMassTerm = (mass: GramsPerMole | number): Term => figure(mass, 8);

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

/** Acid protons that are there before saponification. `null` where there are none. */
export function acids(working: Working): Section | null {
  const { charge, reference } = working;
  const steps = charge.additives.flatMap(({ additive, mass, at }): Step[] => {
    if (additive.acidity === 0 || !isBeforeSaponification(at)) return [];
    const record = reference.additives.get(additive.id);
    const content = record?.values.find(({ name }) => name === 'content');
    const substance = record?.substance;
    const formulaMass = substance
      ? molarMassOf(substance.formula, working) +
        (substance.crystalWater ?? 0) * reference.constants.water
      : 1;
    const protons = substance?.protons ?? 1;
    return [
      step({
        kind: 'acid-of',
        of: additive.id,
        subject: named(working, additive.id),
        symbol: symbol('n', 'acid'),
        equation: fractionOf(product(symbol('z'), symbol('m'), symbol('w')), symbol('M')),
        numbers: fractionOf(
          product(exact(protons), figure(mass), figure((additive.acidity * formulaMass) / protons)),
          figure(formulaMass, 8),
        ),
        value: mass * additive.acidity,
        unit: 'mol',
        sources: content ? [cited(reference, content)] : [],
      }),
    ];
  });
  for (const { liquid, mass, at } of charge.liquids) {
    if (liquid.acidity === 0 || !isBeforeSaponification(at)) continue;
    steps.push(
      step({
        kind: 'acid-of',
        of: liquid.id,
        subject: named(working, liquid.id),
        symbol: symbol('n', 'acid'),
        numbers: product(figure(mass), figure(liquid.acidity)),
        value: mass * liquid.acidity,
        unit: 'mol',
      }),
    );
  }
  if (steps.length === 0) return null;
  const total = step({
    kind: 'acid',
    symbol: symbol('n', 'acid'),
    numbers: sumOf(...steps.map(({ result }) => result)),
    value: working.equivalents.acid,
    unit: 'mol',
  });
  return { id: 'acids', subject: null, steps: [...steps, total] };
}

/** n(OH) = E (1 - s) + n(acid). */
export function hydroxide(working: Working): Section {
  const { equivalents, charge } = working;
  const superfat = charge.formulation.superfat;
  const kept = product(figure(equivalents.saponifiable), minus(exact(1), exact(superfat)));
  return {
    id: 'hydroxide',
    subject: null,
    steps: [
      step({
        kind: 'hydroxide',
        symbol: symbol('n', 'OH'),
        equation: sumOf(
          product(symbol('E'), minus(exact(1), symbol('s'))),
          ...(equivalents.acid > 0 ? [symbol('n', 'acid')] : []),
        ),
        numbers: equivalents.acid > 0 ? sumOf(kept, figure(equivalents.acid)) : kept,
        value: equivalents.hydroxide,
        unit: 'mol',
      }),
    ],
  };
}
