/**
 * The text of a formula as it is approved: every run of white space (what `\s` matches in ECMAScript, line
 * ends among it) is one space, none stands at the ends, and letters are composed as Unicode NFC has them.
 * To wrap a paragraph anew or to indent a list changes nothing; every word and its place counts.
 */
export function normalisedText(text: string): string {
  return text.normalize('NFC').replaceAll(/\s+/g, ' ').trim();
}
