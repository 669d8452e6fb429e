import { plain } from '../numbers.ts';
import { numberOf as of, weightBreaches } from './weight-breaches.ts';

type Numbers = Readonly<Record<string, number>>;

/** Why there is no number, by the rule that was left. */
const reasons: Readonly<Record<string, (numbers: Numbers) => string>> = {
  ...weightBreaches,
  'scale-not-known': () => 'The shop’s data name no scale for this size.',
  'composition-not-known': (n) =>
    `The fatty acids of ${of(n, 'percentOfFats', 1)} % of the fats are not known, and half a profile is none.`,
  'iodine-value-not-known': () => 'The iodine value of one of the waxes is not known.',
  'no-lye-heat-data': () =>
    'There are no data for the heat of this lye. Take it as boiling hot: add the alkali in small portions with cooling.',
  'lye-heat-of-stock': () =>
    'The lye is diluted from a stock solution; the heat of diluting is not reckoned.',
  'lye-heat-out-of-range': () =>
    'The lye is outside the data for its heat. Take it as boiling hot: add the alkali in small portions with cooling.',
  'lye-density-out-of-range': () =>
    'The lye is outside the density data, so a volume cannot be turned into a mass.',
  'fat-density-not-known': () =>
    'The density of one of the fats is not known, so a mould volume cannot be turned into a mass.',
  'dilution-not-weaker': () => 'The dilution asked for is not weaker than the paste.',
};

/** The reason in words; a rule without its own words is named with its numbers, never passed over. */
export function breachText(rule: string, numbers: Numbers): string {
  const reason = reasons[rule];
  if (reason) return reason(numbers);
  const listed = Object.entries(numbers).map(([name, value]) => `${name} ${plain(value)}`);
  return listed.length ? `${rule} (${listed.join(', ')})` : rule;
}
