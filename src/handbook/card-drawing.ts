import satori, { type SatoriNode } from 'satori';
import { type Box, SIDE } from './card-box.ts';
import type { CardContent } from './card-content.ts';
import { cardFonts } from './card-fonts.ts';
import {
  type Block,
  blocksOf,
  type CardScale,
  groupBox,
  SCALES,
  SIDES_SCALE,
} from './card-layout.ts';
import { qrPath } from './card-qr.ts';
import { sideBox } from './card-side.ts';
import { tidySvg } from './card-svg.ts';

/** Where a box came to lie, in the drawing's units. */
export interface Placed extends Pick<SatoriNode, 'left' | 'top' | 'width' | 'height'> {
  /** Of the box, where it has a key. */
  readonly key: string | null;
  /** Of a piece of text. */
  readonly text: string | null;
}

export interface CardDrawing {
  readonly svg: string;
  readonly sides: number;
  readonly placed: readonly Placed[];
}

/** Higher than any card, so that nothing is pressed together while it is measured. */
const MEASURING_HEIGHT = 20_000;

/**
 * Draws a bench card: one A6 side where it fits by a step of `SCALES`, else as many sides beside one
 * another as it takes, each saying which it is. Text is drawn as paths, so that it looks alike everywhere.
 *
 * @throws Error where one line is higher than a whole side.
 */
export async function drawCard(content: CardContent): Promise<CardDrawing> {
  for (const scale of SCALES) {
    const measured = await measure(content, scale);
    if (measured.needed <= SIDE.height) return draw(content, [measured.all]);
  }
  return draw(content, fill(await measure(content, SIDES_SCALE), SIDES_SCALE));
}

interface Measured {
  readonly blocks: readonly Block[];
  readonly heights: ReadonlyMap<string, number>;
  /** All blocks with their heads, as they stand on one side. */
  readonly all: readonly SideBlock[];
  readonly needed: number;
}

type SideBlock = Pick<Block, 'box' | 'group' | 'key'>;

async function measure(content: CardContent, scale: CardScale): Promise<Measured> {
  const blocks = blocksOf(content, scale);
  const all = withHeads(blocks, null, scale);
  const side = sideBox(
    content,
    all.map(({ box }) => box),
    { number: 1, of: 2, after: 9 },
    null,
  );
  const { placed } = await render(side, SIDE.width, MEASURING_HEIGHT, false);
  const heights = new Map(
    placed.flatMap(({ key, height }) => (key === null ? [] : [[key, height]])),
  );
  const sum = all.reduce((total, { key }) => total + (heights.get(key) ?? 0), 0);
  const needed = sum + (heights.get('head-1') ?? 0) + (heights.get('foot') ?? 0);
  return { blocks, heights, all, needed };
}

/** Puts the head of a group before its first line; `open` is the group that the side before ended in. */
function withHeads(
  blocks: readonly Block[],
  open: string | null,
  scale: CardScale,
): readonly SideBlock[] {
  let last: string | null = null;
  return blocks.flatMap((block) => {
    if (block.group === null || block.group === last) return [block];
    const continued = last === null && block.group === open;
    last = block.group;
    return [
      {
        key: `group-${block.group}`,
        group: null,
        box: groupBox(block.group, continued, scale),
      },
      block,
    ];
  });
}

/** Deals the blocks out to sides, as many on each as fit; cautions first, so that nobody weighs without them. */
function fill(measured: Measured, scale: CardScale): readonly (readonly SideBlock[])[] {
  const { heights } = measured;
  const blocks = [
    ...measured.blocks.filter(({ group }) => group === null),
    ...measured.blocks.filter(({ group }) => group !== null),
  ];
  const room = SIDE.height - (heights.get('head-1') ?? 0) - (heights.get('foot') ?? 0);
  const heightOf = (each: readonly SideBlock[]) =>
    each.reduce((total, { key }) => total + (heights.get(key) ?? 0), 0);
  const sides: (readonly SideBlock[])[] = [];
  let open: string | null = null;
  let current: Block[] = [];
  for (const block of blocks) {
    if (heightOf(withHeads([...current, block], open, scale)) <= room) {
      current.push(block);
      continue;
    }
    if (current.length === 0)
      throw new Error(`${block.key} of a bench card is higher than the card`);
    sides.push(withHeads(current, open, scale));
    open = current.at(-1)?.group ?? null;
    current = [block];
  }
  return [...sides, withHeads(current, open, scale)];
}

async function draw(
  content: CardContent,
  sides: readonly (readonly SideBlock[])[],
): Promise<CardDrawing> {
  const toWeigh = sides.map((side) => side.filter(({ group }) => group !== null).length);
  const width = SIDE.width * sides.length;
  const boxes = sides.map((side, index) =>
    sideBox(
      content,
      side.map(({ box }) => box),
      {
        number: index + 1,
        of: sides.length,
        after: toWeigh.slice(index + 1).reduce((sum, count) => sum + count, 0),
      },
      SIDE.height,
    ),
  );
  const whole: Box = {
    type: 'div',
    key: null,
    props: { style: { display: 'flex', width, height: SIDE.height }, children: boxes },
  };
  const { svg, placed } = await render(whole, width, SIDE.height, true);
  const codes = placed
    .filter(({ key }) => key === 'qr')
    .map(({ left, top, width }) => qrPath(content.address ?? '', left, top, width));
  // where the sheet is folded or cut, for a card of several sides
  const folds = sides.slice(1).map((_, index) => `M${SIDE.width * (index + 1)} 0v${SIDE.height}`);
  const title = `${content.code} ${content.name}, ${content.label}`;
  return { svg: tidySvg(svg, { title, codes, folds, width }), sides: sides.length, placed };
}

/** For measuring alone the letters need not be drawn. */
async function render(box: Box, width: number, height: number, embedFont: boolean) {
  const placed: Placed[] = [];
  const svg = await satori(
    box as unknown as Parameters<typeof satori>[0],
    {
      width,
      height,
      fonts: cardFonts(),
      embedFont,
      onNodeDetected: ({ left, top, width, height, key, textContent }) => {
        placed.push({
          left,
          top,
          width,
          height,
          key: key === undefined || key === null ? null : String(key),
          text: textContent ?? null,
        });
      },
      onStyleError: (error: unknown) => {
        throw error;
      },
    } as Parameters<typeof satori>[1],
  );
  return { svg, placed };
}
