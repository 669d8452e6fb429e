import { words } from '../words/catalogue.ts';
import { type Box, box, INK, PAPER, paragraph, rule, SIDE, UNITS } from './card-box.ts';
import type { CardContent } from './card-content.ts';

const PADDING = 16;
const QR = 104;

/** A whole side. Without a height it is as high as it needs to be, for measuring. */
export function sideBox(
  content: CardContent,
  blocks: readonly Box[],
  { number, of, after }: { readonly number: number; readonly of: number; readonly after: number },
  height: number | null,
): Box {
  return box(
    {
      width: SIDE.width / UNITS,
      flexDirection: 'column',
      backgroundColor: PAPER,
      color: INK,
      fontFamily: 'Figures',
      fontWeight: 400,
      ...(height === null ? {} : { height: height / UNITS }),
    },
    [
      headBox(content, number, of),
      box(
        { flexDirection: 'column', flexGrow: 1, width: '100%', padding: `0 ${PADDING}px` },
        blocks,
      ),
      footBox(content, after),
    ],
    `side-${number}`,
  );
}

function headBox({ code, name, label, proof }: CardContent, number: number, of: number): Box {
  const side = of > 1 ? [box({ fontSize: 20 }, words.cardWords.side(number, of))] : [];
  return box(
    { flexDirection: 'column', width: '100%' },
    [
      box(
        {
          flexDirection: 'column',
          width: '100%',
          padding: `9px ${PADDING}px 10px`,
          backgroundColor: INK,
          color: PAPER,
        },
        [
          box({ width: '100%', alignItems: 'flex-end', justifyContent: 'space-between' }, [
            paragraph(code, { fontSize: 34, fontWeight: 600, lineHeight: 1, flexShrink: 1 }),
            paragraph(label, {
              fontSize: 22,
              fontWeight: 600,
              lineHeight: 1.1,
              flexShrink: 1,
              marginLeft: 12,
              maxWidth: 220,
              textAlign: 'right',
            }),
            ...side,
          ]),
          paragraph(name, { fontSize: nameSize(name), width: '100%' }),
        ],
      ),
      ...(proof === null
        ? []
        : [
            box({ width: '100%', padding: `5px ${PADDING}px`, border: `3px solid ${INK}` }, [
              paragraph(proof, { fontSize: 15, fontWeight: 600, width: '100%' }),
            ]),
          ]),
    ],
    `head-${number}`,
  );
}

/** Long names are set smaller, so that they leave room for what is weighed. */
const nameSize = (name: string) => (name.length > 80 ? 14 : name.length > 36 ? 17 : 20);

function footBox({ foot, address }: CardContent, after: number): Box {
  return box(
    { flexDirection: 'column', width: '100%', padding: `6px ${PADDING}px 12px` },
    [
      rule(2),
      box({ width: '100%', paddingTop: 6, alignItems: 'flex-end' }, [
        box({ flexDirection: 'column', flexGrow: 1, flexShrink: 1, flexBasis: 0, minWidth: 0 }, [
          ...(after > 0
            ? [paragraph(words.cardWords.goesOn(after), { fontSize: 16, fontWeight: 600 })]
            : []),
          paragraph(words.cardWords.order, { fontSize: 14, fontWeight: 600, paddingBottom: 3 }),
          ...foot.map((line) => paragraph(line, { fontSize: 12, width: '100%' })),
        ]),
        ...(address === null
          ? []
          : [box({ width: QR, height: QR, marginLeft: 10, flexShrink: 0 }, [], 'qr')]),
      ]),
    ],
    'foot',
  );
}
