import { words } from '../words/catalogue.ts';
import { type Box, box, INK, PAPER, paragraph, rule } from './card-box.ts';
import type { CardCaution, CardContent, CardLine } from './card-content.ts';

/** How much is shown and how large; a card takes the first that fits. */
export interface CardScale {
  /** Of weights and names; 1 is 5 mm of type for a weight. */
  readonly text: number;
  readonly cautions: number;
}

/** The smallest weights are 3.9 mm (11 point), the smallest sentences 2.9 mm (8 point). */
export const SCALES: readonly CardScale[] = [
  { text: 1.2, cautions: 3 },
  { text: 1.1, cautions: 3 },
  { text: 1, cautions: 3 },
  { text: 0.9, cautions: 3 },
  { text: 0.9, cautions: 2 },
  { text: 0.8, cautions: 2 },
  { text: 0.8, cautions: 1 },
];

/** Of a card that takes several sides. */
export const SIDES_SCALE: CardScale = { text: 0.8, cautions: 3 };

/** A side's parts between its head and its foot, in order; each is measured and stays whole. */
export interface Block {
  readonly key: string;
  readonly box: Box;
  /** Of the group that a line to weigh belongs to; `null` for a caution. */
  readonly group: string | null;
}

/** What stands between head and foot: groups of weights, then cautions. */
export function blocksOf(content: CardContent, scale: CardScale): readonly Block[] {
  const shown = content.cautions.slice(0, Math.max(scale.cautions, content.dangers));
  const more = content.moreCautions + content.cautions.length - shown.length;
  const lines = content.groups.flatMap(({ title, lines }, group) =>
    lines.map((line, index) => ({
      key: `line-${group}-${index}`,
      group: title,
      box: lineBox(line, content, scale),
    })),
  );
  const cautions = shown.map((caution, index) => ({
    key: `caution-${index}`,
    group: null,
    box: cautionBox(caution, index),
  }));
  const text = words.cardWords;
  const rest = more > 0 ? text.more(more) : shown.length === 0 ? text.noCautions : null;
  const small = (key: string, text: string) => ({
    key,
    group: null,
    box: paragraph(text, { fontSize: 12, marginTop: 6, width: '100%' }),
  });
  return [
    ...lines,
    ...content.notes.map((note, index) => small(`note-${index}`, note)),
    ...cautions,
    ...(rest === null ? [] : [small('more', rest)]),
  ].map((block) => ({ ...block, box: box({ width: '100%' }, [block.box], block.key) }));
}

function lineBox({ name, whole, rest }: CardLine, content: CardContent, { text }: CardScale): Box {
  const size = 24 * text;
  const weight = { fontSize: size, fontWeight: 600, lineHeight: 1.1 };
  // room after the point, the same in every line, so that the points stand under one another
  const tail = content.decimals === 0 ? 0 : size * (0.28 + 0.54 * content.decimals);
  return box({ flexDirection: 'column', width: '100%' }, [
    box({ width: '100%', alignItems: 'flex-end', paddingTop: 3 * text, paddingBottom: 3 * text }, [
      paragraph(name, {
        flexGrow: 1,
        flexShrink: 1,
        flexBasis: 0,
        minWidth: 0,
        fontSize: 19 * text,
      }),
      box({ marginLeft: 10, ...weight }, whole),
      box({ width: tail, ...weight }, rest),
      box(
        {
          width: (8 + 6 * content.unit.length) * text,
          fontSize: 17 * text,
          lineHeight: 1.2,
          justifyContent: 'flex-end',
        },
        content.unit,
      ),
    ]),
    box({ width: '100%', height: 1, backgroundColor: '#777' }),
  ]);
}

/** The head of a group of weights, measured like a block. */
export function groupBox(title: string, continued: boolean, { text }: CardScale): Box {
  return box(
    { flexDirection: 'column', width: '100%', paddingTop: 7 * text },
    [
      paragraph(continued ? words.cardWords.continued(title) : title, {
        fontSize: 14 * text,
        fontWeight: 600,
        paddingBottom: 2,
      }),
      rule(2),
    ],
    `group-${title}`,
  );
}

function cautionBox({ word, text, action }: CardCaution, index: number): Box {
  return box({ flexDirection: 'column', width: '100%', paddingTop: index === 0 ? 8 : 5 }, [
    ...(index === 0 ? [rule(2)] : []),
    box({ width: '100%', paddingTop: index === 0 ? 6 : 0, alignItems: 'flex-start' }, [
      box(
        {
          fontSize: 13,
          fontWeight: 600,
          lineHeight: 1.18,
          padding: '1px 5px',
          marginRight: 7,
          backgroundColor: INK,
          color: PAPER,
        },
        word,
      ),
      box({ flexDirection: 'column', flexGrow: 1, flexShrink: 1, flexBasis: 0, minWidth: 0 }, [
        paragraph(text, { fontSize: 12 }),
        paragraph(action, { fontSize: 12, fontWeight: 600 }),
      ]),
    ]),
  ]);
}
