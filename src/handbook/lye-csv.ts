import type { Formulary } from '../formulary/formulary.ts';
import { weighed } from '../words/measures.ts';
import { csv } from './csv.ts';

/**
 * What goes into the lye of every formula at one batch size: one line per thing to weigh, rounded to its
 * scale's step, in grams and as the sheets print it; a stock lye ends in `-solution`, and the water is what is added to it. A refused size has one line that names the rule and has no mass.
 */
export function lyeCsv({ formulas }: Formulary, batchId: string): string {
  const rows = formulas.flatMap(({ document }) => {
    const batch = document.batches.find(({ id }) => id === batchId);
    if (!batch) return [];
    const start = [document.code, document.name, document.revision, batchId] as const;
    if (batch.refused) return [[...start, null, null, null, null, batch.refused.rule]];
    const heldBack = batch.weighedHeldBack ?? 0;
    const lines: (readonly [string, number, number])[] = batch.alkali.map(
      ({ id, weighedMass, step }) => {
        const isStock = document.alkali.some((line) => line.id === id && line.form === 'solution');
        return [isStock ? `${id}-solution` : id, weighedMass, step];
      },
    );
    if (batch.weighedWater !== null) {
      // the difference of two whole numbers of steps, without the last bits of the subtraction
      const inLye = Number((batch.weighedWater - heldBack).toPrecision(12));
      lines.push(['water', inLye, batch.waterStep]);
    }
    if (heldBack > 0) lines.push(['water-held-back', heldBack, batch.heldBackStep]);
    for (const { id, weighedMass, step, at } of [...batch.liquids, ...batch.additives]) {
      if (at === 'lye') lines.push([id, weighedMass, step]);
    }
    return lines.map(([id, mass, step]) => [...start, id, mass, step, printed(mass, step), null]);
  });
  return csv(
    [
      'code',
      'name',
      'revision',
      'batch',
      'material',
      'weighed_mass_g',
      'step_g',
      'as_printed',
      'refused',
    ],
    rows,
  );
}

const printed = (mass: number, step: number) => weighed(mass, step).replaceAll('\u00a0', ' ');
