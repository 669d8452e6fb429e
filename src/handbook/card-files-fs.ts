import { createHash } from 'node:crypto';
import {
  existsSync,
  mkdirSync,
  readdirSync,
  readFileSync,
  renameSync,
  rmSync,
  statSync,
  utimesSync,
  writeFileSync,
} from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { voice } from '../words/voice.ts';
import type { CardContent } from './card-content.ts';
import { drawCard } from './card-drawing.ts';
import { cardFonts } from './card-fonts.ts';
import { cardPng } from './card-png.ts';

export interface CardFiles {
  readonly svg: Buffer;
  readonly png: Buffer;
}

/** What decides how a card is drawn, besides its content and the fonts. */
const DRAWING = [
  'card-box.ts',
  'card-drawing.ts',
  'card-layout.ts',
  'card-png.ts',
  'card-qr.ts',
  'card-side.ts',
  'card-svg.ts',
  'short-path.ts',
  '../../package-lock.json',
];

let drawing: string | undefined;

/**
 * The two files of a card, drawn once for each content and kept in `folder` under the hash of all that
 * decides them: the content, the program that draws, its packages and the fonts.
 */
export async function cardFiles(content: CardContent, folder: string): Promise<CardFiles> {
  const name = createHash('sha256')
    .update(drawingHash())
    .update(JSON.stringify(voice()))
    .update(JSON.stringify(content))
    .digest('hex');
  const paths = { svg: join(folder, `${name}.svg`), png: join(folder, `${name}.png`) };
  if (existsSync(paths.svg) && existsSync(paths.png)) {
    markUsed(paths.svg);
    markUsed(paths.png);
    return { svg: readFileSync(paths.svg), png: readFileSync(paths.png) };
  }
  const { svg: text } = await drawCard(content);
  const files = { svg: Buffer.from(text), png: cardPng(text) };
  mkdirSync(folder, { recursive: true });
  keep(paths.svg, files.svg);
  keep(paths.png, files.png);
  return files;
}

const DAY = 24 * 60 * 60 * 1000;
/** A card that no build has asked for in this time is of a formula that has changed since. [ms] */
const LONGEST_UNUSED = 60 * DAY;

/**
 * Deletes the cards that no build has asked for in sixty days before `now`, and what broken writes have left. What
 * is published never depends on it: a card that is missed is drawn again, the same to the byte.
 */
export function pruneCards(folder: string, now: number): void {
  for (const name of existsSync(folder) ? readdirSync(folder) : []) {
    const path = join(folder, name);
    const used = statSync(path, { throwIfNoEntry: false })?.mtimeMs;
    if (used !== undefined && now - used > LONGEST_UNUSED) rmSync(path, { force: true });
  }
}

/** The time of a file is when it was last used, to the day: most builds then leave it alone. */
function markUsed(path: string): void {
  const now = new Date();
  if (now.getTime() - statSync(path).mtimeMs > DAY) utimesSync(path, now, now);
}

/** Under another name first, so that a broken write is never taken for a card. */
function keep(path: string, bytes: Buffer): void {
  const beside = `${path}.${process.pid}`;
  writeFileSync(beside, bytes);
  renameSync(beside, path);
}

function drawingHash(): string {
  if (drawing === undefined) {
    const hash = createHash('sha256');
    for (const file of [...DRAWING, `../words/${voice().language}/card.ts`]) {
      hash.update(readFileSync(fileURLToPath(new URL(file, import.meta.url))));
    }
    for (const { data } of cardFonts()) hash.update(new Uint8Array(data as ArrayBuffer));
    drawing = hash.digest('hex');
  }
  return drawing;
}
