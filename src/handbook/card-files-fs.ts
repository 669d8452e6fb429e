import { createHash } from 'node:crypto';
import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { voice } from '../words/voice.ts';
import type { CardContent } from './card-content.ts';
import { drawCard } from './card-drawing.ts';
import { cardFonts } from './card-fonts.ts';
import { cardPng } from './card-png.ts';
import { keepFile, markUsed } from './kept-files-fs.ts';

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

/** Where the two files of a card are kept in `folder`: under the hash of all that decides how it looks. */
export function cardPaths(
  content: CardContent,
  folder: string,
): { readonly svg: string; readonly png: string } {
  const name = createHash('sha256')
    .update(drawingHash())
    .update(JSON.stringify(voice()))
    .update(JSON.stringify(content))
    .digest('hex');
  return { svg: join(folder, `${name}.svg`), png: join(folder, `${name}.png`) };
}

/**
 * The two files of a card, drawn once for each content and kept in `folder` under the hash of all that
 * decides them: the content, the program that draws, its packages and the fonts.
 */
export async function cardFiles(content: CardContent, folder: string): Promise<CardFiles> {
  const paths = cardPaths(content, folder);
  if (existsSync(paths.svg) && existsSync(paths.png)) {
    markUsed(paths.svg);
    markUsed(paths.png);
    return { svg: readFileSync(paths.svg), png: readFileSync(paths.png) };
  }
  const { svg: text } = await drawCard(content);
  const files = { svg: Buffer.from(text), png: cardPng(text) };
  keepFile(paths.svg, files.svg);
  keepFile(paths.png, files.png);
  return files;
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
