import type { Formulary } from '../formulary/formulary.ts';
import { csv } from './csv.ts';

/** One line per fat of the reference data with the values used and their sources. */
export function fatsCsv({ reference }: Formulary): string {
  return csv(
    [
      'id',
      'name',
      'inci',
      'kind',
      'origin',
      'saponification_value_mg_koh_per_g',
      'saponification_value_low',
      'saponification_value_high',
      'saponification_value_source',
      'saponification_value_how',
      'iodine_value_g_i2_per_100_g',
      'unsaponifiable_fraction',
      'composition_source',
    ],
    [...reference.fats.values()].map(({ core, chosen, ...fat }) => [
      fat.id,
      fat.name,
      fat.inci,
      fat.kind,
      fat.origin,
      core?.saponificationValue.value ?? null,
      core?.saponificationValue.low ?? null,
      core?.saponificationValue.high ?? null,
      chosen.saponificationValue?.source ?? null,
      chosen.saponificationValue?.how ?? null,
      core?.iodineValue ?? null,
      core?.unsaponifiable ?? null,
      chosen.composition?.source ?? null,
    ]),
  );
}
