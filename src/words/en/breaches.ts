import { expectedMass } from '../measures.ts';
import { fixed, plain } from '../numbers.ts';

type Numbers = Readonly<Record<string, number>>;

const of = (numbers: Numbers, name: string, decimals = 2) => {
  const value = numbers[name];
  return value === undefined ? '?' : fixed(value, decimals);
};

/** Why there is no number, by the rule that was left. */
const reasons: Readonly<Record<string, (numbers: Numbers) => string>> = {
  'size-too-small-for-scale': (n) =>
    `Rounding to the scale would move the superfat from ${of(n, 'written')} % to ${of(n, 'weighed')} %, by more than the ${of(n, 'allowed')} points that the shop allows. The size is too small for this scale.`,
  'weight-below-scale-step': () =>
    'One of the weights is smaller than half a step of the scale and would round to nothing.',
  'weight-above-scale-capacity': (n) =>
    `One of the weights would be ${expectedMass(n.mass ?? Number.NaN)}, more than the ${expectedMass(n.capacity ?? Number.NaN)} that the scale takes.`,
  'nothing-sure-to-saponify': () =>
    'With every error against us nothing is left in the pot that is sure to use up the alkali.',
  'scale-not-known': () => 'The shop’s data name no scale for this size.',
  'stock-weaker-than-lye': () =>
    'The stock lye already holds more water than the formula asks for. It cannot be made stronger by adding water.',
  'liquids-need-more-alkali-than-they-leave-water-for': () =>
    'The fat and acid of the liquids need more alkali than the remaining water can carry.',
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
  'losses-out-of-range': () => 'The losses set for this size leave nothing to pour.',
  'dilution-not-weaker': () => 'The dilution asked for is not weaker than the paste.',
};

/** The reason in words; a rule without its own words is named with its numbers, never passed over. */
export function breachText(rule: string, numbers: Numbers): string {
  const reason = reasons[rule];
  if (reason) return reason(numbers);
  const listed = Object.entries(numbers).map(([name, value]) => `${name} ${plain(value)}`);
  return listed.length ? `${rule} (${listed.join(', ')})` : rule;
}
