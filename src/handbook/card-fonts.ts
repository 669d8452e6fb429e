import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import type { SatoriOptions } from 'satori';

const FIGURES = '@fontsource/barlow-semi-condensed/files/barlow-semi-condensed';
const PROSE = '@fontsource/literata/files/literata';

/** The first draws; the others lend the letters that it does not have. */
const FILES = [
  ['Figures', 400, `${FIGURES}-latin-400-normal.woff`],
  ['Figures', 600, `${FIGURES}-latin-600-normal.woff`],
  ['Figures Extended', 400, `${FIGURES}-latin-ext-400-normal.woff`],
  ['Figures Extended', 600, `${FIGURES}-latin-ext-600-normal.woff`],
  ['Vietnamese', 600, `${PROSE}-vietnamese-600-normal.woff`],
  ['Cyrillic', 600, `${PROSE}-cyrillic-600-normal.woff`],
  ['Greek', 600, `${PROSE}-greek-600-normal.woff`],
] as const;

let loaded: SatoriOptions['fonts'] | undefined;

/** The fonts of the bench cards, from the same packages as those of the pages (SIL Open Font License 1.1). */
export function cardFonts(): SatoriOptions['fonts'] {
  loaded ??= FILES.map(([name, weight, file]) => ({
    name,
    weight,
    style: 'normal',
    data: readFileSync(fileURLToPath(import.meta.resolve(file))),
  }));
  return loaded;
}
