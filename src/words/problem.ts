/** Something wrong in a file, as data. The text is made at the edge, from `src/words`. */
export interface Problem {
  /** Permanent id, `formula/unknown-fat` or `data/unknown-source`; every id has an entry in `src/words/en`. */
  readonly rule: string;
  readonly severity: 'error' | 'warning';
  /** Path as the user would type it, relative to the folder the command ran in where possible. */
  readonly file: string;
  /** 1-based; 1:1 where the whole file is meant. */
  readonly line: number;
  readonly column: number;
  readonly found: string;
  readonly expected: string;
  readonly advice: string;
}
