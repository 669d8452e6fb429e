import { crc32, deflateSync } from 'node:zlib';
import { Resvg } from '@resvg/resvg-js';
import { SIDE } from './card-box.ts';

/** A dot for each unit of the drawing: 254 dpi. */
const DOTS_PER_METRE = SIDE.perMillimetre * 1000;

/**
 * A card's SVG as a PNG in sixteen greys, which is all that black type on white needs, with its true size
 * noted. The same bytes for the same SVG.
 */
export function cardPng(svg: string): Buffer {
  // a card's size is in millimetres, which the renderer reads as dots of 96 to the inch
  const width = Number(/viewBox="0 0 (\d+) /.exec(svg)?.[1]);
  const image = new Resvg(svg, {
    fitTo: { mode: 'width', value: width },
    font: { loadSystemFonts: false },
    background: '#fff',
  }).render();
  return greyPng(image.pixels, image.width, image.height);
}

/** Four bits of grey a dot, no filter; of RGBA dots only the red is read, as the cards are grey. */
function greyPng(rgba: Uint8Array, width: number, height: number): Buffer {
  const stride = 1 + Math.ceil(width / 2);
  const rows = Buffer.alloc(stride * height);
  for (let y = 0; y < height; y++) {
    for (let x = 0; x < width; x++) {
      const grey = Math.round((rgba[4 * (y * width + x)] ?? 255) / 17);
      const at = y * stride + 1 + (x >> 1);
      rows[at] = (rows[at] ?? 0) | (x % 2 === 0 ? grey << 4 : grey);
    }
  }
  const header = Buffer.alloc(13);
  header.writeUInt32BE(width, 0);
  header.writeUInt32BE(height, 4);
  header[8] = 4;
  const size = Buffer.alloc(9);
  size.writeUInt32BE(DOTS_PER_METRE, 0);
  size.writeUInt32BE(DOTS_PER_METRE, 4);
  size[8] = 1;
  return Buffer.concat([
    Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]),
    chunk('IHDR', header),
    chunk('pHYs', size),
    chunk('IDAT', deflateSync(rows, { level: 6 })),
    chunk('IEND', Buffer.alloc(0)),
  ]);
}

function chunk(type: string, data: Buffer): Buffer {
  const body = Buffer.concat([Buffer.from(type, 'latin1'), data]);
  const length = Buffer.alloc(4);
  length.writeUInt32BE(data.length);
  const check = Buffer.alloc(4);
  check.writeUInt32BE(crc32(body));
  return Buffer.concat([length, body, check]);
}
