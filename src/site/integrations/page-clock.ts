import type { AstroIntegration } from 'astro';
import { measureStage } from '../../formulary/stages.ts';

/** Notes how long the pages took, from the start of Astro's work until the last page is written. */
export function pageClock(): AstroIntegration {
  let start = 0;
  return {
    name: 'page-clock',
    hooks: {
      'astro:build:start': () => {
        start = performance.now();
      },
      'astro:build:generated': () => measureStage('pages', start),
    },
  };
}
