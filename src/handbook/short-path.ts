/**
 * The outline of letters in whole units, each point relative to the one before, which takes a third of the
 * characters. Points are rounded where they stand, so that errors do not add up.
 *
 * @param outline absolute commands M, L, Q, C and Z
 */
export function shortPath(outline: string): string {
  let [x, y] = [0, 0];
  let [startX, startY] = [0, 0];
  let before = '';
  let short = '';
  for (const [, command = '', rest = ''] of outline.matchAll(/([MLQCZ])([^MLQCZ]*)/g)) {
    if (command === 'Z') {
      short += 'z';
      [x, y] = [startX, startY];
      before = command;
      continue;
    }
    const points = [...rest.matchAll(/-?[\d.]+/g)].map(([text]) => Math.round(Number(text)));
    const moved = points.map((value, index) => value - (index % 2 === 0 ? x : y));
    [x = 0, y = 0] = points.slice(-2);
    if (command === 'M') [startX, startY] = [x, y];
    // a line that goes nowhere only closes an outline that is closed already
    if (command === 'L' && moved.every((value) => value === 0)) continue;
    short +=
      command === before ? separated(moved, true) : command.toLowerCase() + separated(moved, false);
    before = command;
  }
  return short;
}

/** A minus sign parts two numbers as well as a space does. */
function separated(values: readonly number[], follows: boolean): string {
  return values
    .map((value, index) => (value < 0 || (index === 0 && !follows) ? `${value}` : ` ${value}`))
    .join('');
}
