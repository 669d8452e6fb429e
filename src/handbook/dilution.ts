import { dilutionWater } from '../chemistry/dilution.ts';
import { fraction, grams } from '../chemistry/quantity.ts';
import type { FormulaDocument } from '../formulary/document.ts';
import { words } from '../words/catalogue.ts';
import { tableBasis } from '../words/measures.ts';

/** Soap contents that the table is made for. [%] */
const TARGETS = [40, 35, 30, 25, 20, 15] as const;
/** The paste on the scale as a part of the paste by theory; the first is theory itself. */
const WEIGHED = [1, 0.95, 0.9, 0.85] as const;

export interface DilutionTable {
  /** Per column: how heavy the paste was found, and the soap content that this gives. */
  readonly columns: readonly { readonly name: string; readonly content: string }[];
  /** Per soap content wanted: the water for the basis of the table, `null` where the paste is not stronger. */
  readonly rows: readonly {
    readonly target: string;
    readonly water: readonly (string | null)[];
  }[];
  /** What the formula adds at dilution, for the basis of the table in paste by theory; 0 for nothing. */
  readonly joins: number;
}

/**
 * Water for 1000 g of paste, or a pound, by the paste as weighed; `null` for bars. Theory is the balance: dry soap over
 * everything that went in before dilution. What joins at dilution counts as part of the water's mass.
 */
export function dilutionTable(document: FormulaDocument): DilutionTable | null {
  const paste = pasteByTheory(document);
  if (paste === null) return null;
  const text = words.dilutionWords;
  const contents = WEIGHED.map((part) => document.yield.soap / (paste * part));
  return {
    columns: WEIGHED.map((part, i) => ({
      name: text.asWeighed(part),
      content: text.soapIn(100 * (contents[i] ?? 0)),
    })),
    rows: TARGETS.map((target) => ({
      target: text.percent(target),
      water: contents.map((content) => {
        const water = dilutionWater(grams(tableBasis()), fraction(content), fraction(target / 100));
        return water.ok ? text.grams(water.value) : null;
      }),
    })).filter(({ water }) => water.some((each) => each !== null)),
    joins: (tableBasis() * joiningAtDilution(document)) / paste,
  };
}

export interface FinishedMasses {
  readonly targets: readonly string[];
  readonly sizes: readonly {
    readonly label: string;
    readonly soap: string;
    readonly theory: string;
    readonly finished: readonly string[];
  }[];
}

/** The mass that each size is brought to for each soap content, whatever its paste weighed. */
export function finishedMasses(document: FormulaDocument): FinishedMasses | null {
  const paste = pasteByTheory(document);
  if (paste === null) return null;
  const text = words.dilutionWords;
  const targets = TARGETS.filter((target) => target / 100 <= document.yield.soap / paste);
  return {
    targets: targets.map((target) => text.finished(target)),
    sizes: document.batches.flatMap(({ label, yield: given }) =>
      given === null
        ? []
        : [
            {
              label,
              soap: text.grams(given.soap),
              theory: text.grams((given.poured * paste) / document.yield.total),
              finished: targets.map((target) => text.grams(given.soap / (target / 100))),
            },
          ],
    ),
  };
}

/** Everything that goes in before dilution, for 1000 g of fats; `null` for bars. [g] */
const pasteByTheory = (document: FormulaDocument): number | null =>
  document.kind === 'bar' ? null : document.yield.total - joiningAtDilution(document);

const joiningAtDilution = ({ additives, liquids }: FormulaDocument): number =>
  [...additives, ...liquids].reduce((sum, { at, mass }) => sum + (at === 'dilution' ? mass : 0), 0);
