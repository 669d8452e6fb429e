import { massIn } from './balance.ts';
import type { Charge } from './charge.ts';
import { type Curve, interpolate } from './interpolate.ts';
import { type Grams, given, grams, type Outcome, refused } from './quantity.ts';

/** The four ways to say how much to make. */
export type Size =
  | { readonly by: 'fats'; readonly mass: Grams }
  | { readonly by: 'batter'; readonly mass: Grams }
  | { readonly by: 'bars'; readonly count: number; readonly wetMass: Grams }
  | { readonly by: 'mould'; readonly millilitres: number };

/**
 * Mass of fats for a batch size, from a charge of any size of the same formula. [g]
 *
 * `losses` is the fraction of what is made that stays in pots and on tools; it is added on top for sizes
 * given by what must reach the mould, not for sizes given by the fats. Mould volume is an estimate by ideal
 * mixing of densities. Refuses `losses-out-of-range` outside 0 to 0.5 and what `batterDensity` refuses.
 */
export function massOfFatsFor(
  size: Size,
  charge: Charge,
  losses: number,
  lyeDensity: Readonly<Record<'Na' | 'K', Curve>>,
): Outcome<Grams> {
  if (size.by === 'fats') return given(size.mass);
  if (!(losses >= 0 && losses <= 0.5)) return refused('losses-out-of-range', { losses });
  const fats = charge.fats.reduce((sum, { mass }) => sum + mass, 0);
  const batterPerFats = massIn(charge) / fats;
  const wanted =
    size.by === 'batter'
      ? given<number>(size.mass)
      : size.by === 'bars'
        ? given(size.count * size.wetMass)
        : batterMass(size.millilitres, charge, lyeDensity);
  if (!wanted.ok) return wanted;
  return given(grams(wanted.value / (1 - losses) / batterPerFats));
}

function batterMass(
  millilitres: number,
  charge: Charge,
  lyeDensity: Readonly<Record<'Na' | 'K', Curve>>,
): Outcome<number> {
  const density = batterDensity(charge, lyeDensity);
  return density.ok ? given(millilitres * density.value) : density;
}

/**
 * Density of the fresh batter by ideal mixing of fats and lye. [g/mL]
 *
 * An estimate: volumes are added as if nothing shrank, and additives and liquids are taken to have the
 * density of the rest. `lyeDensity` is density [g/mL] at 20 degC by mass percent of pure alkali.
 * Refuses `fat-density-not-known` and `lye-density-out-of-range`.
 */
export function batterDensity(
  charge: Charge,
  lyeDensity: Readonly<Record<'Na' | 'K', Curve>>,
): Outcome<number> {
  let mass = 0;
  let volume = 0;
  for (const { fat, mass: part } of [...charge.fats, ...charge.afterCookFats]) {
    if (fat.density === null) return refused('fat-density-not-known', { mass: part });
    mass += part;
    volume += part / fat.density;
  }
  const pure = charge.alkali.reduce((sum, { pureMass }) => sum + pureMass, 0);
  const weighed = charge.alkali.reduce((sum, { weighedMass }) => sum + weighedMass, 0);
  const lye = weighed + charge.water;
  const percent = (100 * pure) / lye;
  let lyeVolumePerGram = 0;
  for (const { supply, pureMass } of charge.alkali) {
    const density = interpolate(lyeDensity[supply.cation], percent);
    if (density === null) return refused('lye-density-out-of-range', { percent });
    lyeVolumePerGram += pureMass / pure / density;
  }
  return given((mass + lye) / (volume + lye * lyeVolumePerGram));
}
