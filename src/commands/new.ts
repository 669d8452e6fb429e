import { mkdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { readFormulas } from '../formulary/formulas-fs.ts';
import { readFormula } from '../formulary/read-formula.ts';
import { sameCode } from '../formulary/same-code.ts';
import { words } from '../words/catalogue.ts';
import { problemText } from '../words/problem-text.ts';
import { FOLDERS, readArguments } from './arguments.ts';
import { nextCode } from './next-code.ts';

/** Writes a commented formula file that is sound as it stands. Never over another file. */
export function main(args: readonly string[]): number {
  const read = readArguments(args, {
    command: 'new',
    about: 'Writes a formula file to start from.',
    options: {
      code: { value: 'CODE', about: 'its code; otherwise the next free one' },
      formulas: FOLDERS.formulas,
    },
    files: { name: '"Name"', least: 1, most: 1 },
  });
  if (!read.ok) {
    console.error(read.text);
    return read.status;
  }
  const { formulas: folder = 'formulas' } = read.given;
  const name = (read.files[0] ?? '').trim();
  const codes = readFormulas(folder, null).codes.map(({ text }) => text);
  const code = read.given.code ?? nextCode(codes);
  if (codes.some((taken) => sameCode(taken) === sameCode(code))) {
    console.error(`The code ${code} is taken; the next free one is ${nextCode(codes)}.`);
    return 1;
  }
  const text = words.starterFormula(code, name, today());
  const { problems } = readFormula(text, 'the new file', null);
  if (problems.length > 0) {
    for (const problem of problems) console.error(problemText(problem));
    return 1;
  }
  const file = join(folder, `${[code, slug(name)].filter(Boolean).join('-')}.md`);
  try {
    mkdirSync(folder, { recursive: true });
    // "wx" refuses a file that is there
    writeFileSync(file, text, { flag: 'wx' });
  } catch (error) {
    const reason = error instanceof Error ? error.message : String(error);
    console.error(`Could not write ${file}: ${reason}`);
    return 1;
  }
  console.log(`${file} is written. Put your own fats and steps in, then: npm run check`);
  return 0;
}

/** The day on this machine's calendar. */
function today(): string {
  const now = new Date();
  const two = (value: number) => String(value).padStart(2, '0');
  return `${now.getFullYear()}-${two(now.getMonth() + 1)}-${two(now.getDate())}`;
}

/** A file name that every disk takes. */
function slug(name: string): string {
  return name
    .normalize('NFKD')
    .toLowerCase()
    .replaceAll(/\p{M}/gu, '')
    .replaceAll(/[^a-z0-9]+/g, '-')
    .replaceAll(/^-+|-+$/g, '')
    .slice(0, 40);
}
