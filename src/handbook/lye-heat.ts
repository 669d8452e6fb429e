import { interpolate } from '../chemistry/interpolate.ts';
import type { FormulaDocument } from '../formulary/document.ts';
import type { Reference, TableSet } from '../reference/reference.ts';
import type { TableName } from '../reference/tables.ts';
import { words } from '../words/catalogue.ts';
import { nameOf, sourceName } from './names.ts';

export interface LyeHeatRow {
  readonly name: string;
  readonly value: string;
}

/** What is known of the lye of a formula, a row each; what no table gives has no row. */
export function lyeHeatRows(
  document: FormulaDocument,
  reference: Reference,
): readonly LyeHeatRow[] {
  const { lye } = document;
  const { rows, celsius, kelvin, percent, noNumber, tableEnds } = words.lyeHeatWords;
  const [coolest] = lye.peakTemperatureSpread ?? [null];
  const peak = lye.peakTemperature;
  const allWater = lye.peakWithAllWater;
  const optional = (name: string, value: number | null, format: (value: number) => string) =>
    value === null ? [] : [{ name, value: format(value) }];
  return [
    { name: rows.start, value: celsius(lye.startTemperature) },
    { name: rows.strength, value: percent(lye.pureAsMade) },
    { name: rows.peak, value: peak === null ? noNumber : celsius(peak) },
    ...optional(rows.coolest, coolest, celsius),
    ...optional(rows.allWater, allWater, celsius),
    ...optional(rows.extra, peak === null || allWater === null ? null : peak - allWater, kelvin),
    ...optional(rows.boiling, lye.boilingPoint, celsius),
    ...optional(rows.saturationAtStart, lye.saturation.atStart, percent),
    ...optional(rows.saturationAtPeak, lye.saturation.atPeak, percent),
    ...optional(
      rows.saturationAtPeak,
      peak !== null && lye.saturation.atPeak === null ? solubilityEnds(document, reference) : null,
      tableEnds,
    ),
  ];
}

export interface LyeHeatNote {
  readonly text: string;
  /** Whether it must be read before the lye is made. */
  readonly strong: boolean;
}

/** What the numbers mean, and what to do where there is none. */
export function lyeHeatNotes(
  document: FormulaDocument,
  reference: Reference,
): readonly LyeHeatNote[] {
  const text = words.lyeHeatWords;
  const { lye, breaches } = document;
  const notes: LyeHeatNote[] = [];
  const add = (note: string, strong = false) => notes.push({ text: note, strong });
  const breach = breaches.find(({ path }) => path === 'lye.peakTemperature');
  if (breach) {
    add(words.breachText(breach.rule, breach.numbers), true);
    add(breach.rule === 'lye-heat-of-stock' ? text.ofStock : text.strongest, true);
    for (const { id } of document.alkali) {
      const sets = setsOf('heat-of-solution', id, reference);
      if (sets.some(({ points }) => points.length > 0)) continue;
      const limits = sets.flatMap(({ infiniteDilution }) => infiniteDilution ?? []);
      if (limits.length > 0) add(text.limitOnly(nameOf(reference, id), limits));
    }
  } else {
    add(text.noLoss);
    const { peakTemperature: peak, boilingPoint: boiling } = lye;
    if (peak !== null && boiling !== null && peak >= boiling) add(text.boils, true);
  }
  const { atStart } = lye.saturation;
  if (atStart !== null && lye.pureAsMade > atStart) add(text.crystals, true);
  const adds = newerAdds(document, reference);
  if (!breach && adds > 0) add(text.newerAdds(adds));
  const read = tablesRead(document, reference).map(([table, sets]) => ({
    name: text.tables[table],
    remembered: sets.filter(({ how }) => how === 'from memory').length / sets.length,
  }));
  const names = (wanted: (remembered: number) => boolean) =>
    read.filter(({ remembered }) => wanted(remembered)).map(({ name }) => name);
  const whole = names((remembered) => remembered === 1);
  const part = names((remembered) => remembered > 0 && remembered < 1);
  if (whole.length > 0) add(text.fromMemory(whole));
  if (part.length > 0) add(text.partlyFromMemory(part));
  return notes;
}

/** Sources of the tables read for this lye, with what is said of them, each once. */
export function lyeHeatSources(
  document: FormulaDocument,
  reference: Reference,
): readonly { readonly table: string; readonly sources: readonly string[] }[] {
  return tablesRead(document, reference).map(([table, sets]) => ({
    table: words.lyeHeatWords.tables[table],
    sources: [
      ...new Set(
        sets.map(({ source, at, how, note }) =>
          [`${sourceName(reference, source)}, ${at}`, words.frame.how[how], note]
            .filter((part) => part !== null)
            .join('; '),
        ),
      ),
    ],
  }));
}

type ReadTable = keyof typeof words.lyeHeatWords.tables;

/** The sets that gave the numbers of this lye; a table without a set is left out. */
function tablesRead(
  document: FormulaDocument,
  reference: Reference,
): readonly (readonly [ReadTable, readonly TableSet[]])[] {
  const { lye, alkali } = document;
  const used = (table: TableName) =>
    alkali.flatMap(({ id }) => setsOf(table, id, reference).filter((set) => set.used));
  const covering = (table: TableName) =>
    used(table).filter(({ points }) => interpolate(points, lye.pureAsMade) !== null);
  const peak = lye.peakTemperature !== null;
  const read: readonly (readonly [ReadTable, readonly TableSet[]])[] = [
    ['heat-of-solution', peak ? used('heat-of-solution') : []],
    ['heat-capacity', peak ? covering('heat-capacity') : []],
    ['boiling-point', lye.boilingPoint === null ? [] : covering('boiling-point')],
    ['solubility', lye.saturation.atStart === null ? [] : used('solubility')],
  ];
  return read.filter(([, sets]) => sets.length > 0);
}

const setsOf = (table: TableName, alkali: string, { tables }: Reference): readonly TableSet[] =>
  tables.sets[table].filter(({ solute }) => solute === alkali);

/** What the newer limit puts on top for the alkalis of the formula, the largest. [kJ/mol] */
const newerAdds = ({ alkali }: FormulaDocument, { alkalis, tables }: Reference): number =>
  Math.max(
    0,
    ...alkali.map(({ id }) => {
      const cation = alkalis.get(id)?.cation;
      return cation ? tables.lyeHeat[cation].newerSetAdds : 0;
    }),
  );

/** The highest temperature of the solubility table that is read. [degC] */
const solubilityEnds = ({ alkali }: FormulaDocument, reference: Reference): number | null =>
  alkali
    .flatMap(({ id }) => setsOf('solubility', id, reference).filter(({ used }) => used))
    .map(({ points }) => points.at(-1)?.[0] ?? null)[0] ?? null;
