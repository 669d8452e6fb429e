import type { Charge } from '../../chemistry/charge.ts';
import { CLAIMS, type Claim, type MaterialLabel } from '../../reference/label.ts';
import type { Reference } from '../../reference/reference.ts';

export interface ClaimVerdict {
  readonly claim: Claim;
  /** `open`: nothing speaks against it, but the data do not know enough to say so. */
  readonly verdict: 'yes' | 'no' | 'open';
  /** Names of the materials that decide it; empty with `yes`. */
  readonly because: readonly string[];
}

interface Material {
  readonly name: string;
  readonly label: MaterialLabel;
  readonly origin: string;
  readonly palm?: boolean;
  readonly allergens: readonly string[];
}

const AGAINST: Readonly<Record<Claim, (material: Material) => boolean>> = {
  vegan: ({ origin }) => origin === 'animal',
  'palm-free': ({ palm }) => palm === true,
  'nut-free': ({ allergens }) => allergens.includes('tree nuts') || allergens.includes('peanut'),
};

/** What may be said of the ingredients, by their records. Traces from shared equipment are not in it. */
export function claims(charge: Charge, reference: Reference): readonly ClaimVerdict[] {
  const materials = materialsOf(charge, reference);
  return CLAIMS.map((claim): ClaimVerdict => {
    const named = (test: (material: Material) => boolean) => [
      ...new Set(materials.filter(test).map(({ name }) => name)),
    ];
    const against = named(AGAINST[claim]);
    if (against.length > 0) return { claim, verdict: 'no', because: against };
    const open = named(({ label }) => label.openClaims.includes(claim));
    return { claim, verdict: open.length > 0 ? 'open' : 'yes', because: open };
  });
}

/** All that goes in beside water and alkali, the fat inside a liquid too. */
function materialsOf(charge: Charge, { fats, additives, liquids }: Reference): readonly Material[] {
  return [
    ...[...charge.fats, ...charge.afterCookFats].map(({ fat }) => fats.get(fat.id)),
    ...charge.additives.map(({ additive }) => additives.get(additive.id)),
    ...charge.liquids.flatMap(({ liquid }) => [
      liquids.get(liquid.id),
      liquid.fatData ? fats.get(liquid.fatData.id) : undefined,
    ]),
  ].filter((material) => material !== undefined);
}
