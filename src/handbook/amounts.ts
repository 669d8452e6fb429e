import type { BatchDocument, WeighedLine } from '../formulary/document.ts';
import type { Formula } from '../formulary/formula.ts';
import { words } from '../words/catalogue.ts';
import { stepDecimals, weighed } from '../words/measures.ts';
import { targetText } from './targets.ts';

/**
 * What a directive in a method prints: `:weight[olive]`, `:alkali[sodium]`, `:water`, `:lye`,
 * `:held-back`, `:temperature[lye]`, `:time[cure]`. Amounts are those of `batch`; without a batch, or
 * where it was refused, they print as the words `unstated`, never as a number. `null` for a directive that names
 * nothing of this formula.
 */
export function amountText(
  name: string,
  label: string,
  formula: Formula,
  batch: BatchDocument | null,
  unstated: string = words.formulaPage.noAmount,
): string | null {
  if (name === 'temperature' || name === 'time') {
    const target = formula.targets[label];
    return target ? targetText(target) : null;
  }
  const weights = batch && !batch.refused ? batch : null;
  if (!weights) return unstated;
  switch (name) {
    case 'weight':
      return lineText(
        [weights.fats, weights.afterCookFats, weights.additives, weights.liquids],
        label,
      );
    case 'alkali':
      return alkaliText(weights, `${label}-hydroxide`);
    case 'water':
      return weighed(
        (weights.weighedWater ?? 0) - (weights.weighedHeldBack ?? 0),
        weights.waterStep,
      );
    case 'held-back':
      return weighed(weights.weighedHeldBack ?? 0, weights.heldBackStep);
    case 'lye':
      return weighed(...lyeMass(weights));
    default:
      return null;
  }
}

/** A sentence that goes on "of sodium hydroxide" must not make anybody weigh a solution's mass of solid. */
function alkaliText({ alkali }: BatchDocument, id: string): string | null {
  const line = alkali.find((each) => each.id === id);
  if (!line) return null;
  const mass = weighed(line.weighedMass, line.step);
  return line.solution === undefined ? mass : words.formulaPage.stockAmount(mass, line.solution);
}

function lineText(lists: readonly (readonly WeighedLine[])[], id: string): string | null {
  const line = lists.flat().find((each) => each.id === id);
  return line ? weighed(line.weighedMass, line.step) : null;
}

/** Everything in the lye pot, to the finest step used there. */
export function lyeMass(batch: BatchDocument): [number, number] {
  const lines = [
    ...batch.alkali,
    ...[...batch.liquids, ...batch.additives].filter(({ at }) => at === 'lye'),
  ];
  const water = (batch.weighedWater ?? 0) - (batch.weighedHeldBack ?? 0);
  const mass = lines.reduce((sum, { weighedMass }) => sum + weighedMass, water);
  const finest = [batch.waterStep, ...lines.map(({ step }) => step)].sort(
    (a, b) => stepDecimals(b) - stepDecimals(a) || a - b,
  )[0];
  return [mass, finest ?? batch.waterStep];
}
