/** Points of a table, by rising x. */
export type Curve = readonly (readonly [x: number, y: number])[];

/** Straight lines between the points of a table; `null` outside it, never extrapolated. */
export function interpolate(curve: Curve, x: number): number | null {
  for (let i = 1; i < curve.length; i++) {
    const [x0, y0] = curve[i - 1] as readonly [number, number];
    const [x1, y1] = curve[i] as readonly [number, number];
    if (x >= x0 && x <= x1) return x1 === x0 ? y0 : y0 + ((y1 - y0) * (x - x0)) / (x1 - x0);
  }
  return null;
}
