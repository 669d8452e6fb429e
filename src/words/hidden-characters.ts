/**
 * Control characters, marks that make text read in another order than it is written, and what else is never seen
 * (Unicode's default ignorable code points), and a carriage return that ends no line. Not the joiners and the selectors of emoji and of many scripts.
 */
const HIDDEN = /[[\p{Cc}--[\t\n\r]][\p{DI}--[\u200C\u200D\uFE0E\uFE0F]]\u2028\u2029]|\r(?!\n)/gv;

/** A character that cannot be seen, by its name, `U+202E`, and its place in the text. */
export interface HiddenCharacter {
  readonly name: string;
  /** In UTF-16 units, from 0. */
  readonly index: number;
}

/** Every character of a text that cannot be seen; none in most. */
export const hiddenCharacters = (text: string): readonly HiddenCharacter[] =>
  [...text.matchAll(HIDDEN)].map(({ 0: character, index }) => ({
    index,
    name: characterName(character),
  }));

/** A text on one line in which everything can be seen, for a terminal that would obey what cannot. */
export const madeVisible = (text: string): string =>
  text.replace(HIDDEN, (character) => `<${characterName(character)}>`).replace(/[\t\r\n]+/g, ' ');

const characterName = (character: string): string =>
  `U+${(character.codePointAt(0) ?? 0).toString(16).toUpperCase().padStart(4, '0')}`;
