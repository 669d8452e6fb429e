import type { Place } from '../reference/yaml.ts';

/** A formula file cut in two. Line breaks are `\n` or `\r\n`; a byte order mark is left out. */
export type Parts =
  | {
      readonly ok: true;
      readonly yaml: string;
      /** Line of the file on which `yaml` begins. */
      readonly yamlLine: number;
      /** The whole file with the frontmatter blanked, so that places in the text are places in the file. */
      readonly body: string;
      /** The text after the frontmatter alone. */
      readonly bodyText: string;
      /** Where the text begins; the closing line where there is no line after it. */
      readonly bodyPlace: Place;
    }
  | {
      readonly ok: false;
      readonly rule:
        | 'formula/empty-file'
        | 'formula/no-frontmatter'
        | 'formula/frontmatter-not-closed';
      readonly place: Place;
      readonly found: string;
    };

const FENCE = /^---[ \t]*$/;

/** Splits a file into the YAML between its first two `---` lines and the Markdown after them. */
export function splitFrontmatter(fileText: string): Parts {
  const text = fileText.startsWith('\uFEFF') ? fileText.slice(1) : fileText;
  const lines = text.split(/(?<=\n)/);
  const isFence = (line: string) => FENCE.test(line.replace(/\r?\n$/, ''));

  const opening = lines.findIndex((line) => line.trim() !== '');
  if (opening === -1) {
    return refusal('formula/empty-file', 1, 'a file without text');
  }
  if (!isFence(lines[opening] ?? '')) {
    const found = (lines[opening] ?? '').trim().slice(0, 30);
    return refusal('formula/no-frontmatter', opening + 1, `"${found}" at the beginning`);
  }
  const closing = lines.findIndex((line, index) => index > opening && isFence(line));
  if (closing === -1) {
    return refusal('formula/frontmatter-not-closed', opening + 1, 'an opening "---" only');
  }
  const before = lines.slice(0, closing + 1).join('');
  const bodyText = lines.slice(closing + 1).join('');
  return {
    ok: true,
    yaml: lines.slice(opening + 1, closing).join(''),
    yamlLine: opening + 2,
    body: before.replaceAll(/[^\r\n]/g, ' ') + bodyText,
    bodyText,
    bodyPlace: { line: Math.min(closing + 2, lines.length), column: 1 },
  };
}

function refusal(rule: Extract<Parts, { ok: false }>['rule'], line: number, found: string): Parts {
  return { ok: false, rule, place: { line, column: 1 }, found };
}
