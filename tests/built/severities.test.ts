import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, inject, test } from 'vitest';
import { frame } from '../../src/words/en/frame.ts';
import { sitePages } from '../support/site-files.ts';

const site = inject('site');

/** Elements that are marked with a severity, with what stands in them and a little after. */
const marked = sitePages(site).flatMap((path) =>
  [
    ...readFileSync(join(site, path), 'utf8').matchAll(
      /<(\w+)[^>]* class="[^"]*\bseverity-(\w+)"[^>]*>([\s\S]{0,900})/g,
    ),
  ].map(([, tag = '', severity = '', inside = '']) => ({ path, tag, severity, inside })),
);

test('a severity is said in a word wherever it is marked, never by colour alone', () => {
  expect(new Set(marked.map(({ severity }) => severity)).size).toBeGreaterThanOrEqual(3);
  const silent = marked.filter(({ severity, inside }) => {
    const word = frame.severities[severity as keyof typeof frame.severities];
    return !inside
      .replace(/<[^>]*>/g, '')
      .toLowerCase()
      .includes(word.toLowerCase());
  });
  expect(silent).toEqual([]);
});

test('each has a mark of a shape of its own', () => {
  const shapes = new Map<string, Set<string>>();
  for (const { tag, severity, inside } of marked) {
    // the line that leads to the cautions counts them in words
    if (tag === 'a' && severity !== 'danger') continue;
    const [, shape = ''] = /^\s*(?:<[^>]*>\s*)?<path class="body" d="([^"]*)"/.exec(inside) ?? [];
    shapes.set(severity, (shapes.get(severity) ?? new Set()).add(shape));
  }
  const each = [...shapes.values()].map((found) => [...found]);
  expect(each.every((found) => found.length === 1 && found[0] !== '')).toBe(true);
  expect(new Set(each.flat()).size).toBe(shapes.size);
});
