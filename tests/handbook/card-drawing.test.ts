import { Resvg } from '@resvg/resvg-js';
import jsQr from 'jsqr';
import { describe, expect, test } from 'vitest';
import { SIDE } from '../../src/handbook/card-box.ts';
import { drawCard } from '../../src/handbook/card-drawing.ts';
import { CARD, HOSTILE, textsOf } from './card-fixture.ts';

/** A box may reach into its neighbour by what is rounded. */
const ROUNDING = 1.5;

describe.each(Object.entries({ 'a plain card': CARD, ...HOSTILE }))('%s', (_, content) => {
  const drawing = drawCard(content);

  test('no text lies on another or leaves its side', async () => {
    const texts = textsOf(await drawing);
    const { sides } = await drawing;
    const wrong: string[] = [];
    for (const [index, a] of texts.entries()) {
      const side = Math.floor(a.left / SIDE.width);
      const right = (side + 1) * SIDE.width;
      if (a.left + a.width > right + ROUNDING) wrong.push(`"${a.text}" leaves its side`);
      if (a.top < 0 || a.top + a.height > SIDE.height) wrong.push(`"${a.text}" leaves the card`);
      for (const b of texts.slice(index + 1)) {
        const across = Math.min(a.left + a.width, b.left + b.width) - Math.max(a.left, b.left);
        const down = Math.min(a.top + a.height, b.top + b.height) - Math.max(a.top, b.top);
        if (across > ROUNDING && down > ROUNDING) wrong.push(`"${a.text}" lies on "${b.text}"`);
      }
    }
    expect(wrong).toEqual([]);
    expect(texts.length).toBeGreaterThan(8 * sides);
  });

  test('every weight stands on it as often as it is to be weighed, and every danger', async () => {
    const texts = textsOf(await drawing).map(({ text }) => text);
    const wholes = content.groups.flatMap(({ lines }) => lines.map(({ whole }) => whole));
    for (const whole of wholes) {
      const printed = texts.filter((text) => text === whole).length;
      expect(printed, whole).toBe(wholes.filter((each) => each === whole).length);
    }
    for (const danger of content.cautions.slice(0, content.dangers)) {
      expect(texts.filter((text) => text === danger.text)).toHaveLength(1);
    }
  });

  test('the edges stay white below the head, as ink there would be cut off', async () => {
    const { svg, sides } = await drawing;
    const { pixels, width, height } = new Resvg(svg, {
      fitTo: { mode: 'width', value: SIDE.width * sides },
      font: { loadSystemFonts: false },
    }).render();
    expect([width, height]).toEqual([SIDE.width * sides, SIDE.height]);
    const dark = (x: number, y: number) => (pixels[4 * (y * width + x)] ?? 0) < 128;
    const proofBorder = content.proof === null ? 0 : 10;
    const headEnd = Array.from({ length: height }, (_, y) => y).find(
      (y) => !dark(3 + proofBorder, y),
    );
    const inked: string[] = [];
    for (let y = (headEnd ?? 0) + 60; y < height; y++) {
      for (const x of [8, 20, width - 9, width - 21])
        if (dark(x, y) && proofBorder === 0) inked.push(`${x},${y}`);
    }
    for (let x = 0; x < width; x++)
      if (dark(x, height - 8) && x % SIDE.width > 2 && x % SIDE.width < SIDE.width - 3)
        inked.push(`${x},end`);
    expect(inked).toEqual([]);
  });

  test('it is a picture by itself: no font, no style, no script, nothing from outside', async () => {
    const { svg } = await drawing;
    expect(svg).not.toMatch(
      /<(text|style|script|image|foreignObject|a|use)\b|style=|href|url\((?!#)|font/i,
    );
    expect(svg).not.toContain('<b>');
    expect(svg.match(/xmlns="[^"]*"/g)).toEqual(['xmlns="http://www.w3.org/2000/svg"']);
  });
});

test('a card is drawn alike twice', async () => {
  const [first, second] = [await drawCard(CARD), await drawCard(CARD)];
  expect(second.svg).toBe(first.svg);
});

test('a card that has room is one A6 side; one that has not says which side is which', async () => {
  const plain = await drawCard(CARD);
  expect(plain.sides).toBe(1);
  expect(plain.svg).toContain('width="105mm" height="148mm"');
  const many = await drawCard(HOSTILE['thirty fats'] ?? CARD);
  expect(many.sides).toBeGreaterThan(1);
  const texts = textsOf(many).map(({ text }) => text);
  for (let side = 1; side <= many.sides; side++)
    expect(texts).toContain(`${side} of ${many.sides}`);
  expect(many.svg).toContain(`width="${105 * many.sides}mm"`);
});

test('cautions stand on the first side, before anything is weighed', async () => {
  const drawing = await drawCard(HOSTILE['thirty fats'] ?? CARD);
  const caution = textsOf(drawing).find(({ text }) => text === 'It is hot.');
  const first = textsOf(drawing).find(({ text }) => text === '139');
  expect(caution?.left).toBeLessThan(SIDE.width);
  expect(caution?.top).toBeLessThan(first?.top ?? 0);
});

test('points stand under one another, whatever has digits after them', async () => {
  const ends = textsOf(await drawCard(CARD))
    .filter(({ text }) => ['139', '300', '1000'].includes(text))
    .map(({ left, width }) => Math.round(left + width));
  expect(new Set(ends).size).toBe(1);
});

// read by a decoder that has nothing to do with the encoder
test.each([
  'https://example.org/formulas/TT-001.html',
  `https://example.org/${'folder/'.repeat(20)}formulas/TT-001.html`,
])('the QR code leads to %s', async (address) => {
  const { svg } = await drawCard({ ...CARD, address });
  const { pixels, width, height } = new Resvg(svg, {
    fitTo: { mode: 'width', value: SIDE.width },
  }).render();
  expect(jsQr(new Uint8ClampedArray(pixels), width, height)?.data).toBe(address);
});
