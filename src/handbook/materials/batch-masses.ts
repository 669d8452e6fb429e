import type { BatchDocument, FormulaDocument } from '../../formulary/document.ts';

/** Stands in for the id of the water that is weighed in. */
export const WATER = 'water';

export interface MaterialMass {
  readonly id: string;
  readonly mass: number;
}

/**
 * What one batch takes of each material, each once. [g] Empty where the batch was refused. Fats that are
 * weighed together as one blend are given by their shares.
 */
export function batchMasses(
  document: FormulaDocument,
  batch: BatchDocument,
): readonly MaterialMass[] {
  if (batch.refused) return [];
  const lines = [
    ...fatMasses(document, batch),
    ...[...batch.afterCookFats, ...batch.alkali, ...batch.liquids, ...batch.additives].map(
      ({ id, weighedMass }) => ({ id, mass: weighedMass }),
    ),
    { id: WATER, mass: batch.weighedWater ?? 0 },
  ];
  const sums = new Map<string, number>();
  for (const { id, mass } of lines) sums.set(id, (sums.get(id) ?? 0) + mass);
  return [...sums].map(([id, mass]) => ({ id, mass })).filter(({ mass }) => mass > 0);
}

function fatMasses({ fats }: FormulaDocument, batch: BatchDocument): readonly MaterialMass[] {
  const singly =
    fats.length === batch.fats.length && fats.every(({ id }, i) => batch.fats[i]?.id === id);
  if (singly) return batch.fats.map(({ id, weighedMass }) => ({ id, mass: weighedMass }));
  const whole = fats.reduce((sum, { mass }) => sum + mass, 0);
  return fats.map(({ id, mass }) => ({ id, mass: (mass / whole) * (batch.massOfFats ?? 0) }));
}
