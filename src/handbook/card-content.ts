import { gravest } from '../cautions/gravest.ts';
import { lotsInForce } from '../edition/weights-digest.ts';
import type { BatchDocument } from '../formulary/document.ts';
import type { ComputedFormula } from '../formulary/formulary.ts';
import type { Reference } from '../reference/reference.ts';
import { words } from '../words/catalogue.ts';
import { massUnit } from '../words/measures.ts';
import { splitAtPoint } from '../words/numbers.ts';
import { proofText } from './standing.ts';
import { weightsTable } from './weights.ts';

/** One weight of a card: `139` and `.7`, so that the points can stand under one another. */
export interface CardLine {
  readonly name: string;
  readonly whole: string;
  readonly rest: string;
}

export interface CardCaution {
  readonly word: string;
  readonly text: string;
  readonly action: string;
}

/** Everything that a bench card shows, as text: the weights of one size, in one unit. */
export interface CardContent {
  readonly code: string;
  readonly name: string;
  readonly label: string;
  readonly proof: string | null;
  readonly groups: readonly { readonly title: string; readonly lines: readonly CardLine[] }[];
  readonly decimals: number;
  readonly unit: string;
  /** Of the weights: what a blend is of, what a stock lye brings. */
  readonly notes: readonly string[];
  /** Gravest first; never fewer than the dangers. */
  readonly cautions: readonly CardCaution[];
  /** How many of `cautions` are dangers and must be shown. */
  readonly dangers: number;
  readonly moreCautions: number;
  readonly foot: readonly string[];
  /** Of the formula page, where the shop has an address. */
  readonly address: string | null;
}

/** Cautions that a card has room for; dangers are shown however many there are. */
const CAUTIONS = 3;

/** The content of the card for one batch, or `null` for a size that has no weights. */
export function cardContent(
  computed: ComputedFormula,
  batch: BatchDocument,
  reference: Reference,
  asOf: string,
): CardContent | null {
  if (batch.refused) return null;
  const { formula, document } = computed;
  const { groups, decimals, notes } = weightsTable(document, batch, reference);
  const { shown, more } = gravest(document, CAUTIONS);
  const { siteAddress } = reference.shop;
  return {
    code: document.code,
    name: document.name,
    label: batch.label,
    proof: proofText(formula, document, batch, asOf),
    groups: groups.map(({ title, lines }) => ({
      title,
      lines: lines.map(({ id, name, text }) => {
        const [whole, rest] = splitAtPoint(text);
        return { name: drawable(name) ? name : id, whole, rest };
      }),
    })),
    decimals,
    unit: massUnit(),
    notes,
    cautions: shown.map(({ severity, text, action }) => ({
      word: words.frame.severities[severity],
      text,
      action,
    })),
    dangers: shown.filter(({ severity }) => severity === 'danger').length,
    moreCautions: more,
    foot: footLines(computed, batch, reference, asOf),
    address: siteAddress ? `${siteAddress}formulas/${document.code}.html` : null,
  };
}

function footLines(
  { formula, document }: ComputedFormula,
  batch: BatchDocument,
  reference: Reference,
  asOf: string,
): readonly string[] {
  const text = words.cardWords;
  // alkali first, in the order of weighing
  const alkalis = new Set<string>(document.alkali.map(({ id }) => id));
  const lots = lotsInForce(formula, reference)
    .toSorted((a, b) => Number(alkalis.has(b.material)) - Number(alkalis.has(a.material)))
    .map(({ lot }) => lot);
  return [
    `${text.revision(document.revision)}, ${text.asOf(asOf)}`,
    [
      ...(document.fingerprint ? [text.fingerprint(document.fingerprint)] : []),
      ...(batch.digest ? [text.digest(batch.digest)] : []),
    ].join(', '),
    lots.length > 0 ? text.lots(lots.join(', ')) : text.noLots,
    ...(formula.concession ? [text.concession(formula.concession.by)] : []),
    ...(reference.shop.invented ? [text.invented] : []),
  ];
}

/** Whether the card's fonts have the letters; a name without them gives way to its id. */
const drawable = (text: string) =>
  /^[\p{Script=Latin}\p{Script=Greek}\p{Script=Cyrillic}\p{Nd}\p{P}\p{Zs}\p{M}°%+]*$/u.test(text);
