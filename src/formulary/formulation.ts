import type { Formulation } from '../chemistry/charge.ts';
import type { Fat } from '../chemistry/materials.ts';
import { fraction } from '../chemistry/quantity.ts';
import type { AlkaliRecord } from '../reference/material-records.ts';
import type { Reference } from '../reference/reference.ts';
import type { Formula } from './formula.ts';
import { alkaliInForce, fatInForce } from './lots.ts';

/** A formula put into the core's terms, or the ids in it that the data cannot serve. */
export type Prepared =
  | { readonly ok: true; readonly formulation: Formulation }
  | {
      readonly ok: false;
      readonly missing: readonly { readonly path: string; readonly id: string }[];
    };

/** Looks every material up, with the lots in force. Percent become fractions here and nowhere else. */
export function prepareFormulation(formula: Formula, reference: Reference): Prepared {
  const missing: { path: string; id: string }[] = [];
  const fat = (id: string, path: string): Fat[] => {
    const core = reference.fats.get(id)?.core;
    if (core) return [fatInForce(core, reference).fat];
    missing.push({ path, id });
    return [];
  };
  const found = <T>(map: ReadonlyMap<string, T>, id: string, path: string): T[] => {
    const record = map.get(id);
    if (record) return [record];
    missing.push({ path, id });
    return [];
  };
  const percent = (x: number) => fraction(x / 100);

  const formulation: Formulation = {
    process: formula.process,
    fats: formula.fats.flatMap(({ fat: id, share, blend }, i) =>
      fat(id, `fats.${i}.fat`).map((fat) => ({
        fat,
        share: percent(share),
        ...(blend !== undefined && { blend }),
      })),
    ),
    afterCookFats: formula.afterCookFats.flatMap(({ fat: id, percentOfFats }, i) =>
      fat(id, `after-cook-fats.${i}.fat`).map((fat) => ({ fat, perFats: percent(percentOfFats) })),
    ),
    alkali: alkaliShares(formula).flatMap(({ id, share }) =>
      found<AlkaliRecord>(reference.alkalis, id, 'alkali').map((record) => ({
        supply: alkaliInForce(record, reference).supply,
        share: percent(share),
      })),
    ),
    basis: formula.alkali.basis,
    superfat: percent(formula.superfat),
    water: waterRule(formula.water),
    holdBack: percent(formula.water.holdBack),
    liquids: formula.liquids.flatMap(({ liquid: id, replacesWater, at }, i) =>
      found(reference.liquids, id, `liquids.${i}.liquid`).map(({ core }) => ({
        // the fat of a milk is not from the shop's lot of that fat
        liquid: core,
        replacesWater: percent(replacesWater),
        at,
      })),
    ),
    additives: formula.additives.flatMap(({ additive: id, percentOfFats, at }, i) =>
      found(reference.additives, id, `additives.${i}.additive`).map(({ core }) => ({
        additive: core,
        perFats: percent(percentOfFats),
        at,
      })),
    ),
  };
  return missing.length > 0 ? { ok: false, missing } : { ok: true, formulation };
}

function alkaliShares({ alkali }: Formula) {
  return [
    { id: 'sodium-hydroxide', share: alkali.sodium },
    { id: 'potassium-hydroxide', share: alkali.potassium },
  ].filter(({ share }) => share > 0);
}

function waterRule({ form, value }: Formula['water']): Formulation['water'] {
  return form === 'per-alkali' ? { form, value } : { form, value: fraction(value / 100) };
}
