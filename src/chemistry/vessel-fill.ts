/** Fresh batter weighs about this much; fats are lighter and lye heavier, and they nearly cancel. [g/mL] */
const BATTER_DENSITY = 1;

/** Volume that a mass of batter takes. An estimate for how full a vessel gets, not for filling moulds. [mL] */
export const batterVolume = (mass: number): number => mass / BATTER_DENSITY;

/** How full a vessel of `vessel` [mL] is with a mass of batter [g]. [1] */
export const vesselFill = (mass: number, vessel: number): number => batterVolume(mass) / vessel;
