import type { ListedSize, SizeLimits } from '../chemistry/any-size.ts';
import type { Formulation } from '../chemistry/charge.ts';
import type { Constants } from '../chemistry/constants.ts';
import type { Grams } from '../chemistry/quantity.ts';

/** What the core needs to reckon any size of one formula, and the names to show it with. */
export interface AnySizeData {
  readonly code: string;
  readonly formulation: Formulation;
  readonly constants: Constants;
  readonly limits: Omit<SizeLimits, 'listed'> & {
    readonly listed: readonly (ListedSize & { readonly id: string; readonly label: string })[];
  };
  /** Wet masses of bars that the shop states, each with a size that it is stated for. */
  readonly bars: readonly { readonly wetMass: Grams; readonly like: string }[];
  /** Hydroxide that the lye may hold at most, mass per mass of it and water; `null` where it is not known. */
  readonly strongestLye: number | null;
  /** A lowest superfat below this is worth a warning. [1] */
  readonly thin: number;
  readonly groups: readonly { readonly group: string; readonly title: string }[];
  readonly lines: readonly NamedLine[];
}

/** The name of a line of weights, and the lot that it was reckoned for. */
export interface NamedLine {
  readonly group: string;
  readonly id: string;
  readonly name: string;
  readonly lot: string | null;
}

declare global {
  /** Set by the data script of a formula. */
  var handbookAnySize: AnySizeData | undefined;
}
