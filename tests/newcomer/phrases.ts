/** Phrases of this many words and more say in which language they are. */
const LEAST_WORDS = 4;

/**
 * The phrases of a catalogue, whole texts and the fixed parts of those that are put together. Functions are read by
 * their source, between the numbers that they set in.
 */
export function phrasesOf(catalogue: unknown): ReadonlySet<string> {
  const found = new Set<string>();
  const add = (text: string) => {
    const phrase = text.replace(/\\u00a0|\s+/g, ' ').trim();
    if (phrase.split(' ').filter((word) => /\p{L}{2}/u.test(word)).length >= LEAST_WORDS) {
      found.add(phrase);
    }
  };
  const visit = (value: unknown): void => {
    if (typeof value === 'string') add(value);
    else if (typeof value === 'function') fixedParts(String(value)).forEach(add);
    else if (typeof value === 'object' && value !== null) Object.values(value).forEach(visit);
  };
  visit(catalogue);
  return found;
}

/** Of `a => \`At ${a} of \${b}\`` the texts between the quotes, without what is set in. */
function fixedParts(source: string): readonly string[] {
  const literals = source.match(/`(?:[^`\\]|\\.)*`|'(?:[^'\\]|\\.)*'|"(?:[^"\\]|\\.)*"/gs) ?? [];
  return literals.flatMap((literal) => literal.slice(1, -1).split(/\$\{[^}]*\}+/));
}
