import { readDigest } from './digest-text.ts';

/** What a browser needs to tell whether a sheet may be used: digests of the edition and of those before. */
export interface SheetList {
  readonly shop: string;
  readonly edition: string;
  readonly asOf: string;
  readonly proof: boolean;
  readonly current: readonly {
    readonly code: string;
    readonly revision: number;
    readonly digests: readonly string[];
  }[];
  readonly withdrawn: readonly { readonly code: string; readonly on: string }[];
  /** Published once and not in this edition; `on` is the day of the first edition without it. */
  readonly past: readonly {
    readonly code: string;
    readonly revision: number;
    readonly digest: string;
    readonly on: string;
  }[];
}

export type SheetState =
  | { readonly state: 'current'; readonly code: string; readonly revision: number }
  | {
      readonly state: 'superseded';
      readonly code: string;
      readonly revision: number;
      /** The revision in force; the same one where only lots or settings changed; `null` where there is none. */
      readonly by: number | null;
      readonly on: string;
    }
  | { readonly state: 'withdrawn'; readonly code: string; readonly on: string }
  /** Nothing this edition knows of. */
  | { readonly state: 'unknown' }
  /** Not as it is printed: one of the two was typed wrongly, or they are of two sheets. */
  | { readonly state: 'mistyped'; readonly part: 'code' | 'digest' };

/**
 * What the code and the weights digest on a sheet say, however they were typed. A withdrawn code is
 * withdrawn whatever stands beside it; a digest counts only together with its own code.
 */
export function checkSheet(code: string, typedDigest: string, list: SheetList): SheetState {
  const wanted = bareCode(code);
  const isWanted = (entry: { readonly code: string }) => bareCode(entry.code) === wanted;
  const withdrawn = list.withdrawn.find(isWanted);
  if (withdrawn) return { state: 'withdrawn', ...withdrawn };
  const read = readDigest(typedDigest);
  if (!read.ok) return { state: 'mistyped', part: 'digest' };

  const current = list.current.find(({ digests }) => digests.includes(read.digest));
  const past = list.past.find(({ digest }) => digest === read.digest);
  const owner = current ?? past;
  if (!owner) return { state: 'unknown' };
  if (!isWanted(owner)) return { state: 'mistyped', part: 'code' };
  if (current) return { state: 'current', code: current.code, revision: current.revision };
  return {
    state: 'superseded',
    code: owner.code,
    revision: owner.revision,
    by: list.current.find(isWanted)?.revision ?? null,
    on: past?.on ?? '',
  };
}

/** A code without what is easily left out or put in: case, dashes, spaces, zeros before the number. */
const bareCode = (code: string) =>
  code
    .toUpperCase()
    .replaceAll(/[^A-Z0-9]/g, '')
    .replace(/^([A-Z]+)0+(?=\d)/, '$1');
