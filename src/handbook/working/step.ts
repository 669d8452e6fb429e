import type { workingWords } from '../../words/en/working.ts';
import { voice } from '../../words/voice.ts';
import { evaluate, figure, type Term } from './term.ts';

/** One line of the working: what it is, the equation in symbols, with its numbers, and the result. */
export interface Step {
  /** Anchor, unique on the page. */
  readonly id: string;
  /** What the line reckons; its words are in `src/words/en/working.ts`. */
  readonly kind: StepKind;
  /** The left side of the equation. */
  readonly symbol: Term;
  /** In symbols; `null` where the line is a value that is only looked up. */
  readonly equation: Term | null;
  readonly numbers: Term;
  readonly result: Term;
  readonly unit: string;
  /** The result as the shop's sheets print it, where they print it in another unit. */
  readonly printed: string | null;
  /** Materials or pieces that the line is about, as names for people. */
  readonly subject: string | null;
  /** Where the numbers that were looked up come from, in words. */
  readonly sources: readonly string[];
}

export type StepKind = keyof typeof workingWords.steps;

/** A heading of the working and its steps; headings are ids of `src/words/en/working.ts`. */
export interface Section {
  readonly id: SectionId;
  /** The batch size, where the section is about one. */
  readonly subject: string | null;
  readonly steps: readonly Step[];
}

export type SectionId = keyof typeof workingWords.sections;

/** What rounding the printed numbers may do to a result, beside half a unit of the result's own last digit. */
const RELATIVE = 5e-5;
/** Numbers are printed with twelve decimals at most; products of them that are smaller than this are nothing. */
const NOTHING = 1e-11;

/**
 * A step whose printed numbers give its printed result. Throws a RangeError where they do not: a page that an
 * auditor could not follow is not written.
 */
export function step(parts: {
  readonly kind: StepKind;
  /** What tells two lines of one kind apart, for the anchor. */
  readonly of?: string;
  readonly symbol: Term;
  readonly equation?: Term;
  readonly numbers: Term;
  readonly value: number;
  readonly digits?: number;
  readonly unit: string;
  readonly printed?: string;
  readonly subject?: string;
  readonly sources?: readonly string[];
  /** Absolute allowance for results near zero, in the unit of the result. */
  readonly within?: number;
}): Step {
  const { kind, of, value, digits = 6, within = 0 } = parts;
  const id = of ? `${kind}-${of}` : kind;
  const result = figure(value, digits);
  const found = evaluate(parts.numbers);
  const allowed = Math.max(Math.abs(value) * RELATIVE, within, NOTHING);
  if (!(Math.abs(found - evaluate(result)) <= allowed + lastDigit(result) / 2)) {
    throw new RangeError(`Working ${id}: the printed numbers give ${found}, not ${value}`);
  }
  return {
    id,
    kind,
    symbol: parts.symbol,
    equation: parts.equation ?? null,
    numbers: parts.numbers,
    result,
    unit: parts.unit,
    printed: parts.printed && voice().units === 'us' ? parts.printed : null,
    subject: parts.subject ?? null,
    sources: parts.sources ?? [],
  };
}

/** One unit of the last digit that a number is printed with. */
function lastDigit(term: Term): number {
  const decimals = term.is === 'number' ? (term.text.split('.')[1]?.length ?? 0) : 0;
  return 10 ** -decimals;
}
