import { describe, expect, test } from 'vitest';
import { chapterHtml } from '../../../src/handbook/book/chapter-html.ts';
import { asTree, chapterByTree } from '../../support/chapter-by-tree.ts';

const chapters = new Map(
  ['safety.html', 'formulas/TT-001.html'].map((page) => [
    page,
    { page, id: page.replace('.html', '').replace('/', '-'), title: '', across: false },
  ]),
);
const chapter = { page: 'safety.html', id: 'safety', title: '', across: false };
const page = (main: string) => `<!doctype html><body><main id="content">${main}</main></body>`;
const printed = (main: string) => chapterHtml(page(main), chapter, chapters);

/** Each with all that a chapter changes, and with what it must leave alone. */
const MAINS = [
  '<h1 id="a">A &amp; B</h1><p>1 &lt; 2 <b>x</b><br>y</p>',
  '<a href="#a">here</a><a href="/safety.html">all</a><a href="/formulas/TT-001.html#w">w</a>',
  '<a href="/find.html#q=x">asks</a><a href="https://example.org/?a=1&amp;b=2">other</a>',
  '<p class="screen">no<br><span>no</span></p><div class="sizes big"><div>no</div></div><p>yes</p>',
  '<form><button>no</button></form><p hidden>no</p><p hidden="until-found">yes</p>',
  '<script>if (1 < 2) "</div>"</script><noscript><p>no</p></noscript><p>yes</p>',
  '<template><p id="t">no</p></template><details><summary>s</summary>d</details>',
  '<details open class="x"><summary>s</summary></details>',
  '<label for="f">l</label><input id="f" list="o" aria-describedby="a b"><td headers="x y"></td>',
  '<svg viewBox="0 0 9 9"><linearGradient id="g"/><path fill="url(#g)" d="M0 0h9"/></svg>',
  '<p data-pagefind-ignore data-note="keep" title=\'say "x"\'>yes</p><!-- no --><hr/>',
  '<section data-pagefind-weight="2" aria-labelledby="l"><h5>low</h5><h6>lowest</h6></section>',
];

describe('a chapter is what the tree of the page gives', () => {
  test.each(MAINS)('%s', (main) => {
    expect(asTree(printed(main))).toBe(chapterByTree(page(main), chapter, chapters));
  });
});

test('what is left out and what stays', () => {
  expect(printed('<h1 id="a">A</h1><p class="screen">s</p><p class="screens">t</p>')).toBe(
    '<h2 id="safety--a">A</h2><p class="screens">t</p>',
  );
});

test.each([
  '<p>open',
  'shut</p>',
  '<b><i>crossed</b></i>',
  '<p>1 < 2</p>',
  '<div/>',
  '<DIV></DIV>',
  '<a href="x>',
])('what a browser would only forgive is refused: %s', (main) => {
  expect(() => printed(main)).toThrow();
});

test('a page without a main is refused', () => {
  expect(() => chapterHtml('<p>x</p>', chapter, chapters)).toThrow('no <main>');
});
