import { pathToFileURL } from 'node:url';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, test } from 'vitest';
import { launch } from './launch.ts';
import { serve } from './serve.ts';

/** What somebody who got markup into a page would try. None of it may run or leave the page. */
const ATTACK = `
  <script>window.ran = 'inline script'</script>
  <script src="https://elsewhere.example/script.js"></script>
  <script src="data:text/javascript,window.ran='data script'"></script>
  <img src="https://elsewhere.example/pixel.png" alt="" onerror="window.ran = 'handler'">
  <svg onload="window.ran = 'svg handler'"></svg>
  <style>body { background: url(https://elsewhere.example/style.png) }</style>
  <link rel="stylesheet" href="https://elsewhere.example/sheet.css">
  <iframe src="https://elsewhere.example/frame.html"></iframe>
  <iframe srcdoc="<script>parent.ran = 'frame'</script>"></iframe>
  <object data="https://elsewhere.example/object.swf"></object>
  <video src="https://elsewhere.example/video.mp4"></video>
  <base href="https://elsewhere.example/">
  <form action="https://elsewhere.example/form"><button id="send">send</button></form>
`;

const site = inject('site');
let browser: Browser;
let server: Awaited<ReturnType<typeof serve>>;
beforeAll(async () => {
  browser = await launch();
  server = await serve(site, '/handbook/');
});
afterAll(async () => {
  await browser.close();
  await server.close();
});

describe.each(['http', 'file'])('the policy of a page over %s', (how) => {
  test('lets nothing of an injected attack run or reach another host', async () => {
    const base = how === 'http' ? server.origin : `${pathToFileURL(site)}/`;
    const page = await browser.newPage({ serviceWorkers: 'block' });
    const outside: string[] = [];
    // what the policy stops never gets so far as to be answered
    await page.route('https://elsewhere.example/**', (route) => {
      outside.push(route.request().url());
      return route.fulfill({ contentType: 'text/javascript', body: 'window.ran = "outside"' });
    });
    await page.addInitScript(() => {
      const refused: string[] = [];
      Object.assign(window, { refused });
      document.addEventListener('securitypolicyviolation', ({ effectiveDirective }) =>
        refused.push(effectiveDirective),
      );
    });
    await page.goto(new URL('formulas/QY-014.html', base).href);
    const seen = await page.evaluate(async (attack) => {
      const at = window as typeof window & { ran?: string; refused: string[] };
      // parsed as a page is, so that its scripts would run
      const parsed = document.createRange().createContextualFragment(attack);
      document.querySelector('main')?.append(parsed);
      const tries: Record<string, string> = {};
      const attempt = async (name: string, run: () => unknown) => {
        try {
          await run();
          tries[name] = 'ran';
        } catch {
          tries[name] = 'refused';
        }
      };
      // text run later; eval by itself would be let through here, as the debugger calls it
      setTimeout("window.ran = 'text of a timer'", 0);
      await attempt('fetch', () => fetch('https://elsewhere.example/data'));
      await attempt('wasm', () =>
        WebAssembly.instantiate(new Uint8Array([0, 97, 115, 109, 1, 0, 0, 0])),
      );
      document.getElementById('send')?.click();
      await new Promise((done) => setTimeout(done, 300));
      return { ran: at.ran, tries, refused: [...new Set(at.refused)], address: location.href };
    }, ATTACK);
    expect(seen.ran).toBeUndefined();
    expect(seen.tries).toEqual({ fetch: 'refused', wasm: 'refused' });
    expect(outside).toEqual([]);
    expect(seen.address).toContain('QY-014');
    // each of them was stopped by the policy, not by chance
    expect(seen.refused).toEqual(
      expect.arrayContaining([
        'script-src-elem',
        'script-src-attr',
        'style-src-elem',
        'img-src',
        'connect-src',
        'frame-src',
        'object-src',
        'media-src',
        'base-uri',
        'form-action',
      ]),
    );
    await page.close();
  });
});
