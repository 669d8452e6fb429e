import type { FormulaDocument } from '../formulary/document.ts';
import type { Formula } from '../formulary/formula.ts';
import type { StateInUse } from './approval.ts';
import type { LotInForce } from './weights-digest.ts';
import { sixDigits, type WeightsPerKilogram, weightsOfDocument } from './weights-per-kilogram.ts';

/** `edition.json`: what an edition holds, as plain data. Withdrawn formulas have no numbers in it. */
export interface EditionDocument {
  readonly schema: 1;
  readonly shop: string;
  /** Digest of the inputs. */
  readonly id: string;
  readonly asOf: string;
  /** Not all of it is approved: not for use. */
  readonly proof: boolean;
  readonly models: number;
  /** Sorted by code, by code point. */
  readonly formulas: readonly EditionEntry[];
}

export type EditionEntry = CurrentEntry | WithdrawnEntry;

interface Entry {
  readonly code: string;
  readonly name: string;
  readonly kind: Formula['kind'];
  readonly revision: number;
}

export interface CurrentEntry extends Entry {
  readonly state: StateInUse;
  readonly fingerprint: string;
  readonly approval: { readonly by: string; readonly on: string; readonly reviewBy: string } | null;
  /** Weights digest by batch size; `null` where a size has no weights. */
  readonly digests: Readonly<Record<string, string | null>>;
  readonly lots: readonly LotInForce[];
  /** With the lots in force; g for 1000 g of fats, to six digits. */
  readonly weights: WeightsPerKilogram;
  /** Percent of the fats. All numbers here to six digits. */
  readonly shares: readonly { readonly id: string; readonly share: number }[];
  readonly superfat: {
    readonly written: number;
    readonly expanded: readonly [number, number];
    readonly worstCase: readonly [number, number];
  };
  readonly profile: ProfileSummary | null;
}

export interface WithdrawnEntry extends Entry {
  readonly state: 'withdrawn';
  readonly withdrawn: NonNullable<Formula['withdrawn']>;
}

/** The properties that a change of an edition is told by. */
export const PROFILE_NUMBERS = [
  'saturated',
  'monounsaturated',
  'polyunsaturated',
  'saponificationValue',
  'iodineValue',
  'oxidisability',
  'meanChainLength',
] as const;
export type ProfileSummary = Readonly<Record<(typeof PROFILE_NUMBERS)[number], number>>;

/** The entry of a formula in use, from its document with digests. */
export function currentEntry(
  { approval }: Formula,
  document: FormulaDocument & { readonly fingerprint: string },
  state: CurrentEntry['state'],
  lots: readonly LotInForce[],
): CurrentEntry {
  const { code, name, kind, revision, fingerprint, profile, superfat } = document;
  return {
    code,
    name,
    kind,
    revision,
    state,
    fingerprint,
    approval: approval ? { by: approval.by, on: approval.on, reviewBy: approval.reviewBy } : null,
    digests: Object.fromEntries(document.batches.map(({ id, digest }) => [id, digest])),
    lots,
    weights: weightsOfDocument(document),
    shares: sharesByFat(document.fats),
    superfat: {
      written: superfat.written,
      expanded: ends(superfat.expanded),
      worstCase: ends(superfat.worstCase),
    },
    profile: profile
      ? (Object.fromEntries(
          PROFILE_NUMBERS.map((name) => [name, sixDigits(profile[name])]),
        ) as ProfileSummary)
      : null,
  };
}

/** A fat that stands there by itself and in a blend is one fat. */
function sharesByFat(fats: FormulaDocument['fats']): CurrentEntry['shares'] {
  const shares = new Map<string, number>();
  for (const { id, share } of fats) shares.set(id, (shares.get(id) ?? 0) + share);
  return [...shares].map(([id, share]) => ({ id, share: sixDigits(share) }));
}

const ends = ([low, high]: readonly [number, number]) => [sixDigits(low), sixDigits(high)] as const;

export function withdrawnEntry({
  code,
  name,
  kind,
  revision,
  withdrawn,
}: WithdrawnFormula): WithdrawnEntry {
  return { code, name, kind, revision, state: 'withdrawn', withdrawn };
}

/** A formula out of use, without anything that could be weighed: what its page may be made from. */
export type WithdrawnFormula = Pick<
  Formula,
  'file' | 'code' | 'name' | 'kind' | 'revision' | 'changes'
> & { readonly withdrawn: NonNullable<Formula['withdrawn']> };
