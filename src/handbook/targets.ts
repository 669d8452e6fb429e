import type { Formula } from '../formulary/formula.ts';
import { words } from '../words/catalogue.ts';
import { degrees, degreeUnit } from '../words/measures.ts';
import { fromTo, plain, range } from '../words/numbers.ts';

export interface TargetRow {
  readonly id: string;
  readonly name: string;
  readonly value: string;
}

/** `35 to 40 °C`, with spaces that do not break. */
export function targetText({ min, max, unit }: Formula['targets'][string]): string {
  const isTemperature = unit === 'C';
  const shown = (value: number) => plain(isTemperature ? degrees(value) : value, 1);
  const of = isTemperature ? degreeUnit() : words.formulaPage.targets.units[unit];
  return `${fromTo(shown(min), shown(max))}\u00a0${of}`;
}

/** What to aim at while making, in the order of the file. */
export function targetRows({ targets }: Formula): readonly TargetRow[] {
  const { names } = words.formulaPage.targets;
  return Object.entries(targets).map(([id, target]) => ({
    id,
    name: names[id] ?? id,
    value: targetText(target),
  }));
}

/** What a batch must meet before it leaves the shop. */
export function releaseRows({ release }: Formula): readonly TargetRow[] {
  const text = words.formulaPage.targets;
  const rows: TargetRow[] = [];
  if (release.freeAlkali !== null) {
    const value = `${plain(release.freeAlkali)} ${text.freeAlkaliUnit}`;
    rows.push({ id: 'free-alkali', name: text.freeAlkali, value });
  }
  if (release.ph) rows.push({ id: 'ph', name: text.ph, value: range(...release.ph, 1) });
  if (release.moisture !== null) {
    rows.push({ id: 'moisture', name: text.moisture, value: `${plain(release.moisture)} %` });
  }
  return rows;
}
