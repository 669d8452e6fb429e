import type { Formulary } from '../formulary/formulary.ts';
import { csv } from './csv.ts';

/** One line per formula. Column names carry their units. */
export function formulasCsv({ formulas }: Formulary): string {
  return csv(
    [
      'code',
      'name',
      'kind',
      'process',
      'revision',
      'superfat_written_percent',
      'superfat_expanded_low_percent',
      'superfat_expanded_high_percent',
      'superfat_worst_low_percent',
      'superfat_worst_high_percent',
      'superfat_final_percent',
      'lye_concentration_percent',
      'saponification_value_mg_koh_per_g',
      'iodine_value_g_i2_per_100_g',
      'oxidisability_cox',
      'mean_chain_length_carbons',
      'saturated_percent',
      'monounsaturated_percent',
      'polyunsaturated_percent',
      'total_fatty_matter_fresh_percent',
      'total_fatty_matter_released_percent',
      'glycerol_fresh_percent',
    ],
    formulas.map(({ document }) => {
      const { superfat, profile, lye } = document;
      return [
        document.code,
        document.name,
        document.kind,
        document.process,
        document.revision,
        superfat.written,
        ...superfat.expanded,
        ...superfat.worstCase,
        superfat.final,
        lye.concentration,
        profile?.saponificationValue ?? null,
        profile?.iodineValue ?? null,
        profile?.oxidisability ?? null,
        profile?.meanChainLength ?? null,
        profile?.saturated ?? null,
        profile?.monounsaturated ?? null,
        profile?.polyunsaturated ?? null,
        document.yield.totalFattyMatter.fresh,
        document.yield.totalFattyMatter.released,
        document.yield.glycerolShare.fresh,
      ];
    }),
  );
}
