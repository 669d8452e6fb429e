import { fixed } from '../numbers.ts';

/** What the person who approves has to see; the shape of a pending approval without an import from the right. */
interface Pending {
  readonly formula: { readonly code: string; readonly name: string; readonly revision: number };
  readonly fingerprint: string;
  readonly stateBefore: string;
  readonly last: {
    readonly revision: number;
    readonly fingerprint: string;
    readonly by: string;
    readonly on: string;
  } | null;
  readonly moves: readonly {
    readonly part: string;
    readonly id: string;
    readonly at: string | null;
    readonly before: number | null;
    readonly after: number | null;
  }[];
}

const STATES: Readonly<Record<string, string>> = {
  approved: 'It is approved as it stands.',
  'changed-since-approval': 'It is not what was approved.',
  'review-date-passed': 'It is what was approved; the review date has passed.',
  'not-approved': 'It is not approved.',
};

const UNIT = 'g for 1000 g of fats, with published values';

/** The lines that `approve` shows before it writes: old and new weights, and whether anything else changed. */
export function approvalLines(pending: Pending): readonly string[] {
  const { formula, fingerprint, stateBefore, last, moves } = pending;
  return [
    `${formula.code} ${formula.name}, revision ${formula.revision}, fingerprint ${fingerprint}`,
    STATES[stateBefore] ?? stateBefore,
    ...(last ? sinceLast(last, fingerprint, moves) : firstTime(moves)),
  ];
}

function firstTime(moves: Pending['moves']): readonly string[] {
  return [
    `The ledger holds no approval of it. Weights (${UNIT}):`,
    ...moves.map((move) => `  ${nameOf(move).padEnd(26)} ${amount(move.after)}`),
  ];
}

function sinceLast(
  last: NonNullable<Pending['last']>,
  fingerprint: string,
  moves: Pending['moves'],
): readonly string[] {
  const before = `the approval of revision ${last.revision} by ${last.by} on ${last.on}`;
  if (last.fingerprint === fingerprint) return [`Nothing changed since ${before}.`];
  const moved = moves.filter((move) => move.before !== move.after);
  if (moved.length === 0) {
    return [
      `Since ${before} no weight changed: the difference is in the text, the limits or the data.`,
    ];
  }
  return [
    `Since ${before} (${UNIT}):`,
    `  ${''.padEnd(26)} ${'old'.padStart(10)} ${'new'.padStart(10)} ${'moved'.padStart(10)}`,
    ...moves.map((move) => {
      const { before, after } = move;
      const by = before === after ? '' : signed((after ?? 0) - (before ?? 0));
      return `  ${nameOf(move).padEnd(26)} ${amount(before)} ${amount(after)} ${by.padStart(10)}`.trimEnd();
    }),
  ];
}

const WATER: Readonly<Record<string, string>> = { water: 'water', heldBack: 'water held back' };

const nameOf = ({ part, id, at }: Pending['moves'][number]) =>
  (WATER[part] ?? id) + (at === null ? '' : ` (${at})`);

const amount = (mass: number | null) => (mass === null ? '-' : fixed(mass, 2)).padStart(10);
const signed = (mass: number) => `${mass > 0 ? '+' : ''}${fixed(mass, 2)}`;
