import type { GramsPerMole } from '../../chemistry/quantity.ts';
import { cited, type Working } from './context.ts';
import { type Section, type Step, step } from './step.ts';
import { exact, figure, product, sumOf, symbol, type Term } from './term.ts';

const M = (of: string) => symbol('M', of);

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

export function molarMassOf(formula: string, { reference }: Working): number {
  let mass = 0;
  for (const [, element = '', count] of formula.matchAll(/([A-Z][a-z]?)([0-9]*)/g)) {
    mass += (reference.elements.get(element)?.value ?? Number.NaN) * Number(count || 1);
  }
  return mass;
}

export const molarMassTerm = (mass: GramsPerMole | number): Term => figure(mass, 8);
