import { existsSync, readFileSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { pathToFileURL } from 'node:url';
import { isWhole, verifyFolder } from '../edition/checksums-fs.ts';
import { readEdition } from '../edition/read-edition-fs.ts';
import { replaceFile } from '../edition/replace-file-fs.ts';
import { problemText } from '../words/problem-text.ts';
import { readArguments } from './arguments.ts';
import { launch } from './launch-chromium.ts';
import { PAPERS, printBook } from './print-book.ts';

/** Prints the whole of a built handbook into one PDF file. Status 1 where the handbook is not whole. */
export async function main(args: readonly string[]): Promise<number> {
  const read = readArguments(args, {
    command: 'print',
    about: 'Prints a built handbook into one PDF file with page numbers, through Chromium.',
    options: {
      handbook: { value: 'DIR', about: 'the built handbook (dist)' },
      paper: { value: 'NAME', about: `${PAPERS.join(' or ')} (A4)` },
      out: { value: 'FILE', about: 'the file to write (handbook.pdf)' },
    },
  });
  if (!read.ok) {
    console.error(read.text);
    return read.status;
  }
  const { handbook = 'dist', out = 'handbook.pdf' } = read.given;
  const paper = PAPERS.find((name) => name === (read.given.paper ?? 'A4'));
  if (!paper) {
    console.error(`--paper: "${read.given.paper}" is not known. It is ${PAPERS.join(' or ')}.`);
    return 1;
  }
  const edition = readEdition(handbook);
  const checked = verifyFolder(handbook);
  for (const problem of [
    ...(edition.ok ? [] : edition.problems),
    ...(checked.ok ? [] : checked.problems),
  ]) {
    console.error(problemText(problem));
  }
  if (!edition.ok || !checked.ok) return 1;
  if (!isWhole(checked.verified)) {
    console.error(
      `${handbook} is not as it was built; npm run verify says where. Nothing was printed.`,
    );
    return 1;
  }
  const browser = await launch().catch(() => null);
  if (!browser) {
    console.error(
      'No Chromium was found. Install one, or name one in CHROMIUM_PATH. Without it, print.html prints from any browser, but its contents then have no page numbers.',
    );
    return 1;
  }
  try {
    const page = await browser.newPage();
    await page.goto(pathToFileURL(resolve(join(handbook, 'print.html'))).href);
    const file = await printBook(page, paper);
    replaceFile(out, file, existsSync(out) ? readFileSync(out) : null);
  } finally {
    await browser.close();
  }
  const { asOf, id, proof } = edition.edition;
  console.log(`${out}: ${proof ? 'proof edition' : 'edition'} of ${asOf}, ${id}, on ${paper}`);
  return 0;
}
