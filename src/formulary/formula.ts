import type { Root } from 'mdast';
import type { Stage } from '../chemistry/materials.ts';

/** One formula file, read and checked on its own: ids are known, shares sum, water is stated once. */
export interface Formula {
  readonly file: string;
  readonly code: string;
  readonly name: string;
  readonly kind: 'bar' | 'paste' | 'liquid';
  readonly process: 'cold' | 'hot';
  readonly revision: number;
  readonly summary: string | null;
  /** Percent; they sum to 100. A blend stands here as its parts, each with the blend's id beside it. */
  readonly fats: readonly {
    readonly fat: string;
    readonly share: number;
    readonly blend?: string;
  }[];
  readonly afterCookFats: readonly { readonly fat: string; readonly percentOfFats: number }[];
  /** Percent of each alkali; `basis` matters only where both are there. */
  readonly alkali: {
    readonly sodium: number;
    readonly potassium: number;
    readonly basis: 'moles' | 'mass';
  };
  /** Percent. */
  readonly superfat: number;
  readonly water: {
    readonly form: 'lye-concentration' | 'per-alkali' | 'percent-of-fats';
    readonly value: number;
    /** Percent of the water to add. */
    readonly holdBack: number;
  };
  readonly liquids: readonly {
    readonly liquid: string;
    readonly replacesWater: number;
    readonly at: Stage;
  }[];
  readonly additives: readonly {
    readonly additive: string;
    readonly percentOfFats: number;
    readonly at: Stage;
  }[];
  /** Soap made before that may be worked in, at most. Percent of the batter; `null`: the shop's cap alone. */
  readonly rework: number | null;
  readonly targets: {
    /** `fats`, `lye`, `combine`, `unmould`, `cure`, `cook`: what the file says, parsed with its unit. */
    readonly [name: string]: {
      readonly min: number;
      readonly max: number;
      readonly unit: 'C' | 'h' | 'd' | 'min';
    };
  };
  readonly release: {
    readonly freeAlkali: number | null;
    readonly ph: readonly [number, number] | null;
    readonly moisture: number | null;
  };
  /** Batch ids; `null` takes all of the shop's that suit the kind. */
  readonly batches: readonly string[] | null;
  readonly tags: readonly string[];
  readonly changes: readonly {
    readonly revision: number;
    readonly on: string;
    readonly note: string;
  }[];
  readonly approval: {
    readonly by: string;
    readonly on: string;
    readonly reviewBy: string;
    readonly fingerprint: string;
  } | null;
  readonly concession: { readonly reason: string; readonly by: string; readonly on: string } | null;
  /** Taken out of use: the handbook says so and gives no weights. */
  readonly withdrawn: { readonly on: string; readonly reason: string; readonly by: string } | null;
  /** The Markdown after the frontmatter, as mdast with positions in the file; directives are `textDirective` nodes. */
  readonly method: Root;
  readonly methodText: string;
  /** 1-based places of frontmatter paths (`fats.0.share`), for problems found later. */
  readonly places: ReadonlyMap<string, { readonly line: number; readonly column: number }>;
}
