import { lotsInForce } from '../edition/weights-digest.ts';
import type { BatchDocument, CautionDocument, FormulaDocument } from '../formulary/document.ts';
import type { Formula } from '../formulary/formula.ts';
import type { ComputedFormula } from '../formulary/formulary.ts';
import type { Reference } from '../reference/reference.ts';
import { words } from '../words/catalogue.ts';
import { stepDigits, weight } from '../words/measures.ts';
import { lyeMass } from './amounts.ts';
import { gravestFirst } from './cautions.ts';
import { nameOf } from './names.ts';
import { type WeightsTable, weightsTable } from './weights.ts';

/** What a bench sheet prints besides the method and the words that are on every one. */
export interface BenchSheet {
  readonly table: WeightsTable;
  /** Lots that the weights were reckoned for, alkali first; and what has none. */
  readonly lots: readonly { readonly name: string; readonly text: string }[];
  readonly scales: string;
  readonly sums: string;
  readonly superfat: string | null;
  /** One sentence, and whether it must not be missed. */
  readonly heat: { readonly text: string; readonly strong: boolean };
  /** Dangers and warnings, for the front. */
  readonly grave: readonly CautionDocument[];
  readonly others: readonly CautionDocument[];
  readonly yield: readonly string[];
  readonly days: readonly string[];
  /** Much to print takes smaller type, so that the sheet stays one leaf. */
  readonly front: Density;
  readonly back: Density;
}

export type Density = 'roomy' | 'close' | 'tight' | 'dense';

/** The sheet of one batch with weights. Throws for a size that was refused: no sheet is made of it. */
export function benchSheet(
  { formula, document }: ComputedFormula,
  batch: BatchDocument,
  reference: Reference,
): BenchSheet {
  if (batch.refused) throw new RangeError(`${document.code} has no weights at ${batch.id}`);
  const table = weightsTable(document, batch, reference);
  const cautions = gravestFirst(document.cautions);
  const isGrave = ({ severity }: CautionDocument) =>
    severity === 'danger' || severity === 'warning';
  const grave = cautions.filter(isGrave);
  const others = cautions.filter((caution) => !isGrave(caution));
  const lots = lotTexts(formula, document, reference);
  return {
    table,
    lots,
    scales: scaleTexts(table, batch, reference),
    sums: sumsText(batch),
    superfat: batch.superfat
      ? words.sheetWords.weigh.superfat(batch.superfat.weighed, batch.superfat.expanded[0])
      : null,
    heat: heatText(document),
    grave,
    others,
    yield: yieldTexts(document, batch, reference),
    days: dayTexts(document),
    front: frontDensity(table, { grave, lots }),
    back: backDensity(formula, others),
  };
}

function lotTexts(formula: Formula, document: FormulaDocument, reference: Reference) {
  const { lot: withDate, noLot } = words.sheetWords.stop;
  const { lots } = reference;
  const alkalis = new Set<string>(document.alkali.map(({ id }) => id));
  const inForce = lotsInForce(formula, reference).map(({ material, lot }) => {
    const record =
      lots.alkalis.find((each) => each.alkali === material && each.lot === lot) ??
      lots.fats.find((each) => each.fat === material && each.lot === lot);
    return { material, text: record ? withDate(lot, record.retestBy) : lot };
  });
  const known = new Set(inForce.map(({ material }) => material));
  const without = [...document.alkali, ...document.fats, ...document.afterCookFats]
    .map(({ id }) => id)
    .filter((id) => !known.has(id))
    .map((id) => nameOf(reference, id));
  const named = inForce
    .toSorted((a, b) => Number(alkalis.has(b.material)) - Number(alkalis.has(a.material)))
    .map(({ material, text }) => ({ name: nameOf(reference, material), text }));
  // the same sentence for all that has none, so that it is read once
  const rest = [...new Set(without)].join(', ');
  return rest === '' ? named : [...named, { name: rest, text: noLot }];
}

function scaleTexts({ steps }: WeightsTable, { id }: BatchDocument, { shop }: Reference): string {
  const size = shop.batches.find((batch) => batch.id === id);
  const { scale } = words.sheetWords.stop;
  return shop.scales
    .filter((each) => [size?.scale, size?.fineScale].includes(each.id))
    .filter(({ step }) => steps.includes(step))
    .map(({ name, step }) => scale(name, stepDigits(step)))
    .join('; ');
}

function sumsText(batch: BatchDocument): string {
  const [lye, step] = lyeMass(batch);
  const finest = (lists: readonly (readonly { readonly step: number }[])[]) =>
    lists.flat().reduce((found, line) => Math.min(found, line.step), batch.waterStep);
  const fatStep = finest([batch.fats]);
  const allStep = finest([
    batch.fats,
    batch.afterCookFats,
    batch.alkali,
    batch.liquids,
    batch.additives,
  ]);
  return words.sheetWords.weigh.sums(
    weight(lye, step),
    weight(batch.massOfFats ?? 0, fatStep),
    weight(batch.total ?? 0, allStep),
  );
}

function heatText({ lye }: FormulaDocument): BenchSheet['heat'] {
  const text = words.sheetWords.heat;
  const { peakTemperature: peak, boilingPoint: boiling } = lye;
  if (peak === null) return { text: text.unknown, strong: true };
  const said = text.peak(peak, lye.startTemperature);
  return boiling !== null && peak >= boiling
    ? { text: `${said} ${text.boils(boiling)}`, strong: true }
    : { text: said, strong: false };
}

function yieldTexts(document: FormulaDocument, batch: BatchDocument, { shop }: Reference) {
  const text = words.sheetWords.yield;
  const size = shop.batches.find(({ id }) => id === batch.id);
  if (!batch.yield || batch.total === null) return [];
  const { poured, releasedMass } = batch.yield;
  const expected = document.kind === 'bar' ? text.expected : text.expectedVat;
  return [
    expected(poured, batch.total),
    ...(size && size.losses > 0 ? [text.losses(size.losses * 100)] : []),
    ...(size?.size.by === 'bars' ? [`${text.bars(size.size.count, size.size.wetMass)}.`] : []),
    ...(document.kind === 'bar' ? [text.released(releasedMass)] : []),
  ];
}

function dayTexts({ schedule }: FormulaDocument): readonly string[] {
  const { cut, release } = words.sheetWords.yield;
  return [
    ...(schedule.cutFromDay === null ? [] : [cut(schedule.cutFromDay)]),
    ...(schedule.releaseFromDay === null ? [] : [release(schedule.releaseFromDay)]),
  ];
}

// The bounds below were found by printing sheets and measuring: with more on a side than its bound, type of
// the next smaller step keeps the side within the shorter of A4 and Letter.

/** In rows of the table of weights. */
function frontDensity({ groups, notes }: WeightsTable, sheet: Pick<BenchSheet, 'grave' | 'lots'>) {
  const lines = groups.reduce((sum, group) => sum + group.lines.length + 0.65, 0);
  const text = 0.55 * (cautionLines(sheet.grave) + notes.length) + 0.15 * sheet.lots.length;
  return densityOf(lines + text, [13, 16.5, 21]);
}

/** In hundreds of letters of method and lines of cautions. */
function backDensity({ methodText }: Formula, others: readonly CautionDocument[]): Density {
  return densityOf(methodText.length / 100 + cautionLines(others), [11.5, 19.5, 27]);
}

const cautionLines = (cautions: readonly CautionDocument[]) =>
  cautions.reduce(
    (sum, { text, action }) => sum + Math.ceil((text.length + action.length) / 90),
    0,
  );

function densityOf(
  load: number,
  [roomy, close, tight]: readonly [number, number, number],
): Density {
  if (load <= roomy) return 'roomy';
  if (load <= close) return 'close';
  return load <= tight ? 'tight' : 'dense';
}
