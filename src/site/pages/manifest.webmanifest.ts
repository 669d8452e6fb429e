import type { APIRoute } from 'astro';
import { voice } from '../../words/voice.ts';
import { ICON_SIZES } from '../icon-sizes.ts';
import { siteInput } from '../input.ts';

/** What a device needs to put the handbook among its applications. Addresses are relative: it works in a sub-path. */
export const GET: APIRoute = () => {
  const { shop } = siteInput().formulary.reference;
  const manifest = {
    name: shop.name,
    short_name: shop.name,
    lang: voice().language,
    start_url: 'index.html',
    scope: './',
    display: 'minimal-ui',
    background_color: '#fafaf7',
    theme_color: '#14202b',
    icons: ICON_SIZES.map((size) => ({
      src: `icons/${size}.png`,
      sizes: `${size}x${size}`,
      type: 'image/png',
      purpose: 'any maskable',
    })),
  };
  return new Response(`${JSON.stringify(manifest, null, 2)}\n`, {
    headers: { 'Content-Type': 'application/manifest+json' },
  });
};
