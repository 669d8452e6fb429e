import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { HtmlValidate, StaticConfigLoader } from 'html-validate';
import { describe, expect, inject, test } from 'vitest';
import { PAGES_OF_KINDS } from '../support/page-kinds.ts';
import { sitePages } from '../support/site-files.ts';

const site = inject('site');
const read = (path: string) => readFileSync(join(site, path), 'utf8');

// what the standard asks for, not how somebody would write it
const validator = new HtmlValidate(
  new StaticConfigLoader({ root: true, extends: ['html-validate:standard'] }),
);

describe('a page of every kind is HTML by the standard', { timeout: 60_000 }, () => {
  test.each(PAGES_OF_KINDS)('%s', async (path) => {
    const { results } = await validator.validateString(read(path), path);
    const faults = results.flatMap(({ messages }) =>
      messages.map(
        ({ ruleId, message, line, column }) => `${line}:${column} ${ruleId}: ${message}`,
      ),
    );
    expect(faults).toEqual([]);
  });
});

/** Attributes that name elements of the same page by id. */
const NAMING = /\s(?:for|aria-labelledby|aria-describedby|aria-controls|headers)="([^"]*)"/g;

test('on all pages an id is there once, and what is named is there', () => {
  const wrong: string[] = [];
  for (const path of sitePages(site)) {
    const html = read(path);
    const ids = [...html.matchAll(/<[a-z][^>]*?\sid="([^"]*)"/g)].map(([, id = '']) => id);
    const known = new Set(ids);
    if (known.size < ids.length) {
      wrong.push(`${path}: twice ${ids.filter((id, i) => ids.indexOf(id) !== i).join(', ')}`);
    }
    for (const [, names = ''] of html.matchAll(NAMING)) {
      for (const id of names.split(/\s+/)) if (!known.has(id)) wrong.push(`${path}: no #${id}`);
    }
  }
  expect(wrong).toEqual([]);
});
