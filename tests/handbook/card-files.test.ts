import { mkdtempSync, readdirSync, rmSync, statSync, utimesSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { crc32, inflateSync } from 'node:zlib';
import { Resvg } from '@resvg/resvg-js';
import { afterAll, expect, test } from 'vitest';
import { cardFiles } from '../../src/handbook/card-files-fs.ts';
import { pruneKept } from '../../src/handbook/kept-files-fs.ts';
import { shortPath } from '../../src/handbook/short-path.ts';
import { CARD } from './card-fixture.ts';

const folder = mkdtempSync(join(tmpdir(), 'cards-'));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

test('a card is drawn once for each content', async () => {
  const first = await cardFiles(CARD, folder);
  const times = () => readdirSync(folder).map((file) => statSync(join(folder, file)).mtimeMs);
  const before = times();
  const second = await cardFiles(CARD, folder);
  expect(second.svg.equals(first.svg) && second.png.equals(first.png)).toBe(true);
  expect(times()).toEqual(before);
  await cardFiles({ ...CARD, foot: ['Revision 3'] }, folder);
  expect(readdirSync(folder)).toHaveLength(4);
});

test('what no build has asked for in sixty days goes, and what was used lately stays', async () => {
  const cache = mkdtempSync(join(tmpdir(), 'cards-'));
  const day = 24 * 60 * 60 * 1000;
  const now = Date.now();
  const age = (days: number) => {
    const then = new Date(now - days * day);
    for (const file of readdirSync(cache)) utimesSync(join(cache, file), then, then);
  };
  const { png } = await cardFiles(CARD, cache);
  writeFileSync(join(cache, 'broken.svg.123'), '<svg');
  age(59);
  pruneKept(cache, 60, now);
  expect(readdirSync(cache)).toHaveLength(3);
  age(61);
  // asked for again, the card counts as used; the rest of a broken write does not
  await cardFiles(CARD, cache);
  pruneKept(cache, 60, now);
  expect(readdirSync(cache)).toHaveLength(2);
  age(61);
  pruneKept(cache, 60, now);
  expect(readdirSync(cache)).toEqual([]);
  expect((await cardFiles(CARD, cache)).png.equals(png)).toBe(true);
  pruneKept(join(cache, 'none'), 60, now);
  rmSync(cache, { recursive: true });
});

// the chunks and their order are those of the PNG specification, third edition, clauses 5 and 11
test('the PNG is whole, in sixteen greys and of true size', async () => {
  const { png, svg } = await cardFiles(CARD, folder);
  const chunks = new Map<string, Buffer>();
  for (let at = 8; at < png.length; ) {
    const length = png.readUInt32BE(at);
    const body = png.subarray(at + 4, at + 8 + length);
    expect(png.readUInt32BE(at + 8 + length)).toBe(crc32(body));
    chunks.set(body.subarray(0, 4).toString('latin1'), body.subarray(4));
    at += 12 + length;
  }
  expect([...chunks.keys()]).toEqual(['IHDR', 'pHYs', 'IDAT', 'IEND']);
  const header = chunks.get('IHDR');
  const [width, height] = [header?.readUInt32BE(0) ?? 0, header?.readUInt32BE(4) ?? 0];
  expect([width, height, header?.[8], header?.[9]]).toEqual([1050, 1480, 4, 0]);
  // dots to the metre and unit 1: 1050 dots are 105 mm
  expect(chunks.get('pHYs')?.readUInt32BE(0)).toBe(10_000);

  const rows = inflateSync(chunks.get('IDAT') ?? Buffer.alloc(0));
  const stride = 1 + width / 2;
  expect(rows).toHaveLength(stride * height);
  const { pixels } = new Resvg(svg.toString(), {
    fitTo: { mode: 'width', value: width },
    font: { loadSystemFonts: false },
  }).render();
  let furthest = 0;
  for (let y = 0; y < height; y += 7) {
    for (let x = 0; x < width; x++) {
      const byte = rows[y * stride + 1 + (x >> 1)] ?? 0;
      const grey = 17 * (x % 2 === 0 ? byte >> 4 : byte & 15);
      furthest = Math.max(furthest, Math.abs(grey - (pixels[4 * (y * width + x)] ?? 0)));
    }
  }
  expect(furthest).toBeLessThan(9);
});

test('a short path leads through the same points to the nearest unit', () => {
  const outline =
    'M10.4 20.6L30.2 20.6Q40 25.5 30.2 40.4C1 2 3 4 5.5 6.5Z M100 100L100 100L90.7 80Z';
  const points: number[][] = [];
  let [x, y] = [0, 0];
  let start = [0, 0];
  for (const [, command, rest = ''] of shortPath(outline).matchAll(/([mlqcz])([^mlqcz]*)/g)) {
    const numbers = (rest.match(/-?\d+/g) ?? []).map(Number);
    const size = { m: 2, l: 2, q: 4, c: 6, z: 0 }[command as 'm'];
    if (command === 'z') [x = 0, y = 0] = start;
    for (let at = 0; at < numbers.length; at += size) {
      const given = numbers.slice(at, at + size).map((n, i) => n + (i % 2 === 0 ? x : y));
      points.push(given);
      [x = 0, y = 0] = given.slice(-2);
      if (command === 'm') start = [x, y];
    }
  }
  // the line that stays where it is draws nothing
  expect(points).toEqual([
    [10, 21],
    [30, 21],
    [40, 26, 30, 40],
    [1, 2, 3, 4, 6, 7],
    [100, 100],
    [91, 80],
  ]);
});
