import { expectedMass } from '../measures.ts';
import { fixed } from '../numbers.ts';

type Numbers = Readonly<Record<string, number>>;

/** One of the numbers of a breach, as it is shown. */
export const numberOf = (numbers: Numbers, name: string, decimals = 2) => {
  const value = numbers[name];
  return value === undefined ? '?' : fixed(value, decimals);
};

/** Why a size has no weights, by the rule that was left. Apart from the others, as scripts of pages say these too. */
export const weightBreaches: Readonly<Record<string, (numbers: Numbers) => string>> = {
  'size-too-small-for-scale': (n) =>
    `Rounding to the scale would move the superfat from ${numberOf(n, 'written')} % to ${numberOf(n, 'weighed')} %, by more than the ${numberOf(n, 'allowed')} points that the shop allows. The size is too small for this scale.`,
  'weight-below-scale-step': () =>
    'One of the weights is smaller than half a step of the scale and would round to nothing.',
  'weight-above-scale-capacity': (n) =>
    `One of the weights would be ${expectedMass(n.mass ?? Number.NaN)}, more than the ${expectedMass(n.capacity ?? Number.NaN)} that the scale takes.`,
  'nothing-sure-to-saponify': () =>
    'With every error against us nothing is left in the pot that is sure to use up the alkali.',
  'stock-weaker-than-lye': () =>
    'The stock lye already holds more water than the formula asks for. It cannot be made stronger by adding water.',
  'liquids-need-more-alkali-than-they-leave-water-for': () =>
    'The fat and acid of the liquids need more alkali than the remaining water can carry.',
  'losses-out-of-range': () => 'The losses set for this size leave nothing to pour.',
};
