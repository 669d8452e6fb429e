/** What the site says of itself in `kept-copy.json`. */
export interface SiteEdition {
  readonly id: string;
  /** `2026-12-01`. */
  readonly asOf: string;
  readonly proof: boolean;
  /** Digest of the list of all other files: one edition built by another program is told apart by it. */
  readonly content: string;
}

/** The copy of one edition on this device. */
export interface KeptCopy {
  readonly edition: SiteEdition;
  /** The day it was taken, by the clock of the device, `2026-12-01`. */
  readonly keptOn: string;
}

/** What a page asks the worker. */
export type Question = 'check' | 'take';

/** The copy, and what the site says now; `null` where the site could not be reached. */
export interface Checked {
  readonly held: KeptCopy | null;
  readonly site: SiteEdition | null;
}

/** The file that names the edition of a site. */
export const EDITION_FILE = 'kept-copy.json';
/** The list that every file of an edition is held against. */
export const LIST_FILE = 'sha256sums.txt';
/** The page that stands in for one that is not in the copy. */
export const NOT_KEPT = 'not-kept.html';

/** Reads `kept-copy.json`; `null` for anything else, such as the sign-in page of a network. */
export function readSiteEdition(text: string): SiteEdition | null {
  try {
    const { id, asOf, proof, content } = JSON.parse(text) as Record<string, unknown>;
    const isText = (value: unknown): value is string => typeof value === 'string' && value !== '';
    return isText(id) && isText(asOf) && isText(content) && typeof proof === 'boolean'
      ? { id, asOf, proof, content }
      : null;
  } catch {
    return null;
  }
}
