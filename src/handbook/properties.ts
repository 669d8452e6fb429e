import type { FormulaDocument } from '../formulary/document.ts';
import { words } from '../words/catalogue.ts';
import { degrees, degreeUnit } from '../words/measures.ts';
import { fixed } from '../words/numbers.ts';

export interface PropertyRow {
  readonly name: string;
  /** `null` where there is no number; then `reason` says why. */
  readonly value: string | null;
  readonly unit: string;
  /** Anchor on the methods page. */
  readonly method: string;
  readonly reason: string | null;
}

/** What can be measured or derived of a formula, each with its unit and the method it comes from. */
export function propertyRows(document: FormulaDocument): readonly PropertyRow[] {
  const { profile, superfat, lye } = document;
  const names = words.propertyNames;
  const units = words.propertyUnits;
  const row = (
    name: string,
    value: number | null,
    decimals: number,
    unit: string,
    method: string,
    path = '',
  ): PropertyRow => ({
    name,
    unit,
    method,
    value: value === null ? null : fixed(value, decimals),
    reason: value === null ? reasonFor(document, path) : null,
  });
  const yields = document.yield;
  const dries = document.kind === 'bar';
  const rows = [
    row(names.superfat, superfat.written, 1, units.percent, 'alkali'),
    row(names.lyeConcentration, lye.concentration, 1, units.percent, 'water'),
    row(
      names.lyePeak,
      lye.peakTemperature === null ? null : degrees(lye.peakTemperature),
      0,
      degreeUnit(),
      'lye-heat',
      'lye.peakTemperature',
    ),
    row(
      names.saponificationValue,
      profile?.saponificationValue ?? null,
      1,
      units.mgKohPerGram,
      'saponification-value',
      'profile',
    ),
    row(
      names.iodineValue,
      profile?.iodineValue ?? null,
      1,
      units.iodine,
      'iodine-value',
      'profile',
    ),
    row(
      names.oxidisability,
      profile?.oxidisability ?? null,
      2,
      units.none,
      'oxidisability',
      'profile',
    ),
    row(
      names.bisAllylic,
      profile?.bisAllylicPositions ?? null,
      1,
      units.none,
      'bis-allylic',
      'profile',
    ),
    row(
      names.chainLength,
      profile?.meanChainLength ?? null,
      2,
      units.carbons,
      'chain-length',
      'profile',
    ),
    row(names.totalFattyMatterFresh, yields.totalFattyMatter.fresh, 1, units.percent, 'balance'),
    row(names.glycerolFresh, yields.glycerolShare.fresh, 1, units.percent, 'balance'),
    row(names.moistureFresh, yields.moisture.fresh, 1, units.percent, 'balance'),
  ];
  if (Math.abs(lye.asMade - lye.concentration) > 0.05) {
    rows.splice(2, 0, row(names.lyeAsMade, lye.asMade, 1, units.percent, 'water'));
  }
  if (dries) {
    rows.push(
      row(
        names.totalFattyMatterReleased,
        yields.totalFattyMatter.released,
        1,
        units.percent,
        'balance',
      ),
      row(names.glycerolReleased, yields.glycerolShare.released, 1, units.percent, 'balance'),
      row(names.moistureReleased, yields.moisture.released, 1, units.percent, 'balance'),
    );
  }
  return rows;
}

function reasonFor(document: FormulaDocument, path: string): string | null {
  const breach = document.breaches.find(
    (each) => each.path === path || each.path.startsWith(`${path}.`),
  );
  return breach ? words.breachText(breach.rule, breach.numbers) : null;
}
