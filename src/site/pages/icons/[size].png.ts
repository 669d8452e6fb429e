import { Resvg } from '@resvg/resvg-js';
import type { APIRoute } from 'astro';
import { ICON_SIZES } from '../../icon-sizes.ts';
import mark from '../../public/mark.svg?raw';

export const getStaticPaths = () => ICON_SIZES.map((size) => ({ params: { size: String(size) } }));

/** The mark of the handbook as a picture that devices may crop: no round corners, room around it. */
export const GET: APIRoute = ({ params }) => {
  const icon = mark
    .replace(' rx="4"', '')
    .replace('<path', '<path transform="translate(3.2 3.2) scale(.8)"');
  const fitTo = { mode: 'width' as const, value: Number(params.size) };
  const png = new Resvg(icon, { fitTo, font: { loadSystemFonts: false } }).render().asPng();
  return new Response(new Uint8Array(png), { headers: { 'Content-Type': 'image/png' } });
};
