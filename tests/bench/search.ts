/**
 * Speed and size of the find page with many formulas, in Chromium over http and from a disk:
 * `node tests/bench/search.ts [built site] [formulas]`; without a number with the site's own. Each way is taken several
 * times, in turn, in a new browser; the middle is printed, and the load of the machine, which the times depend on.
 */
import { readFileSync, rmSync, statSync } from 'node:fs';
import { loadavg } from 'node:os';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { gzipSync } from 'node:zlib';
import { serve } from '../browser/serve.ts';
import { manyFormulas } from './many-formulas.ts';
import { type FinderTimes, measureFinder } from './measure-finder.ts';

const ROUNDS = 3;

const [site = 'dist', formulas] = process.argv.slice(2);
const made = await manyFormulas(site, formulas === undefined ? null : Number(formulas));
const { folder } = made;

console.log(
  `${made.formulas} formulas, ${made.pages} pages indexed and read back in ${made.seconds.toFixed(1)} s`,
);
const perValue = gzipSync(made.data).length / made.formulas / made.properties;
console.log(
  `finder data: ${perValue.toFixed(1)} bytes per formula and property, compressed (at most 60)`,
);
const scripts = [
  ...readFileSync(join(folder, 'find.html'), 'utf8').matchAll(/<script[^>]*src="(assets[^"]*)"/g),
].map(([, path = '']) => gzipSync(readFileSync(join(folder, path))).length);
const scriptSize = scripts.reduce((sum, size) => sum + size, 0);
console.log(`scripts: ${(scriptSize / 1000).toFixed(1)} kB compressed (at most 20)`);

const server = await serve(folder, '/');
const ways = [
  { name: 'http', base: server.origin, times: [] as FinderTimes[] },
  { name: 'file', base: `${pathToFileURL(folder).href}/`, times: [] as FinderTimes[] },
];
const sizeOf = (path: string) => statSync(join(folder, path)).size;
try {
  for (let round = 0; round < ROUNDS; round++) {
    for (const { base, times } of ways) times.push(await measureFinder(base, sizeOf, made.code));
  }
} finally {
  await server.close();
  rmSync(folder, { recursive: true });
}
for (const { name, times } of ways) report(name, times);
const load = loadavg().map((each) => each.toFixed(1));
console.log(`load average of the machine: ${load.join(', ')}`);

function report(way: string, times: readonly FinderTimes[]): void {
  const say = (what: string, all: readonly number[], rest = '') => {
    const sorted = all.toSorted((a, b) => a - b);
    const [middle, most] = [sorted[sorted.length >> 1] ?? 0, sorted.at(-1) ?? 0];
    console.log(`${way}: ${what}: ${middle.toFixed(0)} ms, at most ${most.toFixed(0)}${rest}`);
  };
  for (const [i, { words, load }] of (times[0]?.loading ?? []).entries()) {
    const kilobytes = (load.bytes / 1000).toFixed(0);
    const limit = i === 0 ? ' (from cold; at most 400 ms and 400 kB)' : '';
    say(
      `words ${words}`,
      times.flatMap(({ loading }) => loading[i]?.ms ?? []),
      `, ${kilobytes} kB in ${load.requests} requests${limit}`,
    );
  }
  for (const [i, { words }] of (times[0]?.loaded ?? []).entries()) {
    say(
      `words ${words} again, loaded`,
      times.flatMap(({ loaded }) => loaded[i]?.ms ?? []),
      ' (at most 60)',
    );
  }
  say(
    'range',
    times.flatMap(({ ranges }) => ranges),
    ' (at most 50)',
  );
}
