import {
  type CurrentEntry,
  type EditionDocument,
  type EditionEntry,
  PROFILE_NUMBERS,
  type ProfileSummary,
  type WithdrawnEntry,
} from './edition-document.ts';
import { hasMoved, type Move, moves, type WeightMove, weightMoves } from './weight-moves.ts';

/** What an edition has new against the one before. */
export interface EditionChanges {
  readonly since: { readonly id: string; readonly asOf: string };
  /** Not in use before; `back` where they had been withdrawn. */
  readonly added: readonly (Named & { readonly back: boolean })[];
  /** Another fingerprint. */
  readonly changed: readonly FormulaChange[];
  /** The same formula, weighed otherwise: other lots, scales or batch sizes. */
  readonly reweighed: readonly FormulaChange[];
  readonly withdrawn: readonly WithdrawnEntry[];
  /** In the edition before and not in this one at all. */
  readonly gone: readonly Named[];
}

export interface Named {
  readonly code: string;
  readonly name: string;
  readonly revision: number;
}

export interface FormulaChange extends Named {
  readonly revisionBefore: number;
  /** g for 1000 g of fats, with the lots in force at the time; all lines, also those that stayed. */
  readonly weights: readonly WeightMove[];
  /** Percent of the fats; only those that moved. */
  readonly shares: readonly Move[];
  readonly superfat: {
    readonly written: readonly [number, number];
    readonly lowestExpanded: readonly [number, number];
    readonly lowestWorstCase: readonly [number, number];
  };
  /** Only those that moved; empty where one of the two has no profile. */
  readonly profile: readonly (Move & { readonly id: keyof ProfileSummary })[];
}

/** Compares two editions of one shop. */
export function compareEditions(before: EditionDocument, after: EditionDocument): EditionChanges {
  const old = new Map(before.formulas.map((entry) => [entry.code, entry]));
  const codes = new Set(after.formulas.map(({ code }) => code));
  const pairs = after.formulas.flatMap((entry) => {
    const was = old.get(entry.code);
    return isInUse(entry) && was && isInUse(was) ? [{ was, is: entry }] : [];
  });
  const isSame = ({ was, is }: (typeof pairs)[number]) => was.fingerprint === is.fingerprint;
  return {
    since: { id: before.id, asOf: before.asOf },
    added: after.formulas.flatMap((entry) => {
      const was = old.get(entry.code);
      if (!isInUse(entry) || (was && isInUse(was))) return [];
      return [{ ...named(entry), back: was !== undefined }];
    }),
    changed: pairs.filter((pair) => !isSame(pair)).map(({ was, is }) => formulaChange(was, is)),
    reweighed: pairs
      .filter((pair) => isSame(pair) && !haveSameDigests(pair.was, pair.is))
      .map(({ was, is }) => formulaChange(was, is)),
    withdrawn: after.formulas.flatMap((entry) =>
      !isInUse(entry) && old.get(entry.code)?.state !== 'withdrawn' ? [entry] : [],
    ),
    gone: before.formulas.filter(({ code }) => !codes.has(code)).map(named),
  };
}

const isInUse = (entry: EditionEntry): entry is CurrentEntry => entry.state !== 'withdrawn';
const named = ({ code, name, revision }: Named): Named => ({ code, name, revision });

function haveSameDigests(a: CurrentEntry, b: CurrentEntry): boolean {
  const batches = new Set([...Object.keys(a.digests), ...Object.keys(b.digests)]);
  return [...batches].every((batch) => a.digests[batch] === b.digests[batch]);
}

function formulaChange(was: CurrentEntry, is: CurrentEntry): FormulaChange {
  const shares = (entry: CurrentEntry) =>
    entry.shares.map(({ id, share }) => ({ id, value: share }));
  return {
    ...named(is),
    revisionBefore: was.revision,
    weights: weightMoves(was.weights, is.weights),
    shares: moves(shares(was), shares(is)).filter(hasMoved),
    superfat: {
      written: [was.superfat.written, is.superfat.written],
      lowestExpanded: [was.superfat.expanded[0], is.superfat.expanded[0]],
      lowestWorstCase: [was.superfat.worstCase[0], is.superfat.worstCase[0]],
    },
    profile: profileMoves(was.profile, is.profile),
  };
}

function profileMoves(was: ProfileSummary | null, is: ProfileSummary | null) {
  if (!was || !is) return [];
  return PROFILE_NUMBERS.map((id) => ({ id, before: was[id], after: is[id] })).filter(hasMoved);
}
