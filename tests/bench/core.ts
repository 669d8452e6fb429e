/**
 * How many formulas the core reckons per second on one core: six fats, the superfat margin and three batch
 * sizes with rounding and their own margins. The floor, in the same run, is the bare arithmetic of the same
 * weights: one sum over six fats and one division, three times. Run with `npm run bench`.
 */
import { performance } from 'node:perf_hooks';
import type { Formulation } from '../../src/chemistry/charge.ts';
import { superfatMargin } from '../../src/chemistry/margin.ts';
import { fraction, type Grams, grams } from '../../src/chemistry/quantity.ts';
import { reckon } from '../../src/chemistry/reckon.ts';
import { weigh } from '../../src/chemistry/weigh.ts';
import { alkali, CONSTANTS, fat, formulation } from '../support/materials.ts';
import { givenValue } from '../support/outcome.ts';

const SHARES = [0.4, 0.25, 0.15, 0.1, 0.05, 0.05];
const VALUES = [190, 256.5, 177.5, 199.5, 181.5, 191];
const SIZES = [grams(1000), grams(5450), grams(9800)];

const sixFats: Formulation = formulation({
  fats: VALUES.map((value, i) => ({
    fat: fat(`fat-${i}`, { value, low: value - 6, high: value + 6 }),
    share: fraction(SHARES[i] ?? 0),
  })),
  alkali: [{ supply: alkali('Na', 0.985, { low: 0.982, high: 0.988 }), share: fraction(1) }],
});
const scale = (mass: Grams) =>
  mass <= 2000 ? { step: grams(0.1), error: grams(0.2) } : { step: grams(1), error: grams(1) };

function oneFormula(): number {
  const charge = reckon(sixFats, grams(1000), CONSTANTS);
  if (!charge.ok) throw new Error(charge.breach.rule);
  let check = givenValue(superfatMargin(charge.value, CONSTANTS)).expanded.low;
  for (const size of SIZES) {
    const scaled = reckon(sixFats, size, CONSTANTS);
    if (!scaled.ok) throw new Error(scaled.breach.rule);
    const weighed = weigh(scaled.value, scale, 0.003, CONSTANTS);
    if (!weighed.ok) throw new Error(weighed.breach.rule);
    const { charge: rounded, weighing } = weighed.value;
    check += givenValue(superfatMargin(rounded, CONSTANTS, weighing)).expanded.low;
  }
  return check;
}

function floor(): number {
  let check = 0;
  for (const size of SIZES) {
    let equivalents = 0;
    for (let i = 0; i < VALUES.length; i++) {
      equivalents += (size * (SHARES[i] ?? 0) * (VALUES[i] ?? 0)) / 56105;
    }
    check += Math.floor((equivalents * 0.95 * 39.997) / 0.985 / 0.1) * 0.1;
  }
  return check;
}

function perSecond(work: () => number, seconds: number): number {
  let check = 0;
  for (let i = 0; i < 2000; i++) check += work();
  let count = 0;
  const start = performance.now();
  while (performance.now() - start < seconds * 1000) {
    for (let i = 0; i < 500; i++) check += work();
    count += 500;
  }
  if (Number.isNaN(check)) throw new Error('the work gave no number');
  return count / ((performance.now() - start) / 1000);
}

const core = perSecond(oneFormula, 3);
const bare = perSecond(floor, 1);
console.log(`core   ${Math.round(core)} formulas per second (aim: 20000)`);
console.log(
  `floor  ${Math.round(bare)} bare sums per second, ${Math.round(bare / core)} times the core`,
);
