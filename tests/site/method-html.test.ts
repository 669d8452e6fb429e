import { remark } from 'remark';
import remarkDirective from 'remark-directive';
import remarkGfm from 'remark-gfm';
import { expect, test } from 'vitest';
import type { Formula } from '../../src/formulary/formula.ts';
import { methodHtml, picturesOf } from '../../src/handbook/method-html.ts';
import { BATCH, REFUSED } from './fixture.ts';

const formula = (text: string) =>
  ({
    file: 'test.md',
    targets: {
      lye: { min: 30, max: 35, unit: 'C' },
      cure: { min: 42, max: 42, unit: 'd' },
    },
    method: remark().use(remarkGfm).use(remarkDirective).parse(text),
  }) as unknown as Formula;

const html = (text: string, batch = BATCH) => methodHtml(formula(text), batch);

test('directives print the amounts of the batch, with unit and without a line break inside', () => {
  expect(html('Weigh :weight[olive] and :weight[shea].')).toBe(
    '<p>Weigh <b class="amount">1000\u00a0g</b> and <b class="amount">20.0\u00a0g</b>.</p>',
  );
  expect(html(':alkali[sodium] into :water')).toContain('139.7\u00a0g</b> into');
  expect(html(':water')).toContain('300\u00a0g');
  expect(html(':held-back')).toContain('30.4\u00a0g');
  expect(html(':temperature[lye] :time[cure]')).toContain('30 to 35\u00a0°C');
});

test('the lye is everything in its pot: 139.7 + 300 + 12.0', () => {
  expect(html(':lye')).toContain('451.7\u00a0g');
});

test('a refused batch prints no number', () => {
  expect(html(':weight[olive] :water :lye :alkali[sodium]', REFUSED)).not.toMatch(/\d/);
});

test('a directive that names nothing stops the build', () => {
  expect(() => html(':weight[lard]')).toThrow('nothing to print for :weight');
});

test('the heading of the method is left to the page, others go one level down', () => {
  expect(html('## Method\n\n1. Stir.\n\n## Watch for\n\nSteam.')).toBe(
    '\n<ol>\n<li>Stir.</li>\n</ol>\n<h3>Watch for</h3>\n<p>Steam.</p>',
  );
});

test('step numbers are kept', () => {
  expect(html('4. Stir.\n5. Pour.')).toMatch(/^<ol start="4">/);
});

test('raw HTML, scripts and strange addresses never come through', () => {
  const text =
    'a <script>alert(1)</script> <b onclick="x">b</b> [c](javascript:alert(1)) [d](data:text/html,x)';
  const out = html(`${text}\n\n<iframe src="https://example.org"></iframe>`);
  expect(out).not.toMatch(/script|onclick|iframe|javascript|data:/);
});

test('links to formulas and pictures lead to the pages', () => {
  expect(html('[see](formula:TT-002)')).toContain('href="/formulas/TT-002.html"');
  expect(html('[see](https://example.org/a)')).toContain('href="https://example.org/a"');
  const text = '![a jug](pictures/jug.png)';
  expect(html(text)).toContain('<img src="/formulas/pictures/jug.png" alt="a jug">');
  expect(picturesOf(formula(text))).toEqual(['pictures/jug.png']);
});
