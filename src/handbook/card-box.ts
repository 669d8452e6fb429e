/** An element as satori takes it; `key` names the boxes that are measured. */
export interface Box {
  readonly type: 'div';
  readonly key: string | null;
  readonly props: {
    readonly style: Readonly<Record<string, string | number>>;
    readonly children?: string | readonly Box[];
  };
}

/** One side is A6, drawn in tenths of a millimetre, because words are set to whole units. */
export const SIDE = { width: 1050, height: 1480, perMillimetre: 10 } as const;

/** Lengths are written in quarters of a millimetre and drawn in the units of `SIDE`. */
export const UNITS = SIDE.perMillimetre / 4;

export const INK = '#000';
export const PAPER = '#fff';
const LENGTHS = /^(width|height|maxWidth|minWidth|flexBasis|fontSize|margin.*|padding.*|border)$/;

/** A flex box; its lengths are in quarters of a millimetre. */
export const box = (
  style: Box['props']['style'],
  children?: string | readonly Box[],
  key: string | null = null,
): Box => ({
  type: 'div',
  key,
  props: {
    style: { display: 'flex', boxSizing: 'border-box', flexShrink: 0, ...inUnits(style) },
    ...(children === undefined ? {} : { children }),
  },
});

/** Quarters of a millimetre into the drawing's units. */
const inUnits = (style: Box['props']['style']): Box['props']['style'] =>
  Object.fromEntries(
    Object.entries(style).map(([name, value]) => {
      if (!LENGTHS.test(name)) return [name, value];
      if (typeof value === 'number') return [name, value * UNITS];
      return [name, value.replaceAll(/[\d.]+(?=px)/g, (length) => String(Number(length) * UNITS))];
    }),
  );

/** Text that may run over several lines; a word longer than a line is broken. */
export const paragraph = (text: string, style: Box['props']['style']) =>
  box({ display: 'block', lineHeight: 1.18, wordBreak: 'break-word', ...style }, text);

/** A line across. */
export const rule = (height: number) => box({ width: '100%', height, backgroundColor: INK });
