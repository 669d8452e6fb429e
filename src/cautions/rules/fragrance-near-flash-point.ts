import { fragrancesOf } from '../fragrances.ts';
import type { CautionRule } from '../rule.ts';

/** A fragrance in a soap that is worked near its flash point. Silent where the data have none. */
export const rule: CautionRule<'fragrance-near-flash-point'> = {
  id: 'fragrance-near-flash-point',
  severity: 'danger',
  basis: { limit: 'flash-point-margin' },
  applies: (context) => {
    const margin = context.thresholds.limits['flash-point-margin'].value;
    const temperatures = Object.values(context.formula.targets).filter(({ unit }) => unit === 'C');
    const hottest = Math.max(...temperatures.map(({ max }) => max));
    return fragrancesOf(context).flatMap(({ name, flashPoint }) =>
      flashPoint !== null && hottest >= flashPoint - margin
        ? [{ materials: name, hottest, flashPoint, margin }]
        : [],
    );
  },
};
