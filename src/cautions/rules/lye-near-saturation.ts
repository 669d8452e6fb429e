import { interpolate } from '../../chemistry/interpolate.ts';
import { type CautionRule, RECKONED } from '../rule.ts';

/**
 * The lye holds nearly as much hydroxide as dissolves at the shop's start temperature. Of a mixed lye the
 * less soluble alkali decides. Silent where the tables have no solubility at that temperature.
 */
export const rule: CautionRule<'lye-near-saturation'> = {
  id: 'lye-near-saturation',
  severity: 'warning',
  basis: RECKONED,
  applies: ({ document, charge, reference, thresholds }) => {
    const temperature = reference.shop.startTemperature;
    const margin = thresholds.limits['saturation-margin'].value;
    const percent = document.lye.pureAsMade;
    const saturation = Math.min(
      ...charge.alkali.flatMap(
        ({ supply }) =>
          interpolate(reference.tables.lyeHeat[supply.cation].saturation, temperature) ?? [],
      ),
    );
    if (percent < saturation - margin) return [];
    return [{ percent, saturation, temperature, margin }];
  },
};
