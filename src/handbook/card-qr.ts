import { encode } from 'uqr';

/** Modules of white around the code, as ISO/IEC 18004 asks for (from memory). */
const QUIET_ZONE = 4;

/**
 * A QR code as the `d` of one SVG path, filling a square with its quiet zone. Runs of dark modules are one
 * rectangle each, so that no hairline shows between them.
 *
 * @param x left, in the drawing's units
 * @param y top
 * @param side of the whole square, quiet zone and all
 */
export function qrPath(text: string, x: number, y: number, side: number): string {
  const { data } = encode(text, { ecc: 'M', border: QUIET_ZONE });
  const module = side / data.length;
  const at = (value: number) => String(Number(value.toFixed(2)));
  const parts: string[] = [];
  data.forEach((row, line) => {
    let start = -1;
    for (let column = 0; column <= row.length; column++) {
      if (row[column] && start < 0) start = column;
      if (row[column] || start < 0) continue;
      const width = (column - start) * module;
      parts.push(
        `M${at(x + start * module)} ${at(y + line * module)}h${at(width)}v${at(module)}h${at(-width)}z`,
      );
      start = -1;
    }
  });
  return parts.join('');
}
