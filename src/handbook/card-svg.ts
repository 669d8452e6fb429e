import { SIDE } from './card-box.ts';
import { shortPath } from './short-path.ts';

/** What a drawing carries besides its boxes and letters. */
export interface CardExtras {
  readonly title: string;
  /** Paths of QR codes, drawn on white. */
  readonly codes: readonly string[];
  /** Paths of the lines between sides. */
  readonly folds: readonly string[];
  /** Of all sides. */
  readonly width: number;
}

/**
 * The drawing as a file of its own: true size in millimetres, a title, no masks that hide nothing,
 * short outlines. Text stays paths; nothing refers to anything outside.
 */
export function tidySvg(svg: string, { title, codes, folds, width }: CardExtras): string {
  const body = svg
    .replace(/^<svg[^>]*>/, '')
    .replace(/<\/svg>$/, '')
    .replaceAll(/<mask id="([^"]*)">.*?<\/mask>/g, (mask, id: string) =>
      svg.includes(`url(#${id})`) ? mask : '',
    )
    .replaceAll(
      /<path fill="([^"]*)" d="([MLQCZ\d. -]*)"\/>/g,
      (_, fill: string, outline: string) => `<path fill="${fill}" d="${shortPath(outline)}"/>`,
    );
  const millimetres = (units: number) => units / SIDE.perMillimetre;
  const size = `width="${millimetres(width)}mm" height="${millimetres(SIDE.height)}mm"`;
  const extras = [
    ...codes.map((path) => `<path fill="#000" d="${path}"/>`),
    ...folds.map(
      (path) =>
        `<path fill="none" stroke="#000" stroke-width="2" stroke-dasharray="15 15" d="${path}"/>`,
    ),
  ].join('');
  return `<svg xmlns="http://www.w3.org/2000/svg" ${size} viewBox="0 0 ${width} ${SIDE.height}" role="img"><title>${escaped(title)}</title>${body}${extras}</svg>\n`;
}

const escaped = (text: string) =>
  text.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;');
